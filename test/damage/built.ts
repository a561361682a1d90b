import { type CurveTraits, constantCurve, pointsCurve } from '../../src/damage/curve.ts';
import { formulaCurve } from '../../src/damage/formula-curve.ts';
import { standardCurve } from '../../src/damage/standard-shapes.ts';
import type { Curve } from '../../src/model.ts';

/** 1 ksi in MPa: the inch is 25.4 mm and the pound-force 4.4482216152605 N, both exactly. */
export const KSI = 4448.2216152605 / 25.4 ** 2;

/** Traits of a stress curve, all else at its default. */
export const STRESS: CurveTraits = { id: 'test', of: 'stress' };

/** The curve, or an error with the builder's message. */
export function built(curve: Curve | string): Curve {
  if (typeof curve === 'string') throw new Error(curve);
  return curve;
}

/** A standard's curve by its name. */
export function standard(shape: string): Curve {
  return built(standardCurve(STRESS, shape));
}

/** One curve of every kind, with kinks, cut-offs, thresholds and steep pieces. */
export async function curvesOfEveryKind(): Promise<Record<string, Curve>> {
  const points = (below: Curve['below'], ranges: number[]) =>
    built(
      pointsCurve(
        { ...STRESS, below },
        Float64Array.of(1e4, 3e5, 1e6, 5e6),
        Float64Array.from(ranges),
      ),
    );
  const formula = async (text: string) =>
    built(await formulaCurve(STRESS, { formula: text, unit: 1, from: 20, to: 400 }));
  return {
    'EN direct': standard('EN 1993-1-9 direct 80'),
    'EN shear': standard('EN 1993-1-9 shear 100'),
    AISC: standard('AISC 360 C'),
    'points, cut off': points('cutoff', [526, 180, 120, 85]),
    'points, gone on': points('continue', [526, 180, 120, 85]),
    'points, a threshold': points('threshold', [526, 180, 120, 85]),
    'points, nearly level at the end': points('cutoff', [526, 180, 120, 119]),
    'one slope': built(
      constantCurve(STRESS, { constant: 1e12, slope: 3, threshold: null, unit: 1 }),
    ),
    'a high slope': built(
      constantCurve(STRESS, { constant: 1e40, slope: 17, threshold: 60, unit: 1 }),
    ),
    'a slope too high for the cells': built(
      constantCurve(STRESS, { constant: 1e120, slope: 60, threshold: 60, unit: 1 }),
    ),
    'a formula': await formula('10^(12.3 - 3.2 log10(S)) + 1e4 * exp(-S / 50)'),
    'a formula with a kink': await formula(
      'S > 90.3 ? 2e6 * (80 / S)^3 : 2e6 * (80 / 90.3)^3 * (90.3 / S)^6',
    ),
  };
}
