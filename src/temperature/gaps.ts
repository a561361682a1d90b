import { BRIDGED, FILLED, type RecordAxis, type Zone } from '../model.ts';
import { findSteps } from './steps.ts';

const HOUR = 3_600_000;

/** A step longer than this many median steps holds missing rows. */
const LONG_STEP = 1.5;

/** Hours of a year of 365.25 days. */
const YEAR = 8766;

/**
 * The time axis of a record, with its missing rows.
 *
 * @param times time of each sample [ms], rising; at least two
 * @param fillUpTo longest gap that is filled [h]
 */
export function timeAxis(times: Float64Array, fillUpTo: number): RecordAxis {
  const { stepHours, sampleHours } = findSteps(times);
  const axis = { times, stepHours, sampleHours, filledHoursBefore: new Float64Array(times.length) };
  for (let i = 1; i < times.length; i++) {
    const missing = missingHours(axis, i - 1, i);
    if (isShort(missing, fillUpTo)) axis.filledHoursBefore[i] = missing;
  }
  return axis;
}

type StepAxis = Omit<RecordAxis, 'filledHoursBefore'>;

/** The step in force at a sample [h]. */
function stepAt({ stepHours, sampleHours }: StepAxis, sample: number): number {
  return sampleHours === null ? stepHours : sampleHours[sample];
}

/** Hours of the whole steps that are missing between two samples. */
function missingHours(axis: StepAxis, from: number, to: number): number {
  const step = stepAt(axis, to);
  const steps = (axis.times[to] - axis.times[from]) / HOUR / step;
  return steps > LONG_STEP ? (Math.round(steps) - 1) * step : 0;
}

/** True where a row or more is missing between a sample and the one before it. */
export function isRowMissingBefore(axis: RecordAxis, sample: number): boolean {
  return missingHours(axis, sample - 1, sample) > 0;
}

/** True for a gap up to the limit; hours that are sums of steps may be off in the last digit. */
function isShort(hours: number, fillUpTo: number): boolean {
  return hours <= fillUpTo * (1 + 1e-9);
}

/** A stretch without values. */
export interface MissingStretch {
  /** When the first of it was due [ms]. */
  readonly time: number;
  readonly hours: number;
  /** Short enough to be filled and to count as covered. */
  readonly filled: boolean;
}

/**
 * The stretches over which a channel has no value: blank, without a row, or both.
 *
 * @param values the channel, `NaN` where missing
 * @param axis the record's time axis
 * @param fillUpTo longest gap that is filled [h]
 */
export function missingStretches(
  values: Float64Array,
  axis: RecordAxis,
  fillUpTo: number,
): MissingStretch[] {
  const stretches: MissingStretch[] = [];
  const { times } = axis;
  let last = -1;
  for (let i = 0; i < values.length; i++) {
    if (Number.isNaN(values[i])) continue;
    if (last < 0 && i > 0) stretches.push(atEnd(axis, 0, i));
    const hours = last < 0 ? 0 : missingHours(axis, last, i);
    if (hours > 0) {
      const time = times[last] + stepAt(axis, i) * HOUR;
      stretches.push({ time, hours, filled: isShort(hours, fillUpTo) });
    }
    last = i;
  }
  if (last < values.length - 1) stretches.push(atEnd(axis, last + 1, values.length));
  return stretches;
}

/** The samples from one up to another, before the first value or behind the last one. */
function atEnd(axis: RecordAxis, from: number, to: number): MissingStretch {
  let hours = 0;
  for (let i = from; i < to; i++) hours += stepAt(axis, i);
  return { time: axis.times[from], hours, filled: false };
}

/** A temperature history without gaps, and the standing of each of its samples. */
export interface Bridged {
  /** [°C] */
  readonly temperature: Float64Array;
  readonly standing: Uint8Array;
}

/**
 * Bridges what is missing in a channel by straight lines in time. A gap up to `fillUpTo` is filled and counts as
 * covered; a longer one does not. Before the first value and after the last the nearest is held and does not.
 *
 * @param values temperature at each sample [°C], `NaN` where missing, at least one given
 * @param axis the record's time axis
 * @param fillUpTo longest gap that is filled [h]
 */
export function bridgeGaps(values: Float64Array, axis: RecordAxis, fillUpTo: number): Bridged {
  const temperature = values.slice();
  const standing = new Uint8Array(values.length);
  let last = -1;
  for (let i = 0; i < values.length; i++) {
    if (Number.isNaN(values[i])) continue;
    if (i > last + 1) bridge(temperature, standing, axis, { from: last, to: i, fillUpTo });
    last = i;
  }
  temperature.fill(temperature[last], last + 1);
  standing.fill(BRIDGED, last + 1);
  return { temperature, standing };
}

interface Gap {
  /** The samples with a value before and after it; −1 at the start of the record. */
  readonly from: number;
  readonly to: number;
  readonly fillUpTo: number;
}

function bridge(
  temperature: Float64Array,
  standing: Uint8Array,
  axis: RecordAxis,
  { from, to, fillUpTo }: Gap,
): void {
  const { times } = axis;
  if (from < 0) {
    temperature.fill(temperature[to], 0, to);
    standing.fill(BRIDGED, 0, to);
    return;
  }
  const apart = times[to] - times[from];
  standing.fill(isShort(missingHours(axis, from, to), fillUpTo) ? FILLED : BRIDGED, from + 1, to);
  const rise = temperature[to] - temperature[from];
  for (let i = from + 1; i < to; i++) {
    temperature[i] = temperature[from] + ((times[i] - times[from]) / apart) * rise;
  }
}

/**
 * Hours that the record covers for zones taken together: the step in force for each sample that is valid or
 * filled in all of them, and the rows missing before it that were filled.
 */
export function coveredHours(axis: RecordAxis, zones: readonly Zone[]): number {
  const { filledHoursBefore } = axis;
  const isCovered = (i: number) => zones.every(({ standing }) => standing[i] !== BRIDGED);
  let hours = 0;
  let before = false;
  for (let i = 0; i < filledHoursBefore.length; i++) {
    const now = isCovered(i);
    if (now) hours += stepAt(axis, i);
    if (now && before) hours += filledHoursBefore[i];
    before = now;
  }
  return hours;
}

/**
 * Years that one pass of the record stands for.
 *
 * @param covered covered hours [h]
 * @param represents years that the user gave, or `null`
 * @returns `represents`, or covered hours / 8,766, taken as whole within 1 % of a whole number
 */
export function yearsOf(covered: number, represents: number | null): number {
  if (represents !== null) return represents;
  const years = covered / YEAR;
  const whole = Math.round(years);
  return whole >= 1 && Math.abs(years - whole) <= 0.01 * whole ? whole : years;
}

/** True where a time [ms] lies in a gap of the zone that does not count as covered. */
export function isInGap(zone: Zone, axis: RecordAxis, time: number): boolean {
  const { times, filledHoursBefore } = axis;
  const after = times.findIndex((sample) => sample >= time);
  if (times[after] === time) return zone.standing[after] === BRIDGED;
  const long = missingHours(axis, after - 1, after) > 0;
  const sides = [zone.standing[after - 1], zone.standing[after]];
  return sides.includes(BRIDGED) || (long && filledHoursBefore[after] === 0);
}
