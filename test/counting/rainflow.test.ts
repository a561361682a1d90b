import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createRainflow } from '../../src/counting/rainflow.ts';
import { E1049 } from '../reference/astm-e1049.ts';
import { counted, countsByRange, halvesOf, literalHalves } from './counts.ts';
import {
  literalRainflow,
  literalRepeating,
  reservoirRanges,
  reversalsOf,
} from './literal-rainflow.ts';

const SEED = { seed: 1049, numRuns: 400 };

/** Small whole numbers, so that equal ranges are common, or eighths in a wide span, so that they are rare. */
const series = fc.oneof(
  fc.array(fc.integer({ min: -4, max: 4 }), { minLength: 1, maxLength: 60 }),
  fc.array(
    fc.integer({ min: -8000, max: 8000 }).map((value) => value / 8),
    { minLength: 1, maxLength: 60 },
  ),
);

describe('published sequences', () => {
  it.each(E1049)('ASTM E1049-85: $name', ({ series, residue, counts }) => {
    expect(countsByRange(counted(series, residue))).toEqual(counts);
  });

  it('closes only one whole cycle of Fig. 6, from −1 to 3', () => {
    const { ranges, halfRanges } = counted(E1049[0].series, 'half');
    expect([...ranges]).toEqual([4]);
    expect(halfRanges.length).toBe(6);
  });
});

describe('an open history', () => {
  it('has the counts of 5.4.4 taken literally', () => {
    fc.assert(
      fc.property(series, (values) => {
        expect(halvesOf(counted(values, 'half'))).toEqual(literalHalves(literalRainflow(values)));
      }),
      SEED,
    );
  });

  it('has the same whole cycles too, where no two ranges are equal', () => {
    const uneven = fc.noBias(fc.array(fc.integer({ min: 0, max: 1e9 }), { minLength: 3 }));
    fc.assert(
      fc.property(uneven, (values) => {
        const whole = literalRainflow(values).filter(({ weight }) => weight === 1);
        const ranges = whole.map(({ from, to }) => Math.abs(to - from));
        fc.pre(ranges.every((range) => range > 1e4));
        expect([...counted(values, 'half').ranges].sort()).toEqual(ranges.sort());
      }),
      SEED,
    );
  });

  it('counts (reversals − 1)/2 cycles, which cover the whole way of the series', () => {
    fc.assert(
      fc.property(series, (values) => {
        const reversals = reversalsOf(values);
        const halves = halvesOf(counted(values, 'half'));
        expect(halves.length).toBe(reversals.length - 1);
        expect(sum(halves)).toBeCloseTo(wayOf(reversals), 9);
      }),
      SEED,
    );
  });
});

describe('a history that repeats', () => {
  it('has the cycles of 5.4.5 taken literally', () => {
    fc.assert(
      fc.property(series, (values) => {
        const { ranges, halfRanges } = counted(values, 'repeat');
        expect([...ranges].sort()).toEqual(
          literalRepeating(values)
            .map(({ from, to }) => Math.abs(to - from))
            .sort(),
        );
        expect(halfRanges.length).toBe(0);
      }),
      SEED,
    );
  });

  it('agrees with the reservoir method of EN 1993-1-9 Annex A', () => {
    fc.assert(
      fc.property(series, (values) => {
        const top = values.indexOf(Math.max(...values));
        const closed = [...values.slice(top), ...values.slice(0, top + 1)];
        expect([...counted(values, 'repeat').ranges].sort()).toEqual(
          reservoirRanges(closed).sort(),
        );
      }),
      SEED,
    );
  });

  it('may start anywhere', () => {
    fc.assert(
      fc.property(series, fc.nat(), (values, at) => {
        const start = at % values.length;
        const turned = [...values.slice(start), ...values.slice(0, start)];
        expect(halvesOf(counted(turned, 'repeat'))).toEqual(halvesOf(counted(values, 'repeat')));
      }),
      SEED,
    );
  });

  it('covers twice the whole way of the closed series', () => {
    fc.assert(
      fc.property(series, (values) => {
        const halves = halvesOf(counted(values, 'repeat'));
        expect(sum(halves)).toBeCloseTo(wayOf([...values, values[0]]), 9);
      }),
      SEED,
    );
  });
});

