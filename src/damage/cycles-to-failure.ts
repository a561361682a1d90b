import type { Curve, CurveLine } from '../model.ts';

/**
 * Cycles to failure N(S) at one range, with the curve's scatter and survival taken off.
 *
 * The line is straight in log N over log S between its points, and its first and last slopes go on
 * beyond them. Under the curve's limit range a cut-off or threshold gives `Infinity`.
 *
 * @param curve an S-N curve
 * @param range factored range S, MPa for a stress curve and N for a force curve
 * @param overThreshold true where some other range of the series reaches the threshold, so that a
 *   `threshold` curve goes on below it
 * @returns cycles N, or `Infinity` where the range does no damage
 */
export function cyclesToFailure(curve: Curve, range: number, overThreshold = false): number {
  const endless = curve.below === 'cutoff' || (curve.below === 'threshold' && !overThreshold);
  if (!(range > 0) || (endless && range < curve.limitRange)) return Infinity;
  return cyclesOnLine(curve.line, range) / curve.survivalDivisor;
}

function cyclesOnLine(line: CurveLine, range: number): number {
  if (line.kind === 'formula') return line.cyclesAt(range);
  const i = nearestPointBelow(line, range);
  return line.cycles[i] * (line.ranges[i] / range) ** slopeBeside(line, i, range);
}

/**
 * Slope m of N ∝ S^−m at one range of a curve's line, gone on beyond its ends.
 *
 * @param curve an S-N curve
 * @param range factored range S, MPa for a stress curve and N for a force curve
 */
export function slopeAt(curve: Curve, range: number): number {
  const { line } = curve;
  if (line.kind === 'points') return slopeBeside(line, nearestPointBelow(line, range), range);
  const step = 1 + FORMULA_STEP;
  return Math.log(line.cyclesAt(range / step) / line.cyclesAt(range * step)) / (2 * Math.log(step));
}

/** Relative step of a formula's slope: its square and the rounding of its logarithms both stay small. */
const FORMULA_STEP = 1e-5;

/** Index of the first point at or under a range, or of the last point where the range is under all. */
function nearestPointBelow(line: Points, range: number): number {
  let i = 0;
  while (i < line.ranges.length - 1 && range < line.ranges[i]) i++;
  return i;
}

/** Slope of the piece of line that reaches point i from a range on the piece. */
function slopeBeside(line: Points, i: number, range: number): number {
  if (range < line.ranges[i]) return line.slopeBelow;
  return i === 0 ? line.slopeAbove : segmentSlope(line, i);
}

/**
 * Slope m of N ∝ S^−m between point i − 1 and point i.
 *
 * @param points cycles and ranges at each point
 * @param i index of the later point, 1 or more
 */
export function segmentSlope(
  { cycles, ranges }: Pick<Points, 'cycles' | 'ranges'>,
  i: number,
): number {
  return Math.log(cycles[i] / cycles[i - 1]) / Math.log(ranges[i - 1] / ranges[i]);
}

type Points = Extract<CurveLine, { kind: 'points' }>;
