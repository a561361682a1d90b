import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { constantCurve, pointsCurve } from '../../src/damage/curve.ts';
import { cyclesToFailure } from '../../src/damage/cycles-to-failure.ts';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import { minerDamage, type SeriesUse } from '../../src/damage/miner.ts';
import type { Curve, Spectrum } from '../../src/model.ts';
import { BHANDARI, CATEGORY_71 } from '../reference/miner-sums.ts';
import { built, STRESS, standard } from './built.ts';

/** A spectrum of so many whole and half cycles of each range. */
const spectrumOf = (whole: [number, number][], half: [number, number][] = []): Spectrum => {
  const list = (blocks: [number, number][]) =>
    Float64Array.from(blocks.flatMap(([range, count]) => new Array<number>(count).fill(range)));
  return { ranges: list(whole), halfRanges: list(half) };
};

const use = (curve: Curve | null, factor = 1, rest: Partial<SeriesUse> = {}): SeriesUse => ({
  table: curve === null ? null : createDamageTables().of(curve, factor, null),
  scale: 1,
  gate: 0,
  ...rest,
});

describe('Miner sum', () => {
  it('of the textbook example gives its combined life', () => {
    const line = pointsCurve(
      STRESS,
      Float64Array.from(BHANDARI.cycles),
      Float64Array.from(BHANDARI.amplitudes),
    );
    const block = spectrumOf(BHANDARI.blocks.map(({ amplitude, share }) => [amplitude, share]));
    const { sum } = minerDamage(block, use(built(line)));
    expect(Math.abs(100 / sum! - BHANDARI.life)).toBeLessThan(5); // printed to four digits
  });

  it('of category 71 by hand, block by block, at a thousandth of the cycles', () => {
    const curve = standard(CATEGORY_71.shape);
    for (const { range, cycles, damage } of CATEGORY_71.blocks) {
      const { sum } = minerDamage(spectrumOf([[range, cycles / 1000]]), use(curve));
      expect(1000 * sum!).toBeCloseTo(damage, 5);
    }
    const all = spectrumOf(CATEGORY_71.blocks.map(({ range, cycles }) => [range, cycles / 1000]));
    const damage = minerDamage(all, use(curve));
    expect(1000 * damage.sum!).toBeCloseTo(CATEGORY_71.sum, 5);
    expect(damage.cycles).toBe(14_100);
    expect(damage.damagingCycles).toBe(4100); // 25 is under the cut-off
  });

  it('counts a half cycle as half', () => {
    const curve = standard('EN 1993-1-9 direct 80');
    const damage = minerDamage(spectrumOf([[80, 3]], [[80, 2]]), use(curve));
    expect(damage.sum! * 2e6).toBeCloseTo(4, 6); // 80 N/mm² lasts 2e6 cycles
    expect(damage.cycles).toBe(4);
    expect(damage.damagingCycles).toBe(4);
  });

  it('takes factors and scale on the range, before the curve', () => {
    const curve = standard('EN 1993-1-9 direct 80');
    // 0.01 MPa per N and γ = 1.35: 6000 N is 81 N/mm² factored
    const { sum, equivalentRange } = minerDamage(
      spectrumOf([[6000, 10]]),
      use(curve, 1.35, { scale: 0.01 }),
    );
    expect(sum! / (10 / cyclesToFailure(curve, 81))).toBeCloseTo(1, 6);
    expect(equivalentRange! / 6000).toBeCloseTo(1, 6);
  });

  it('takes the thickness effect with the factors', () => {
    const thick = {
      ...standard('EN 1993-1-9 direct 80'),
      thicknessEffect: { reference: 25, exponent: 0.2 },
    };
    const table = createDamageTables().of(thick, 1, 50);
    const { sum } = minerDamage(spectrumOf([[80, 1]]), use(null, 1, { table }));
    expect(sum! * cyclesToFailure(thick, 80 * 2 ** 0.2)).toBeCloseTo(1, 6);
  });

  it('divides the life by the survival divisor', () => {
    const curve = { ...standard('EN 1993-1-9 direct 80'), survivalDivisor: 3 };
    const { sum, equivalentRange } = minerDamage(spectrumOf([[80, 1]]), use(curve));
    expect(sum! * 2e6).toBeCloseTo(3, 6);
    expect(equivalentRange!).toBeCloseTo(80, 5);
  });

  it('is null without a curve, with cycles counted all the same', () => {
    expect(minerDamage(spectrumOf([[10, 2]], [[4, 1]]), use(null, 1, { gate: 5 }))).toEqual({
      sum: null,
      cycles: 2,
      damagingCycles: 0,
      equivalentRange: null,
      slope: null,
      gatedCycles: 0.5,
      gatedDamage: 0,
    });
  });

  it('is 0 where no range does damage, and the equivalent range is blank', () => {
    const { sum, equivalentRange, slope } = minerDamage(
      spectrumOf([[20, 9]]),
      use(standard('EN 1993-1-9 direct 80')),
    );
    expect([sum, equivalentRange, slope]).toEqual([0, null, null]);
  });
});

