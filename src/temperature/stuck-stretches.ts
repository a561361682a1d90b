/** Samples from the first to the last of a stretch. */
export interface Stretch {
  readonly first: number;
  readonly last: number;
}

/**
 * Stretches over which a channel does not change at all.
 *
 * @param values the channel, `NaN` where missing; what is missing breaks no stretch
 * @param times time of each sample [ms], rising
 * @param longerThan only longer stretches count [ms]
 */
export function stuckStretches(
  values: Float64Array,
  times: Float64Array,
  longerThan: number,
): Stretch[] {
  const stretches: Stretch[] = [];
  let first = -1;
  let last = -1;
  const close = () => {
    if (first >= 0 && times[last] - times[first] > longerThan) stretches.push({ first, last });
  };
  for (let i = 0; i < values.length; i++) {
    if (Number.isNaN(values[i])) continue;
    if (first < 0 || values[i] !== values[first]) {
      close();
      first = i;
    }
    last = i;
  }
  close();
  return stretches;
}