describe('arriving in blocks', () => {
  it('makes no difference, whatever their sizes', () => {
    fc.assert(
      fc.property(series, fc.array(fc.integer({ min: 0, max: 7 })), (values, sizes) => {
        const counter = createRainflow();
        const all = Float64Array.from(values);
        let done = 0;
        for (const size of sizes) {
          const count = Math.min(size, all.length - done);
          counter.push(all, done, 1, count);
          done += count;
        }
        counter.push(all, done, 1, all.length - done);
        expect(counter.finish('half')).toEqual(counted(values, 'half'));
      }),
      SEED,
    );
  });

  it('takes one column of a row-major block', () => {
    const [first, second] = [E1049[0].series, E1049[2].series];
    const block = Float64Array.from(first.flatMap((value, i) => [value, second[i], 7]));
    const counters = [createRainflow(), createRainflow(), createRainflow()];
    counters.forEach((counter, column) => {
      counter.push(block, column, 3, first.length);
    });
    expect(countsByRange(counters[0].finish('half'))).toEqual(E1049[0].counts);
    expect(countsByRange(counters[1].finish('repeat'))).toEqual(E1049[2].counts);
    expect(halvesOf(counters[2].finish('half'))).toEqual([]);
  });

  it('counts a long series as 5.4.4 does', () => {
    const long = Array.from({ length: 20_000 }, (_, i) =>
      Math.round(1e5 * Math.sin(i) * Math.sin(i * i * 0.37)),
    );
    expect(halvesOf(counted(long, 'half', 1))).toEqual(literalHalves(literalRainflow(long)));
  });

  it('may be asked twice and used again', () => {
    const counter = createRainflow();
    const { series: values, counts } = E1049[0];
    counter.push(Float64Array.of(3, -8, 11), 0, 1, 3);
    counter.reset();
    counter.push(Float64Array.from(values), 0, 1, values.length);
    expect(countsByRange(counter.finish('repeat'))).toEqual(E1049[2].counts);
    expect(countsByRange(counter.finish('half'))).toEqual(counts);
  });
});

describe('what is not a cycle', () => {
  it('drops out: repeated samples and samples on the way', () => {
    fc.assert(
      fc.property(series, fc.integer({ min: 1, max: 3 }), (values, times) => {
        const stretched = values.flatMap((value, i) => {
          const half = i === 0 ? value : (value + values[i - 1]) / 2;
          return [half, ...new Array<number>(times).fill(value)];
        });
        expect(counted(stretched, 'half')).toEqual(counted(values, 'half'));
      }),
      SEED,
    );
  });

  it.each([[[]], [[5]], [[5, 5, 5]]])('a series of %j has none', (values) => {
    for (const residue of ['repeat', 'half'] as const) {
      expect(halvesOf(counted(values, residue))).toEqual([]);
      expect(counted(values, residue).largestRange).toBe(0);
    }
  });

  it('is a range under a millionth of the largest, in either residue', () => {
    const values = [0, 1e6, 500, 500.9, 0, 0.9];
    expect(halvesOf(counted(values, 'half'))).toEqual([1e6, 1e6]);
    expect(halvesOf(counted(values, 'repeat'))).toEqual([1e6, 1e6]);
    expect(halvesOf(counted([0, 1e6, 500, 502, 0], 'half'))).toEqual([2, 2, 1e6, 1e6]);
  });

  it('is a range under the floor', () => {
    const { ranges } = counted([0, 10, 4, 6, 0], 'repeat', 2.5);
    expect([...ranges]).toEqual([10]);
    expect(counted([0, 10, 4, 6, 0], 'repeat', 20).ranges.length).toBe(0);
  });
});

describe('bounds', () => {
  it('are the series’ own', () => {
    fc.assert(
      fc.property(series, fc.constantFrom(0, 0.6, 1), (values, compressionShare) => {
        const counter = createRainflow({ compressionShare });
        counter.push(Float64Array.from(values), 0, 1, values.length);
        const { max, min, largestRange } = counter.finish('repeat');
        const share = (value: number) => (value < 0 ? compressionShare * value : value);
        expect(max).toBe(Math.max(...values));
        expect(min).toBe(Math.min(...values));
        expect(largestRange).toBeCloseTo(share(max) - share(min), 9);
      }),
      SEED,
    );
  });
});

describe('compression share', () => {
  // EN 1993-1-9 7.2.1 (from memory): 60 % of the compressive part of a cycle counts in details not welded.
  it.each([0, 0.6, 1])('of %d on the history equals the same on each cycle', (share) => {
    fc.assert(
      fc.property(series, (values) => {
        const counter = createRainflow({ compressionShare: share });
        counter.push(Float64Array.from(values), 0, 1, values.length);
        const cycles = literalHalves(literalRainflow(values), ({ from, to }) => {
          const [low, high] = [Math.min(from, to), Math.max(from, to)];
          const tension = Math.max(high, 0) - Math.max(low, 0);
          return tension + share * (Math.min(high, 0) - Math.min(low, 0));
        }).filter((range) => range > 1e-9);
        const halves = halvesOf(counter.finish('half'));
        expect(halves.length).toBe(cycles.length);
        halves.forEach((range, i) => {
          expect(range).toBeCloseTo(cycles[i], 9);
        });
      }),
      SEED,
    );
  });
});

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}

/** Total variation: how far the series goes up and down in all. */
function wayOf(values: readonly number[]): number {
  return sum(values.slice(1).map((value, i) => Math.abs(value - values[i])));
}
