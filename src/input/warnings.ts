/** Every warning that reading a job can give. Each says what is doubtful and what to do. */
export const WARNINGS = {
  characteristicWithScatter: (curve: string) =>
    `curve ${curve}: it is a characteristic curve already, and log_n_sd with survival lowers it once more; leave them out unless that is meant.`,
  gripWithoutPlay: (fastener: string) =>
    `fastener ${fastener}: grip has no effect where free_play is 0; give the free play, or leave the grip out.`,
  thicknessUnknown: (member: string, curve: string) =>
    `member ${member}: curve ${curve} has a thickness factor and the member no thickness; the factor is taken as 1. Give the thickness.`,
  lockInInGap: (run: string, zone: string) =>
    `run ${run}: at its lock-in time the record of zone ${zone} has a gap that does not count as covered; give the temperature itself.`,
  extremeUnused: (extreme: string) =>
    `extreme ${extreme}: no run's member is in a zone that it names, so it does nothing; name such a zone.`,
} as const;
