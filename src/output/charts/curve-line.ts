import { cyclesToFailure } from '../../damage/cycles-to-failure.ts';
import type { Curve } from '../../model.ts';
import type { Point } from './chart.ts';

const STEPS = 120;

/**
 * An S-N curve as points for drawing, cycles to failure over factored range, from the largest range down.
 * Under a cut-off or threshold that holds, the line goes on level to `most` cycles.
 *
 * @param curve the curve
 * @param ranges largest and smallest range to draw [N or MPa]
 * @param overThreshold true where a range of the series does damage, so that a threshold no longer holds
 * @param most cycles at the right edge
 */
export function curveLine(
  curve: Curve,
  ranges: readonly [largest: number, smallest: number],
  overThreshold: boolean,
  most: number,
): Point[] {
  const { line, limitRange } = curve;
  const kinks = line.kind === 'points' ? [...line.ranges] : [line.to, line.from];
  const ends = line.kind === 'points' ? ranges : [line.to, line.from];
  const [largest, smallest] = [Math.max(ends[0], ends[1]), Math.min(ends[0], ends[1])];
  const even = Array.from(
    { length: STEPS + 1 },
    (_, i) => largest * (smallest / largest) ** (i / STEPS),
  );
  const all = [...even, ...kinks, limitRange]
    .filter((range) => range >= smallest && range <= largest)
    .sort((a, b) => b - a);
  const points = all
    .map((y) => ({ x: cyclesToFailure(curve, y, overThreshold), y }))
    .filter(({ x }) => Number.isFinite(x) && x > 0);
  const endless = Number.isFinite(cyclesToFailure(curve, limitRange * 0.999, overThreshold));
  return endless || points.length === 0 ? points : [...points, { x: most, y: limitRange }];
}
