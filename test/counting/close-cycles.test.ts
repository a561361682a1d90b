import { describe, expect, it } from 'vitest';
import { closeCycles } from '../../src/counting/close-cycles.ts';
import { FloatList } from '../../src/counting/float-list.ts';
import { FOUR_POINT } from '../reference/astm-e1049.ts';
import { countsByRange } from './counts.ts';

describe('four-point method', () => {
  it.each(FOUR_POINT)('closes the published cycles of $series', ({ series, counts, open }) => {
    const stack = new FloatList();
    const ranges = new FloatList();
    closeCycles(Float64Array.from(series), series.length, stack, ranges);
    const closed = ranges.data.slice(0, ranges.length);
    expect(countsByRange({ ranges: closed, halfRanges: new Float64Array(0) })).toEqual(counts);
    expect([...stack.data.subarray(0, stack.length)]).toEqual(open);
  });
});
