/** Values that differ by no more than this share differ by rounding. */
const ROUNDING = 1e-9;

/**
 * Index of the first value that none of the others exceeds by more than rounding: of a run's two ends that bear the
 * same, always the left one.
 *
 * @param values at least one value, none negative
 */
export function firstLargest(values: readonly number[]): number {
  const most = values.reduce((a, b) => Math.max(a, b));
  return values.findIndex((value) => value >= most * (1 - ROUNDING));
}
