import { describe, expect, it } from 'vitest';
import { gateSpectrum } from '../../src/counting/gate.ts';

const spectrum = { ranges: Float64Array.of(1, 5, 3), halfRanges: Float64Array.of(2, 3) };

describe('gate', () => {
  it('keeps ranges of its own size and drops those under it', () => {
    const { kept, dropped } = gateSpectrum(spectrum, 3);
    expect([...kept.ranges, ...kept.halfRanges]).toEqual([5, 3, 3]);
    expect([...dropped.ranges, ...dropped.halfRanges]).toEqual([1, 2]);
  });

  it('of 0 drops nothing', () => {
    const { kept, dropped } = gateSpectrum(spectrum, 0);
    expect(kept).toEqual(spectrum);
    expect(dropped.ranges.length + dropped.halfRanges.length).toBe(0);
  });
});
