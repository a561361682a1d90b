/**
 * The value under which a share of a sample lies, straight between its sorted values: R. J. Hyndman and Y. Fan,
 * Sample quantiles in statistical packages, The American Statistician 50(4) 361, 1996, definition 7.
 *
 * @param sorted at least one value, rising
 * @param share 0 … 1
 */
export function quantile(sorted: Float64Array, share: number): number {
  const at = share * (sorted.length - 1);
  const below = Math.floor(at);
  const above = Math.min(below + 1, sorted.length - 1);
  return sorted[below] + (at - below) * (sorted[above] - sorted[below]);
}
