import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cyclesToFailure } from '../../src/damage/cycles-to-failure.ts';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import { minerDamage } from '../../src/damage/miner.ts';
import { rangeBins } from '../../src/damage/range-bins.ts';
import { standard } from './built.ts';

const curve = standard('AISC 360 C');
const use = { table: createDamageTables().of(curve, 1.2, null), scale: 0.01, gate: 0 };
const ranges = fc
  .array(fc.double({ min: 1, max: 2e4, noNaN: true }), { minLength: 1, maxLength: 80 })
  .map((values) => Float64Array.from(values));

describe('cycles table', () => {
  it('holds every cycle once and adds up to the Miner sum', () => {
    fc.assert(
      fc.property(ranges, ranges, fc.constantFrom(0, 500), (whole, halves, gate) => {
        const spectrum = { ranges: whole, halfRanges: halves };
        const gated = { ...use, gate };
        const bins = rangeBins(spectrum, gated);
        const { sum, cycles } = minerDamage(spectrum, gated);
        const total = (values: readonly number[]) => values.reduce((a, b) => a + b, 0);
        expect(total(bins.map((bin) => bin.count))).toBe(cycles);
        expect(Math.abs(total(bins.map((bin) => bin.damage!)) - sum!)).toBeLessThanOrEqual(
          1e-12 * sum!,
        );
      }),
      { seed: 24, numRuns: 200 },
    );
  });

  it('has equal bins of a round width from 0 to over the largest range', () => {
    const spectrum = { ranges: Float64Array.of(8900, 1200, 30), halfRanges: Float64Array.of(500) };
    const bins = rangeBins(spectrum, use);
    expect(bins.length).toBe(18);
    expect(bins.map(({ from, to }) => to - from)).toEqual(new Array(18).fill(500));
    expect(bins.map(({ from }) => from)).toEqual(bins.map((_, i) => 500 * i));
    expect(bins.map(({ count }) => count).filter((count) => count > 0)).toEqual([1, 0.5, 1, 1]);
    expect(bins[17].count).toBe(1);
  });

  it('gives cycles to failure at the factored mid-range', () => {
    const spectrum = { ranges: Float64Array.of(8900), halfRanges: new Float64Array(0) };
    const [, , , bin] = rangeBins(spectrum, use);
    expect(bin.cyclesToFailure).toBe(cyclesToFailure(curve, 1750 * 1.2 * 0.01, true));
    const under = { ranges: Float64Array.of(5000), halfRanges: new Float64Array(0) };
    expect(rangeBins(under, use)[0].cyclesToFailure).toBe(Number.POSITIVE_INFINITY);
  });

  it('may stand in another unit than the series', () => {
    const spectrum = { ranges: Float64Array.of(8900, 1200), halfRanges: new Float64Array(0) };
    const bins = rangeBins(spectrum, use, 0.01);
    expect(bins.map(({ from }) => from)).toEqual(
      rangeBins(spectrum, use).map((bin) => bin.from / 100),
    );
    expect(bins.map((bin) => bin.damage)).toEqual(
      rangeBins(spectrum, use).map((bin) => bin.damage),
    );
  });

  it('without a curve has counts only, and without a cycle no bins', () => {
    const spectrum = { ranges: Float64Array.of(10), halfRanges: new Float64Array(0) };
    const bins = rangeBins(spectrum, { ...use, table: null });
    expect(bins.at(-1)).toMatchObject({ count: 1, damage: null, cyclesToFailure: null });
    const nothing = { ranges: new Float64Array(0), halfRanges: new Float64Array(0) };
    expect(rangeBins(nothing, use)).toEqual([]);
  });
});
