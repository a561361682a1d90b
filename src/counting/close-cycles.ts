import type { FloatList } from './float-list.ts';

/**
 * Puts turning points on the stack and takes off it each cycle that they close, writing its range.
 *
 * A range closes a cycle once the ranges before and after it are both at least as large: the
 * four-point form of the rule X ≥ Y of ASTM E1049-85, 5.4.4, which leaves open cycles on the stack.
 *
 * @param points turning points, alternately high and low
 * @param count how many of them
 * @param stack open turning points, oldest first, changed in place
 * @param ranges the closed cycles' ranges, added to
 */
export function closeCycles(
  points: Float64Array,
  count: number,
  stack: FloatList,
  ranges: FloatList,
): void {
  stack.reserve(count);
  ranges.reserve((stack.length + count) >> 1);
  const open = stack.data;
  const closed = ranges.data;
  let depth = stack.length;
  let cycles = ranges.length;
  for (let i = 0; i < count; i++) {
    const point = points[i];
    while (depth >= 3) {
      const inner = Math.abs(open[depth - 1] - open[depth - 2]);
      if (inner > Math.abs(point - open[depth - 1])) break;
      if (inner > Math.abs(open[depth - 2] - open[depth - 3])) break;
      closed[cycles++] = inner;
      depth -= 2;
    }
    open[depth++] = point;
  }
  stack.length = depth;
  ranges.length = cycles;
}
