import type { Point } from './chart.ts';

/**
 * A long series thinned for drawing: in each of `columns` equal stretches of x only the smallest and the
 * largest y are kept, in their order, so that the drawn line covers the same pixels.
 *
 * @param xs rising
 * @param ys as many, in any unit
 */
export function decimate(xs: Float64Array, ys: Float64Array, columns: number): Point[] {
  const n = xs.length;
  if (n <= 2 * columns) return Array.from(xs, (x, i) => ({ x, y: ys[i] }));
  const width = (xs[n - 1] - xs[0]) / columns;
  const points: Point[] = [];
  let first = 0;
  for (let column = 1; column <= columns; column++) {
    const end = column === columns ? n : firstAtOrAfter(xs, xs[0] + column * width, first);
    if (end > first) keepExtremes(points, xs, ys, [first, end]);
    first = end;
  }
  return points;
}

function keepExtremes(
  points: Point[],
  xs: Float64Array,
  ys: Float64Array,
  [from, to]: readonly [number, number],
): void {
  let low = from;
  let high = from;
  for (let i = from + 1; i < to; i++) {
    if (ys[i] < ys[low]) low = i;
    if (ys[i] > ys[high]) high = i;
  }
  const [a, b] = low < high ? [low, high] : [high, low];
  points.push({ x: xs[a], y: ys[a] });
  if (b !== a) points.push({ x: xs[b], y: ys[b] });
}

function firstAtOrAfter(xs: Float64Array, x: number, from: number): number {
  let i = from;
  while (i < xs.length && xs[i] < x) i++;
  return i;
}
