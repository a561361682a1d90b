import { describe, expect, it } from 'vitest';
import { cyclesToFailure } from '../../src/damage/cycles-to-failure.ts';
import { rangeAtCycles } from '../../src/damage/range-at-cycles.ts';
import { STANDARD_SHAPES, standardCurve } from '../../src/damage/standard-shapes.ts';
import { AISC_OLD_C, AISC_OLD_FORM, AISC_RANGES } from '../reference/aisc-360-appendix-3.ts';
import { EN_ENDURANCE, EN_RATIOS } from '../reference/en-1993-1-9.ts';
import { KSI, STRESS, standard } from './built.ts';

describe('EN 1993-1-9', () => {
  it.each(EN_ENDURANCE)('$shape: endurance', ({ shape, cutoff, cycles }) => {
    const curve = standard(shape);
    expect(curve.below).toBe('cutoff');
    expect(curve.limitRange).toBeCloseTo(cutoff, 3);
    for (const [range, endurance] of Object.entries(cycles)) {
      const found = cyclesToFailure(curve, Number(range));
      if (endurance === null) expect(found).toBe(Number.POSITIVE_INFINITY);
      else expect(Math.abs(found - endurance)).toBeLessThan(0.51); // printed to whole cycles
    }
  });

  it('has the ratios that the standard prints', () => {
    const direct = standard('EN 1993-1-9 direct 100');
    const constantAmplitude = rangeAtCycles(direct, 5e6);
    expect(constantAmplitude / 100).toBeCloseTo(EN_RATIOS.constantAmplitude, 3);
    expect(direct.limitRange / constantAmplitude).toBeCloseTo(EN_RATIOS.cutoffToConstant, 3);
    const shear = standard('EN 1993-1-9 shear 100');
    expect(shear.limitRange / 100).toBeCloseTo(EN_RATIOS.shearCutoff, 3);
  });

  it('ends at 1e8 cycles', () => {
    for (const { shape } of EN_ENDURANCE) {
      const curve = standard(shape);
      expect(cyclesToFailure(curve, curve.limitRange)).toBeCloseTo(1e8, 0);
      expect(cyclesToFailure(curve, curve.limitRange * (1 - 1e-12))).toBe(Number.POSITIVE_INFINITY);
    }
  });
});

describe('AISC 360 Appendix 3', () => {
  it.each(AISC_RANGES)(
    'category $category: allowable ranges',
    ({ category, threshold, ...row }) => {
      const curve = standard(`AISC 360 ${category}`);
      expect(curve.below).toBe('threshold');
      expect(curve.limitRange / KSI).toBeCloseTo(threshold, 9);
      for (const [cycles, range] of Object.entries(row.ranges)) {
        expect(rangeAtCycles(curve, Number(cycles)) / KSI).toBeCloseTo(range, 2);
        const under = range < threshold;
        const alone = cyclesToFailure(curve, range * KSI);
        expect(alone === Number.POSITIVE_INFINITY).toBe(under);
      }
      if (row.meets !== null) {
        const meets = cyclesToFailure(curve, curve.limitRange);
        expect(Math.abs(meets / row.meets - 1)).toBeLessThan(5e-4); // printed to four digits
      }
    },
  );

  it.each(AISC_OLD_FORM)('category $category follows from the older form', (row) => {
    const curve = standard(`AISC 360 ${row.category}`);
    expect(curve.limitRange / KSI).toBeCloseTo(row.threshold, 9);
    // 1000 and 100 stand for 1e9^0.333 and 1e12^0.167 now
    const factor = row.category === 'F' ? 100 : 1000;
    for (const cycles of [2e4, 1e5, 1e6]) {
      const older = (row.constant / cycles) ** row.exponent;
      const newer = rangeAtCycles(curve, cycles) / KSI;
      expect(newer / (older * (factor / row.larger ** row.exponent))).toBeCloseTo(1, 9);
    }
  });

  it('category C in the older form has the range worked out by hand', () => {
    const { constant, exponent } = AISC_OLD_FORM[3];
    expect((constant / AISC_OLD_C.cycles) ** exponent).toBeCloseTo(AISC_OLD_C.range, 2);
  });
});

describe('names of shapes', () => {
  it('all give a curve that falls', () => {
    for (const shape of STANDARD_SHAPES) {
      const curve = standard(shape);
      expect(cyclesToFailure(curve, 400)).toBeLessThan(cyclesToFailure(curve, 200));
    }
    expect(STANDARD_SHAPES.length).toBe(14 + 2 + 9);
  });

  it('may differ in case, spaces and the kind of prime', () => {
    expect(standard(' en 1993-1-9  Direct 80 ')).toEqual(standard('EN 1993-1-9 direct 80'));
    expect(standard('AISC 360 E′')).toEqual(standard("AISC 360 E'"));
  });

  it('that are not known are answered with those that are', () => {
    const message = standardCurve(STRESS, 'EN 1993-1-9 direct 81');
    expect(message).toBe(
      'one of the shapes EN 1993-1-9 direct 160, 140, 125, 112, 100, 90, 80, 71, 63, 56, 50, 45, 40, 36; ' +
        "EN 1993-1-9 shear 100, 80; AISC 360 A, B, B', C, D, E, E', F, G",
    );
  });

  it('take another rule below the last point from the user', () => {
    const curve = standardCurve({ ...STRESS, below: 'continue' }, 'EN 1993-1-9 direct 80');
    if (typeof curve === 'string') throw new Error(curve);
    // m = 5 goes on: half the cut-off range at 2⁵ times 1e8 cycles
    expect(cyclesToFailure(curve, curve.limitRange / 2) / 32e8).toBeCloseTo(1, 9);
  });
});
