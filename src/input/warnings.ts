/** Every warning that reading a job can give. Each says what is doubtful and what to do. */
export const WARNINGS = {
  characteristicWithScatter: (curve: string) =>
    `curve ${curve}: it is a characteristic curve already, and log_n_sd with survival lowers it once more; leave them out unless that is meant.`,
  gripWithoutPlay: (fastener: string) =>
    `fastener ${fastener}: grip has no effect where free_play is 0; give the free play, or leave the grip out.`,
  thicknessUnknown: (member: string, curve: string) =>
    `member ${member}: curve ${curve} has a thickness factor and the member no thickness; the factor is taken as 1. Give the thickness.`,
  unusual: (place: string, text: string, usual: string) =>
    `${place}: ${text} is read as it stands, and ${usual} is usual; check the figure and its unit.`,
  unlikelyInertia: (member: string, radius: string) =>
    `member ${member}: area and inertia give a radius of gyration of ${radius}, which no section of this area has; check the units of both.`,
  unlikelyTemperature: (zone: string, median: string) =>
    `zone ${zone}: half of its temperatures lie on either side of ${median}; check whether its column is in another unit (°C, °F, K).`,
  lockInAssumed: (run: string) =>
    `run ${run}: lock_in is not given; the middle of 5 to 25 °C is taken. Give it, or screen with 5 and with 25 °C as well.`,
  lockInFar: (run: string, lockIn: string, range: string) =>
    `run ${run}: the lock-in temperature, ${lockIn}, is far from any in its zone, ${range}; check the units of both.`,
  lockInInGap: (run: string, zone: string) =>
    `run ${run}: at its lock-in time the record of zone ${zone} has a gap that does not count as covered; give the temperature itself.`,
  extremeUnused: (extreme: string) =>
    `extreme ${extreme}: no run's member is in a zone that it names, so it does nothing; name such a zone.`,
  stuck: (count: number) =>
    `record: ${times(count)} a temperature stands unchanged for longer than record.stuck allows; see record.csv, and say in record.stuck whether such stretches are kept or left out.`,
  spikes: (count: number) =>
    `record: ${times(count)} a temperature leaves its neighbours faster than record.spikes allows and comes back; see record.csv, and say in record.spikes whether such values are kept or left out.`,
  jumps: (count: number) =>
    `record: ${times(count)} a temperature jumps faster than record.jumps allows and does not come back; see record.csv whether a sensor was moved or changed there.`,
  channelsApart: (count: number) =>
    `record: ${count === 1 ? 'a channel lies' : `${count} channels lie`} far from the first one; see record.csv, and whether its unit is right.`,
  doubledHourOnce: (count: number) =>
    `record: ${times(count)} an hour that the clock showed twice stands in it once and is taken as the first; see whether the logger keeps summer time.`,
  coarseStep: (hours: number) =>
    `record: its step of ${Number(hours.toPrecision(3))} h misses the top and the bottom of a day, so that ranges are too small; use an hourly record.`,
} as const;

function times(count: number): string {
  return count === 1 ? 'once' : `${count} times`;
}
