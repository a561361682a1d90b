import type { Fastener, RemedySettings, Run } from '../model.ts';

/**
 * The fastener that a remedy puts where a run is slotted: the run's own slotted type, else its fixed one with the grip
 * that it would have in a slot, and with `travel` of free play each way.
 *
 * @param travel free play each way [mm]
 */
export function slotType(run: Run, travel: number, settings: RemedySettings): Fastener {
  const { fixedType, slottedType } = run;
  const own = slottedType ?? fixedType;
  const grip =
    slottedType?.grip ?? fixedType.slottedGrip ?? settings.slottedGripShare * fixedType.grip;
  return { ...own, id: `${own.id}, slot ${travel} mm`, freePlay: travel, grip };
}

/** The longest free play each way that a slot may have [mm]. */
export function longestTravel({ longestTravel, slotTravels }: RemedySettings): number {
  const offered = (slotTravels ?? [longestTravel]).filter((travel) => travel <= longestTravel);
  return offered.length === 0 ? 0 : Math.max(...offered);
}

/**
 * The free play that slots are drawn with for a travel that is needed: the next one that they come in.
 *
 * @param needed slip found and setting tolerance [mm]
 * @returns free play each way [mm]; `null` where no slot is long enough
 */
export function drawnTravel(needed: number, settings: RemedySettings): number | null {
  const { slotTravels, slotStep } = settings;
  // a bolt that just reaches the end of its slot bears there, so the slot is longer than what is needed
  const enough = (travel: number) => travel > needed * (1 + 1e-9);
  const longest = longestTravel(settings);
  if (slotTravels !== null) {
    return slotTravels.find((travel) => enough(travel) && travel <= longest) ?? null;
  }
  const steps = Math.floor((needed / slotStep) * (1 + 1e-9)) + 1;
  // in whole thousandths, so that 3 × 0.1 mm is written 0.3 mm
  const travel = Math.round(steps * slotStep * 1000) / 1000;
  return travel <= longest ? travel : null;
}
