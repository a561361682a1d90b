import { BRIDGED, FILLED, type RecordAxis, type Zone } from '../model.ts';

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
  const steps = Float64Array.from({ length: times.length - 1 }, (_, i) => times[i + 1] - times[i]);
  const stepHours = steps.sort()[(steps.length - 1) >> 1] / HOUR;
  const filledHoursBefore = new Float64Array(times.length);
  for (let i = 1; i < times.length; i++) {
    const missing = missingHours(times[i] - times[i - 1], stepHours);
    if (isShort(missing, fillUpTo)) filledHoursBefore[i] = missing;
  }
  return { times, stepHours, filledHoursBefore };
}

/** Hours of the whole steps that are missing between two samples [ms apart]. */
function missingHours(apart: number, stepHours: number): number {
  const steps = apart / HOUR / stepHours;
  return steps > LONG_STEP ? (Math.round(steps) - 1) * stepHours : 0;
}

/** True for a gap up to the limit; hours that are sums of steps may be off in the last digit. */
function isShort(hours: number, fillUpTo: number): boolean {
  return hours <= fillUpTo * (1 + 1e-9);
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
  { times, stepHours }: RecordAxis,
  { from, to, fillUpTo }: Gap,
): void {
  if (from < 0) {
    temperature.fill(temperature[to], 0, to);
    standing.fill(BRIDGED, 0, to);
    return;
  }
  const apart = times[to] - times[from];
  const missing = Math.round(apart / HOUR / stepHours - 1) * stepHours;
  standing.fill(isShort(missing, fillUpTo) ? FILLED : BRIDGED, from + 1, to);
  const rise = temperature[to] - temperature[from];
  for (let i = from + 1; i < to; i++) {
    temperature[i] = temperature[from] + ((times[i] - times[from]) / apart) * rise;
  }
}

/**
 * Hours that the record covers for zones taken together: the median step for each sample that is valid or
 * filled in all of them, and the rows missing before it that were filled.
 */
export function coveredHours(axis: RecordAxis, zones: readonly Zone[]): number {
  const { filledHoursBefore, stepHours } = axis;
  const isCovered = (i: number) => zones.every(({ standing }) => standing[i] !== BRIDGED);
  let hours = 0;
  let before = false;
  for (let i = 0; i < filledHoursBefore.length; i++) {
    const now = isCovered(i);
    if (now) hours += stepHours;
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
  const { times, stepHours, filledHoursBefore } = axis;
  const after = times.findIndex((sample) => sample >= time);
  if (times[after] === time) return zone.standing[after] === BRIDGED;
  const long = missingHours(times[after] - times[after - 1], stepHours) > 0;
  const sides = [zone.standing[after - 1], zone.standing[after]];
  return sides.includes(BRIDGED) || (long && filledHoursBefore[after] === 0);
}
