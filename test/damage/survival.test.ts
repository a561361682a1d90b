import { erf } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { normalQuantile, survivalDivisor } from '../../src/damage/survival.ts';
import { AS241_VALUES, TABLE_VALUES } from '../reference/normal-quantiles.ts';

describe('standard normal quantile', () => {
  it.each(AS241_VALUES)('of $p has the value printed with AS 241', ({ p, z }) => {
    expect(normalQuantile(p) / z).toBeCloseTo(1, 14);
  });

  it.each(TABLE_VALUES)('of $p has the value of the tables', ({ p, z }) => {
    expect(normalQuantile(p)).toBeCloseTo(z, 4);
  });

  it('is undone by the error function of mathjs', () => {
    for (let p = 0.0005; p < 1; p += 0.0005) {
      expect((1 + erf(normalQuantile(p) / Math.SQRT2)) / 2).toBeCloseTo(p, 13);
    }
  });

  it.each([0, 1, -0.1, Number.NaN])('of %d is refused', (p) => {
    expect(() => normalQuantile(p)).toThrow(RangeError);
  });
});

describe('survival divisor', () => {
  it('is 10^(z·s)', () => {
    expect(survivalDivisor(0.2, 0.5)).toBe(1);
    expect(survivalDivisor(0.2, 0.95)).toBeCloseTo(10 ** (1.6449 * 0.2), 3); // z from tables
    expect(survivalDivisor(0.2, 0.05) * survivalDivisor(0.2, 0.95)).toBeCloseTo(1, 12);
  });
});
