import type { Curve } from '../model.ts';
import { cyclesToFailure } from './cycles-to-failure.ts';

/** Bisections that bring an octave down to neighbouring numbers. */
const HALVINGS = 53;

/**
 * The factored range S at which a curve gives so many cycles: N(S) = cycles. A `threshold` curve goes
 * on below its threshold; a cut-off curve ends at its limit range.
 *
 * Found by bisection, since N falls all along a curve; so it takes any curve, a formula too.
 *
 * @param curve an S-N curve
 * @param cycles N, positive and finite
 * @returns S, MPa for a stress curve and N for a force curve
 */
export function rangeAtCycles(curve: Curve, cycles: number): number {
  const lives = (range: number) => cyclesToFailure(curve, range, true) > cycles;
  let low = curve.limitRange;
  while (!lives(low)) low /= 2;
  while (lives(2 * low)) low *= 2;
  let high = 2 * low;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (low + high) / 2;
    if (lives(middle)) low = middle;
    else high = middle;
  }
  return high;
}
