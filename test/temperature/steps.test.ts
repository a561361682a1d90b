import { describe, expect, it } from 'vitest';
import { coveredHours, missingStretches, timeAxis } from '../../src/temperature/gaps.ts';
import { findSteps } from '../../src/temperature/steps.ts';
import { zoneOf } from '../../src/temperature/zone.ts';

const HOUR = 3_600_000;

/** Times that follow each other by the given steps [h]. */
function stepped(...steps: number[]): Float64Array {
  let hour = 0;
  return Float64Array.from([0, ...steps.map((step) => (hour += step))], (at) =>
    Math.round(at * HOUR),
  );
}
const times = (count: number, step: number) => Array.from({ length: count }, () => step);

// Expected values are worked by hand from the rule; there is no source outside for them.
describe('the step of a record', () => {
  it('is the median, and one throughout where single steps differ', () => {
    const steps = findSteps(stepped(...times(10, 1), 5, ...times(5, 1), 2, 2, 2, ...times(9, 1)));
    expect(steps).toEqual({ stepHours: 1, sampleHours: null, changes: [] });
  });

  it('changes where six steps or more are of another length', () => {
    const { sampleHours, changes } = findSteps(stepped(...times(8, 1 / 6), ...times(6, 1)));
    expect(changes).toEqual([{ at: 9, from: 1 / 6, to: 1 }]);
    expect([...(sampleHours ?? [])]).toEqual([...times(9, 1 / 6), ...times(6, 1)]);
  });

  it('covers each sample by the step in force there, and finds no gap in a coarser part', () => {
    const at = stepped(...times(11, 1 / 6), ...times(8, 1));
    const axis = timeAxis(at, 3);
    const zone = zoneOf(
      'rail',
      at.map(() => 20),
      axis,
      3,
    );
    expect(missingStretches(zone.temperature, axis, 3)).toEqual([]);
    expect(coveredHours(axis, [zone])).toBeCloseTo(12 / 6 + 8, 12);
  });

  it('measures a gap by the step in force there', () => {
    const at = stepped(...times(12, 1 / 6), ...times(7, 1), 4, ...times(7, 1));
    const axis = timeAxis(at, 2);
    const found = missingStretches(
      at.map(() => 20),
      axis,
      2,
    );
    expect(found).toEqual([{ time: 10 * HOUR, hours: 3, filled: false }]);
  });
});

describe('missing stretches', () => {
  it('are told with their hours, at both ends of the record too', () => {
    const at = stepped(...times(9, 1));
    const values = Float64Array.of(
      Number.NaN,
      1,
      2,
      Number.NaN,
      4,
      5,
      6,
      7,
      Number.NaN,
      Number.NaN,
    );
    expect(missingStretches(values, timeAxis(at, 3), 3)).toEqual([
      { time: 0, hours: 1, filled: false },
      { time: 3 * HOUR, hours: 1, filled: true },
      { time: 8 * HOUR, hours: 2, filled: false },
    ]);
  });
});
