import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fastChanges } from '../../src/temperature/fast-changes.ts';
import { gapEdges } from '../../src/temperature/gap-edges.ts';
import { timeAxis } from '../../src/temperature/gaps.ts';
import { stuckStretches } from '../../src/temperature/stuck-stretches.ts';
import { zoneOf } from '../../src/temperature/zone.ts';

const HOUR = 3_600_000;
const _ = Number.NaN;
const hourly = (count: number) => Float64Array.from({ length: count }, (_, i) => i * HOUR);
const LIMITS = { over: 15, overPerHour: 30 };

// Expected values are worked by hand from the rules; there is no source outside for them.
describe('fast changes', () => {
  const changes = (...values: number[]) =>
    fastChanges(Float64Array.from(values), hourly(values.length), LIMITS);

  it('are spikes where the channel comes back within three samples', () => {
    expect(changes(10, 11, 85, 12, 13)).toEqual({ spikes: [{ first: 2, last: 2 }], jumps: [] });
    expect(changes(10, 85, 84, 86, 12)).toEqual({ spikes: [{ first: 1, last: 3 }], jumps: [] });
    expect(changes(10, -60, _, 12, 13)).toEqual({ spikes: [{ first: 1, last: 1 }], jumps: [] });
  });

  it('are jumps where it does not', () => {
    expect(changes(10, 11, 85, 84, 86, 85, 84)).toEqual({ spikes: [], jumps: [2] });
    expect(changes(10, 85)).toEqual({ spikes: [], jumps: [1] });
  });

  it('are none up to the limits, the rate over a longer step included', () => {
    expect(changes(0, 30, 0, 30)).toEqual({ spikes: [], jumps: [] });
    expect(changes(0, _, 60, 60)).toEqual({ spikes: [], jumps: [] });
    const minutes = Float64Array.from({ length: 3 }, (_, i) => i * 60_000);
    expect(fastChanges(Float64Array.of(0, 15, 0), minutes, LIMITS).spikes).toEqual([]);
    expect(fastChanges(Float64Array.of(0, 15.1, 0), minutes, LIMITS).spikes.length).toBe(1);
  });

  it('are found wherever one value of a slow channel is thrown off', () => {
    const thrown = fc.tuple(fc.integer({ min: 1, max: 47 }), fc.boolean());
    fc.assert(
      fc.property(thrown, ([at, up]) => {
        const values = hourly(49).map((time) => 10 * Math.sin(time / HOUR / 4));
        expect(fastChanges(values, hourly(49), LIMITS)).toEqual({ spikes: [], jumps: [] });
        values[at] += up ? 70 : -70;
        const found = fastChanges(values, hourly(49), LIMITS);
        expect(found).toEqual({ spikes: [{ first: at, last: at }], jumps: [] });
      }),
      { seed: 5, numRuns: 100 },
    );
  });
});

describe('stuck stretches', () => {
  const lively = (count: number) => Array.from({ length: count }, (_, i) => i % 2);

  it('are unchanged for longer than allowed, blanks or not', () => {
    const values = Float64Array.from([...lively(20), 5, 5, _, 5, 5, 5, ...lively(20)]);
    const at = hourly(values.length);
    expect(stuckStretches(values, at, 4 * HOUR)).toEqual([{ first: 20, last: 25 }]);
    expect(stuckStretches(values, at, 5 * HOUR)).toEqual([]);
  });

  it('are none in a channel that always moves so slowly, but for one far longer than its own', () => {
    const slow = Array.from({ length: 30 }, (_, i) => Array(31).fill(i)).flat();
    const longer = [...slow, ...Array(152).fill(99)];
    expect(stuckStretches(Float64Array.from(slow), hourly(slow.length), 24 * HOUR)).toEqual([]);
    const found = stuckStretches(Float64Array.from(longer), hourly(longer.length), 24 * HOUR);
    expect(found).toEqual([{ first: 930, last: 1081 }]);
  });

  it('are none in a channel that never changes', () => {
    expect(stuckStretches(new Float64Array(500).fill(21), hourly(500), 24 * HOUR)).toEqual([]);
  });
});

describe('the edges of gaps', () => {
  it('are the samples in a gap and those beside it, of missing rows too', () => {
    const at = Float64Array.from([0, 1, 2, 3, 4, 5, 9, 10, 11], (hour) => hour * HOUR);
    const axis = timeAxis(at, 3);
    const zone = zoneOf('rail', Float64Array.of(0, 1, _, 3, 4, 5, 6, 7, 8), axis, 3);
    expect([...(gapEdges(axis, [zone]) ?? [])]).toEqual([0, 1, 1, 1, 0, 1, 1, 0, 0]);
  });

  it('are none where nothing is missing', () => {
    const axis = timeAxis(hourly(5), 3);
    expect(gapEdges(axis, [zoneOf('rail', hourly(5), axis, 3)])).toBeNull();
  });
});
