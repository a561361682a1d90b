import { describe, expect, it } from 'vitest';
import { cyclesToFailure, slopeAt } from '../../src/damage/cycles-to-failure.ts';
import { formulaCurve } from '../../src/damage/formula-curve.ts';
import { built, KSI, STRESS, standard } from './built.ts';

const line = (formula: string, span = {}) => ({ formula, unit: 1, from: 50, to: 400, ...span });

describe('a curve from a formula', () => {
  it('equals the standard’s curve that it writes out', async () => {
    // EN 1993-1-9:2005, 7.1(2): N = 2e6 (Δσ_C/Δσ)³ to 5e6 cycles
    const curve = built(await formulaCurve(STRESS, line('2e6 * (80 / S)^3', { from: 60 })));
    const shape = standard('EN 1993-1-9 direct 80');
    for (const range of [60, 80, 123, 400, 900]) {
      const cycles = cyclesToFailure(shape, range);
      expect(cyclesToFailure(curve, range) / cycles).toBeCloseTo(1, 8);
      expect(slopeAt(curve, range)).toBeCloseTo(3, 8);
    }
    expect(cyclesToFailure(curve, 59.9)).toBe(Number.POSITIVE_INFINITY);
  });

  it('takes S in its own unit', async () => {
    // ANSI/AISC 360-22, A-3-1, category C, solved for n
    const text = '4.4 * (1000 / S)^(1 / 0.333)';
    const span = { unit: KSI, from: 10 * KSI, to: 60 * KSI };
    const curve = built(await formulaCurve(STRESS, line(text, span)));
    const shape = standard('AISC 360 C');
    for (const range of [70, 200, 400]) {
      expect(cyclesToFailure(curve, range) / cyclesToFailure(shape, range)).toBeCloseTo(1, 9);
    }
  });

  it('goes on below its span with the slope there, where it is to', async () => {
    const traits = { ...STRESS, below: 'continue' as const };
    const curve = built(await formulaCurve(traits, line('1e12 / S^3 + 1e5 - 200 S')));
    const slope = slopeAt(curve, 50);
    const cycles = 1e12 / 50 ** 3 + 1e5 - 1e4;
    expect(slope).toBeCloseTo((3 * 8e6 + 1e4) / cycles, 3);
    expect(cyclesToFailure(curve, 25) / (cycles * 2 ** slope)).toBeCloseTo(1, 3);
  });

  it.each([
    ['2e6 * (80 / s)^3', /^a formula in S of numbers.*Undefined symbol s/],
    ['2e6 * (80 / S', /^a formula in S of numbers.*Parenthesis/],
    ['import("x")', /^a formula in S of numbers/],
    ['S', /^a formula whose cycles fall as S rises all over its span \(at S = 50\.\d+ it gives/],
    ['1e6', /^a formula whose cycles fall .* it gives 1000000, and 1000000 before/],
    ['100 - S', /^a formula that gives a real, positive number .*at S = 100(\.\d+)? it gives/],
    ['(100 - S)^0.5', /it gives no real number/],
    ['S > 0', /it gives no real number/],
    ['1 / (S - S)', /it gives Infinity/],
  ])('that reads %s is refused', async (formula, message) => {
    expect(await formulaCurve(STRESS, line(formula))).toMatch(message);
  });

  it('without a span that rises is refused', async () => {
    expect(await formulaCurve(STRESS, line('1e9 / S', { from: 400 }))).toBe(
      'a span over zero that rises',
    );
  });
});
