import { describe, expect, it } from 'vitest';
import { thicknessFactor } from '../../src/damage/thickness-factor.ts';
import { STRESS, standard } from './built.ts';

describe('thickness factor', () => {
  // EN 1993-1-9:2005, Table 8.1 (from memory): size effect (30/d)^0.25 on the resistance of a bolt over 30 mm
  const curve = {
    ...standard('EN 1993-1-9 direct 50'),
    thicknessEffect: { reference: 30, exponent: 0.25 },
  };

  it('raises ranges by what it takes off the resistance', () => {
    expect(1 / thicknessFactor(curve, 36)).toBeCloseTo((30 / 36) ** 0.25, 12);
  });

  it('leaves thin members, members without a thickness and curves without an effect', () => {
    expect(thicknessFactor(curve, 30)).toBe(1);
    expect(thicknessFactor(curve, 12)).toBe(1);
    expect(thicknessFactor(curve, null)).toBe(1);
    expect(thicknessFactor({ ...curve, id: STRESS.id, thicknessEffect: null }, 36)).toBe(1);
  });
});
