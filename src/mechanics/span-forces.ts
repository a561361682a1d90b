/**
 * Span forces of each row of a block, tension positive: N to the right of a fastener is the sum of the shears up to it.
 *
 * @param shears forces f of the fasteners, row-major, `count` a row [N]
 * @param spans receives the span forces, row-major, `count` − 1 a row [N]
 * @param count number of fasteners
 * @param rows number of rows
 */
export function spanForces(
  shears: Float64Array,
  spans: Float64Array,
  count: number,
  rows: number,
): void {
  for (let r = 0; r < rows; r++) {
    let force = 0;
    for (let i = 0; i < count - 1; i++) {
      force += shears[r * count + i];
      spans[r * (count - 1) + i] = force;
    }
  }
}
