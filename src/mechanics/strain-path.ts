import { turningPoints } from '../temperature/turning-points.ts';

/**
 * The way of the mismatch strain through a record: straight from turning point to turning point, which is the same as
 * from sample to sample, since a run does not care how fast it is strained.
 *
 * A mark on the way is leg + share of the leg, 0 < share ≤ 1. Leg 0 leads to the first sample, leg j ≥ 1 from turn
 * j − 1 to turn j; leg −1 leads from lock-in to the first sample, leg −2 − k from lock-in to extreme k.
 */
export interface StrainPath {
  /** ε at each sample. */
  readonly strain: Float64Array;
  /** Sample of each turning point. */
  readonly turns: Int32Array;
}

/** Where on the way a mark lies: at a sample of the record, or on the way to an extreme. */
export type Moment = { readonly sample: number } | { readonly extreme: number };

export const FROM_LOCK_IN = -1;

/** The leg that leads from lock-in to extreme k. */
export function legToExtreme(k: number): number {
  return -2 - k;
}

/** The way through `strain`, a series of at least one sample. */
export function strainPath(strain: Float64Array): StrainPath {
  return { strain, turns: turningPoints(strain) };
}

/** The first sample at which the path had come as far as `mark`, or the extreme that it led to. */
export function momentOf({ strain, turns }: StrainPath, mark: number): Moment {
  const leg = Math.ceil(mark) - 1;
  if (leg <= legToExtreme(0)) return { extreme: -2 - leg };
  if (leg <= 0) return { sample: turns[0] };
  const from = turns[leg - 1];
  const to = turns[leg];
  const way = strain[to] - strain[from];
  // rounding in the mark must not push a peak at a sample to the next one
  const share = mark - leg - 1e-9;
  for (let i = from + 1; i < to; i++) {
    if ((strain[i] - strain[from]) / way >= share) return { sample: i };
  }
  return { sample: to };
}
