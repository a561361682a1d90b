import type { Curve } from '../model.ts';
import { assembleCurve, type CurveTraits, constantCurve } from './curve.ts';

/** 1 ksi in MPa, from the exact inch and pound-force. */
const KSI = 6.894757293168361;

/** Direct stress, Figure 7.1: Δσ_C [MPa] at 2e6 cycles. */
const EN_DIRECT = [160, 140, 125, 112, 100, 90, 80, 71, 63, 56, 50, 45, 40, 36];

/** Shear stress, Figure 7.2: Δτ_C [MPa] at 2e6 cycles. */
const EN_SHEAR = [100, 80];

/** Table: C_f and the threshold F_TH [ksi] of each stress category. */
const AISC: Readonly<Record<string, readonly [number, number]>> = {
  A: [25, 24],
  B: [12, 16],
  "B'": [6.1, 12],
  C: [4.4, 10],
  D: [2.2, 7],
  E: [1.1, 4.5],
  "E'": [0.39, 2.6],
  F: [1.5, 8],
  G: [0.39, 7],
};

/** Every shape that `standardCurve` knows, as the user writes it. */
export const STANDARD_SHAPES: readonly string[] = [
  ...EN_DIRECT.map((category) => `EN 1993-1-9 direct ${category}`),
  ...EN_SHEAR.map((category) => `EN 1993-1-9 shear ${category}`),
  ...Object.keys(AISC).map((category) => `AISC 360 ${category}`),
];

/**
 * The S-N curve of an open standard's detail class: EN 1993-1-9:2005, 7.1, or ANSI/AISC 360-22,
 * Appendix 3, 3.3. Class and clause are the user's choice; the figures are the standard's own.
 *
 * @param traits all of the curve but its line; a standard's shape is a curve of stress
 * @param shape standard and class, such as `EN 1993-1-9 direct 80` or `AISC 360 C`
 * @returns the curve, or what was expected, as the end of a sentence «expected …»
 */
export function standardCurve(traits: CurveTraits, shape: string): Curve | string {
  const plain = shape.trim().replace(/\s+/g, ' ').replace(/[’′]/g, "'").toLowerCase();
  const known = STANDARD_SHAPES.find((name) => name.toLowerCase() === plain);
  if (known === undefined) return `one of the shapes ${listOfShapes()}`;
  const category = known.slice(known.lastIndexOf(' ') + 1);
  if (known.startsWith('EN 1993-1-9 direct')) return enDirect(traits, Number(category));
  if (known.startsWith('EN 1993-1-9 shear')) return enShear(traits, Number(category));
  return aisc(traits, category);
}

/** m = 3 to 5e6 cycles, m = 5 to the cut-off at 1e8 (EN 1993-1-9, 7.1(2) and (3)). */
function enDirect(traits: CurveTraits, category: number): Curve {
  const constantAmplitude = category * (2e6 / 5e6) ** (1 / 3);
  const cutoff = constantAmplitude * (5e6 / 1e8) ** (1 / 5);
  const cycles = Float64Array.of(2e6, 5e6, 1e8);
  const ranges = Float64Array.of(category, constantAmplitude, cutoff);
  const line = { kind: 'points', cycles, ranges, slopeAbove: 3, slopeBelow: 5 } as const;
  return assembleCurve(traits, line, cutoff, 'cutoff');
}

/** m = 5 to the cut-off at 1e8 cycles (EN 1993-1-9, 7.1(2) and Figure 7.2). */
function enShear(traits: CurveTraits, category: number): Curve {
  const cutoff = category * (2e6 / 1e8) ** (1 / 5);
  const cycles = Float64Array.of(2e6, 1e8);
  const ranges = Float64Array.of(category, cutoff);
  const line = { kind: 'points', cycles, ranges, slopeAbove: 5, slopeBelow: 5 } as const;
  return assembleCurve(traits, line, cutoff, 'cutoff');
}

/** F_SR = 1000 (C_f/n)^0.333 ≥ F_TH (A-3-1); category F: 100 (1.5/n)^0.167 ≥ F_TH (A-3-2); in ksi. */
function aisc(traits: CurveTraits, category: string): Curve | string {
  const [factor, threshold] = AISC[category];
  const [scale, exponent] = category === 'F' ? [100, 0.167] : [1000, 0.333];
  const slope = 1 / exponent;
  return constantCurve(traits, { constant: factor * scale ** slope, slope, threshold, unit: KSI });
}

/** Classes by standard, short enough for a message. */
function listOfShapes(): string {
  const en = `EN 1993-1-9 direct ${EN_DIRECT.join(', ')}; EN 1993-1-9 shear ${EN_SHEAR.join(', ')}`;
  return `${en}; AISC 360 ${Object.keys(AISC).join(', ')}`;
}
