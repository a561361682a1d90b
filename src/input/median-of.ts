/** So many values tell a median well enough. */
const MOST_LOOKED_AT = 10_000;

/** Median of the values that are not `NaN`, of a long column from evenly spaced ones; `NaN` where there is none. */
export function medianOf(values: Float64Array): number {
  const every = Math.ceil(values.length / MOST_LOOKED_AT);
  const some = values.filter((value, i) => i % every === 0 && !Number.isNaN(value)).sort();
  return some.length === 0 ? Number.NaN : some[(some.length - 1) >> 1];
}
