import { describe, expect, it } from 'vitest';
import { recordYears } from '../../src/temperature/record-years.ts';
import { axisOf } from '../support/clear-day.ts';

describe('the years of a record', () => {
  it('are calendar years where it begins with one, leap days and hour-ending stamps included', () => {
    // 2031 and 2033 have 8,760 hours, 2032 has 8,784: the calendar's own
    const { times } = axisOf(Date.UTC(2031, 0, 1, 1), 8760 + 8784 + 8760);
    expect(recordYears(times)).toEqual([
      { from: 0, to: 8760 },
      { from: 8760, to: 17_544 },
      { from: 17_544, to: 26_304 },
    ]);
  });

  it('run from anniversary to anniversary, the last one as short as it is', () => {
    const { times } = axisOf(Date.UTC(2030, 6, 1), 8760 + 100);
    expect(recordYears(times)).toEqual([
      { from: 0, to: 8760 },
      { from: 8760, to: 8860 },
    ]);
  });

  it('that hold no sample are left out', () => {
    const times = Float64Array.of(Date.UTC(2030, 0, 1), Date.UTC(2033, 5, 1));
    expect(recordYears(times)).toEqual([
      { from: 0, to: 1 },
      { from: 1, to: 2 },
    ]);
  });
});