describe('threshold', () => {
  const curve = built(constantCurve(STRESS, { constant: 1e12, slope: 3, threshold: 50, unit: 1 }));

  it('holds while every factored range stays under it', () => {
    const { sum } = minerDamage(
      spectrumOf(
        [
          [49, 5],
          [20, 900],
        ],
        [[48, 1]],
      ),
      use(curve),
    );
    expect(sum).toBe(0);
  });

  it('is gone for the whole series once one range reaches it', () => {
    const spectrum = spectrumOf([[20, 900]], [[50, 1]]);
    const { sum, damagingCycles } = minerDamage(spectrum, use(curve));
    expect(sum! / ((900 * 20 ** 3 + 0.5 * 50 ** 3) / 1e12)).toBeCloseTo(1, 6);
    expect(damagingCycles).toBe(900.5);
  });

  it('is met by factored ranges', () => {
    const spectrum = spectrumOf([[40, 1]]);
    expect(minerDamage(spectrum, use(curve, 1.2)).sum).toBe(0);
    expect(minerDamage(spectrum, use(curve, 1.3)).sum! * 1e12).toBeCloseTo(52 ** 3, 0);
  });
});

describe('gate', () => {
  it('drops factored ranges under it and says what damage they would have done', () => {
    const curve = built(
      constantCurve(STRESS, { constant: 1e12, slope: 3, threshold: null, unit: 1 }),
    );
    const spectrum = spectrumOf(
      [
        [10, 5],
        [8, 4],
      ],
      [[2, 3]],
    );
    const open = minerDamage(spectrum, use(curve, 1.25));
    const gated = minerDamage(spectrum, use(curve, 1.25, { gate: 10 }));
    expect(gated.cycles).toBe(9); // 8 × 1.25 is the gate's size
    expect(gated.gatedCycles).toBe(1.5);
    expect(gated.gatedDamage * 1e12).toBeCloseTo(1.5 * 2.5 ** 3, 4);
    expect((gated.sum! + gated.gatedDamage) / open.sum!).toBeCloseTo(1, 12);
  });
});

describe('equivalent range', () => {
  it('of one slope m is the mth-power mean', () => {
    const curve = built(
      constantCurve(STRESS, { constant: 1e12, slope: 3, threshold: null, unit: 1 }),
    );
    const blocks = fc.array(fc.double({ min: 1, max: 300, noNaN: true }), { minLength: 1 });
    fc.assert(
      fc.property(blocks, (ranges) => {
        const spectrum = { ranges: Float64Array.from(ranges), halfRanges: new Float64Array(0) };
        const { equivalentRange, slope } = minerDamage(spectrum, use(curve, 1.35));
        const cubes = ranges.map((range) => range ** 3).reduce((a, b) => a + b, 0);
        expect(equivalentRange! / Math.cbrt(cubes / ranges.length)).toBeCloseTo(1, 6);
        expect(slope).toBe(3);
      }),
      { seed: 3, numRuns: 200 },
    );
  });

  it('repeated n_d times does the same damage, on a curve with a kink and a cut-off', () => {
    const curve = standard('EN 1993-1-9 direct 80');
    const damage = minerDamage(
      spectrumOf([
        [90, 20],
        [45, 500],
        [10, 9000],
      ]),
      use(curve, 1.15),
    );
    const lives = cyclesToFailure(curve, 1.15 * damage.equivalentRange!);
    expect(damage.damagingCycles / lives / damage.sum!).toBeCloseTo(1, 9);
    expect(damage.slope).toBeCloseTo(5, 9); // it lies under the kink at 58.9
  });
});
