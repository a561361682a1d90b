import type { BelowLast, Curve, CurveLine } from '../model.ts';
import { segmentSlope } from './cycles-to-failure.ts';

/** All of a curve but its line; what is left out stands at its default. */
export interface CurveTraits {
  readonly id: string;
  readonly of: Curve['of'];
  /** Default: `cutoff` for points and formulas, `threshold` where one is given, else `continue`. */
  readonly below?: BelowLast | undefined;
  /** Default `net`. */
  readonly on?: Curve['on'] | undefined;
  /** Default 1. */
  readonly compressionShare?: number | undefined;
  /** Default 1. */
  readonly survivalDivisor?: number | undefined;
  /** Default none. */
  readonly thicknessEffect?: Curve['thicknessEffect'] | undefined;
}

/** N = C/Sᵐ, or in a standard's form. */
export interface ConstantLine {
  /** C in cycles · unitᵐ. */
  readonly constant: number;
  /** m. */
  readonly slope: number;
  /** Threshold or other limit range in the same unit; `null` for none. */
  readonly threshold: number | null;
  /** The unit of S in base units: 1 for MPa or N, 6.894757293168361 for ksi. */
  readonly unit: number;
}

/**
 * A curve through points that the user entered, straight in log N over log S.
 *
 * @param traits all of the curve but its line
 * @param cycles N at each point
 * @param ranges S at each point, MPa for a stress curve and N for a force curve
 * @returns the curve, or what was expected of the points, as the end of a sentence «expected …»
 */
export function pointsCurve(
  traits: CurveTraits,
  cycles: Float64Array,
  ranges: Float64Array,
): Curve | string {
  if (cycles.length !== ranges.length || cycles.length < 2) {
    return 'at least two points, each of cycles and a range';
  }
  if (!cycles.every(isPositive) || !ranges.every(isPositive)) return 'cycles and ranges over zero';
  const last = cycles.length - 1;
  for (let i = 1; i <= last; i++) {
    if (cycles[i] <= cycles[i - 1]) return `cycles that rise from point to point (point ${i + 1})`;
    if (ranges[i] >= ranges[i - 1]) return `ranges that fall as cycles rise (point ${i + 1})`;
  }
  const slopeAbove = segmentSlope({ cycles, ranges }, 1);
  const slopeBelow = segmentSlope({ cycles, ranges }, last);
  const line: CurveLine = { kind: 'points', cycles, ranges, slopeAbove, slopeBelow };
  return assembleCurve(traits, line, ranges[last], 'cutoff');
}

/**
 * A curve of one slope, N = C/Sᵐ.
 *
 * @param traits all of the curve but its line
 * @param line C, m, threshold and the unit that S is put in
 * @returns the curve, or what was expected of the figures, as the end of a sentence «expected …»
 */
export function constantCurve(traits: CurveTraits, line: ConstantLine): Curve | string {
  const { constant, slope, threshold, unit } = line;
  if (![constant, slope, threshold ?? 1].every(isPositive)) {
    return 'a constant, a slope and a threshold over zero';
  }
  if (threshold === null && (traits.below ?? 'continue') !== 'continue') {
    return `a threshold, without which nothing says where the ${traits.below} is`;
  }
  // Any range lies on the line; without a threshold that at 2e6 cycles is as good as another.
  const range = threshold ?? (constant / 2e6) ** (1 / slope);
  return assembleCurve(
    traits,
    {
      kind: 'points',
      cycles: Float64Array.of(constant / range ** slope),
      ranges: Float64Array.of(range * unit),
      slopeAbove: slope,
      slopeBelow: slope,
    },
    range * unit,
    threshold === null ? 'continue' : 'threshold',
  );
}

/**
 * A curve from its line and its traits.
 *
 * @param traits all of the curve but its line
 * @param line cycles over range
 * @param limitRange range under which `below` applies, MPa or N
 * @param below what `below` is where the traits do not say
 */
export function assembleCurve(
  traits: CurveTraits,
  line: CurveLine,
  limitRange: number,
  below: BelowLast,
): Curve {
  return {
    id: traits.id,
    of: traits.of,
    line,
    below: traits.below ?? below,
    limitRange,
    on: traits.on ?? 'net',
    compressionShare: traits.compressionShare ?? 1,
    survivalDivisor: traits.survivalDivisor ?? 1,
    thicknessEffect: traits.thicknessEffect ?? null,
  };
}

function isPositive(value: number): boolean {
  return value > 0 && Number.isFinite(value);
}
