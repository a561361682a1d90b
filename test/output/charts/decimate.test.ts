import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decimate } from '../../../src/output/charts/decimate.ts';

test('a short series stays whole', () => {
  expect(decimate(Float64Array.of(0, 1, 4), Float64Array.of(5, 6, 7), 2)).toEqual([
    { x: 0, y: 5 },
    { x: 1, y: 6 },
    { x: 4, y: 7 },
  ]);
});

test('each column keeps exactly its smallest and largest value, in order', () => {
  const series = fc
    .array(fc.tuple(fc.integer({ min: 1, max: 9 }), fc.integer({ min: -50, max: 50 })), {
      minLength: 30,
      maxLength: 300,
    })
    .map((steps) => {
      let x = 0;
      return steps.map(([step, y]) => {
        x += step;
        return { x, y };
      });
    });
  fc.assert(
    fc.property(series, (points) => {
      const columns = 7;
      const xs = Float64Array.from(points, ({ x }) => x);
      const ys = Float64Array.from(points, ({ y }) => y);
      const kept = decimate(xs, ys, columns);
      const columnOf = (x: number) =>
        Math.min(columns - 1, Math.floor(((x - xs[0]) / (xs[xs.length - 1] - xs[0])) * columns));
      const extremes = (of: typeof points, column: number) => {
        const inside = of.filter(({ x }) => columnOf(x) === column).map(({ y }) => y);
        return inside.length === 0 ? null : [Math.min(...inside), Math.max(...inside)];
      };
      expect(kept.length).toBeLessThanOrEqual(2 * columns);
      expect(kept.every(({ x }, i) => i === 0 || x > kept[i - 1].x)).toBe(true);
      for (let column = 0; column < columns; column++) {
        expect(extremes(kept, column)).toEqual(extremes(points, column));
      }
    }),
    { seed: 2 },
  );
});
