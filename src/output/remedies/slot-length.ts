import type { Fastener } from '../../model.ts';

/** Length of the slot in full, bolt and free play both ways [mm]; `null` where the diameter is not known. */
export function slotLength({ diameter, freePlay }: Fastener): number | null {
  return diameter === null ? null : diameter + 2 * freePlay;
}
