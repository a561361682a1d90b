import { describe, expect, it } from 'vitest';
import { BRIDGED, FILLED, VALID } from '../../src/model.ts';
import {
  bridgeGaps,
  coveredHours,
  isInGap,
  timeAxis,
  yearsOf,
} from '../../src/temperature/gaps.ts';
import { constantZone, temperatureAt, zoneOf } from '../../src/temperature/zone.ts';

const HOUR = 3_600_000;
const _ = Number.NaN;
const at = (...hours: number[]) => Float64Array.from(hours, (hour) => hour * HOUR);
const values = (...given: number[]) => Float64Array.from(given);

// Every expected value here is worked by hand from the rules; there is no source outside for them.
describe('gaps', () => {
  it('finds the median step and the rows that are missing', () => {
    const axis = timeAxis(at(0, 1, 2, 5, 6, 10, 11.4), 2);
    expect(axis.stepHours).toBe(1);
    // 2 → 5 misses two rows, 6 → 10 three, which is too long; 1.4 steps miss none.
    expect([...axis.filledHoursBefore]).toEqual([0, 0, 0, 2, 0, 0, 0]);
  });

  it('takes just over one and a half steps for one missing row', () => {
    const axis = timeAxis(at(0, 1, 2, 3.5, 5.1), 3);
    expect([...axis.filledHoursBefore]).toEqual([0, 0, 0, 0, 1]);
  });

  it('bridges blanks by a straight line in time', () => {
    const axis = timeAxis(at(0, 1, 2, 3, 4, 5, 6, 7), 2);
    const { temperature, standing } = bridgeGaps(values(0, _, _, 3, _, _, _, 11), axis, 2);
    expect([...temperature]).toEqual([0, 1, 2, 3, 5, 7, 9, 11]);
    expect([...standing]).toEqual([VALID, FILLED, FILLED, VALID, BRIDGED, BRIDGED, BRIDGED, VALID]);
  });

  it('holds the nearest value at both ends, and covers neither', () => {
    const axis = timeAxis(at(0, 1, 2, 3), 9);
    const { temperature, standing } = bridgeGaps(values(_, 4, 6, _), axis, 9);
    expect([...temperature]).toEqual([4, 4, 6, 6]);
    expect([...standing]).toEqual([BRIDGED, VALID, VALID, BRIDGED]);
  });

  it('takes blanks and missing rows side by side as one gap', () => {
    // Blank at 2, rows 3 and 4 missing: three hours.
    const axis = timeAxis(at(0, 1, 2, 5, 6, 7, 8), 2);
    const south = zoneOf('south', values(0, 1, _, 5, 6, 7, 8), axis, 2);
    expect([...south.standing]).toEqual([0, 0, BRIDGED, 0, 0, 0, 0]);
    expect([...south.temperature]).toEqual([0, 1, 2, 5, 6, 7, 8]);
    expect(coveredHours(axis, [south])).toBe(6);
  });

  it('covers the hours that are valid or filled in every zone', () => {
    const axis = timeAxis(at(0, 1, 2, 3, 6, 7), 2);
    const one = zoneOf('one', values(0, _, 2, 3, 6, 7), axis, 2);
    const other = zoneOf('other', values(0, 1, 2, 3, 6, _), axis, 2);
    const hall = constantZone('hall', 21, axis);
    // Six samples and two filled rows; without the last sample where the other zone is asked for.
    expect(coveredHours(axis, [one])).toBe(8);
    expect(coveredHours(axis, [one, hall, other])).toBe(7);
  });

  it('does not lose a filled gap to the last digit of its steps', () => {
    const axis = timeAxis(at(...Array.from({ length: 30 }, (__, i) => i / 6)), 3);
    const blank = Float64Array.from(axis.times, (__, i) => (i > 0 && i < 19 ? _ : i));
    expect(bridgeGaps(blank, axis, 3).standing[10]).toBe(FILLED);
    expect(bridgeGaps(blank, axis, 2.9).standing[10]).toBe(BRIDGED);
  });

  it('turns covered hours into years', () => {
    expect(yearsOf(8759, null)).toBe(1);
    expect(yearsOf(8766 * 2 * 0.991, null)).toBe(2);
    expect(yearsOf(8766 * 0.98, null)).toBeCloseTo(0.98, 12);
    expect(yearsOf(87.66, null)).toBeCloseTo(0.01, 12);
    expect(yearsOf(8759, 0.25)).toBe(0.25);
  });

  it('reads a zone between samples, and says where that is a guess', () => {
    const axis = timeAxis(at(0, 1, 2, 6, 7, 8), 2);
    const zone = zoneOf('south', values(0, 10, 20, 60, _, 80), axis, 0);
    expect(temperatureAt(zone, axis, 0.25 * HOUR)).toBe(2.5);
    expect(temperatureAt(zone, axis, 6 * HOUR)).toBe(60);
    expect(temperatureAt(zone, axis, -1)).toBeNull();
    expect(temperatureAt(zone, axis, 8 * HOUR + 1)).toBeNull();
    const guesses = [0, 0.5, 2, 3, 6, 6.5, 7, 8].filter((t) => isInGap(zone, axis, t * HOUR));
    expect(guesses).toEqual([3, 6.5, 7]);
  });
});
