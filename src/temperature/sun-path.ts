import { getPosition } from 'suncalc';
import type { RecordAxis, Site, Stamp } from '../model.ts';
import { extraterrestrialNormal } from './extraterrestrial.ts';

/**
 * The sun over a record. Each column has one value a sample; (east, north, up) is the unit vector towards the sun,
 * as refraction shows it, in the middle of the part of the sample's interval in which the sun is up.
 */
export interface SunPath {
  readonly east: Float64Array;
  readonly north: Float64Array;
  readonly up: Float64Array;
  /** Share of the interval in which the sun is up, 0 … 1. */
  readonly lit: Float64Array;
  /** Irradiance outside the atmosphere on a surface that faces the sun [W/m²]. */
  readonly extraterrestrial: Float64Array;
}

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const DEGREE = Math.PI / 180;
/** How far the sun's altitude can change in an hour [rad]: a 24th of a turn. */
const TURN_PER_HOUR = Math.PI / 12;

/**
 * Where the sun stood over a record. An interval's sun is taken in the middle of its lit part, so that the hours of
 * sunrise and sunset, whose middle may be dark, keep their light on the side from which it came.
 *
 * @param axis times of the samples on the record's own clock
 * @param stamp what a sample's interval is
 */
export function sunPath(axis: RecordAxis, site: Site, stamp: Stamp): SunPath {
  const count = axis.times.length;
  const path: SunPath = {
    east: new Float64Array(count),
    north: new Float64Array(count),
    up: new Float64Array(count),
    lit: new Float64Array(count),
    extraterrestrial: new Float64Array(count),
  };
  const length = stamp === 'instant' ? 0 : axis.stepHours * HOUR;
  const lead = site.utcOffset * HOUR + (stamp === 'end' ? length : 0);
  const aim = aimer(path, site);
  for (let i = 0; i < count; i++)
    aimAtLitPart(path, i, { start: axis.times[i] - lead, length, aim });
  fillExtraterrestrial(path.extraterrestrial, axis.times);
  return path;
}

interface Interval {
  /** Start [ms, UTC] and length [ms]. */
  readonly start: number;
  readonly length: number;
  readonly aim: Aim;
}

/** Writes the sun's direction at an instant [ms, UTC] into row i. */
type Aim = (i: number, instant: number) => void;

function aimer({ east, north, up }: SunPath, { latitude, longitude }: Site): Aim {
  const date = new Date(0);
  return (i, instant) => {
    date.setTime(instant);
    const { altitude, azimuth } = getPosition(date, latitude, longitude);
    const level = Math.cos(altitude * DEGREE);
    east[i] = level * Math.sin(azimuth * DEGREE);
    north[i] = level * Math.cos(azimuth * DEGREE);
    up[i] = Math.sin(altitude * DEGREE);
  };
}

function aimAtLitPart({ up, lit }: SunPath, i: number, { start, length, aim }: Interval): void {
  const middle = start + length / 2;
  aim(i, middle);
  lit[i] = up[i] > 0 ? 1 : 0;
  if (Math.abs(up[i]) > ((length / HOUR) * TURN_PER_HOUR) / 2) return;

  // The sun may have crossed the horizon within the interval.
  const upAtMiddle = up[i];
  aim(i, start);
  const upAtStart = up[i];
  aim(i, start + length);
  const rises = upAtStart <= 0 && up[i] > 0;
  const sets = upAtStart > 0 && up[i] <= 0;
  if (rises || sets) {
    const crossing = crossingOf(upAtStart, upAtMiddle, up[i]);
    lit[i] = rises ? 1 - crossing : crossing;
    aim(i, start + length * (rises ? (crossing + 1) / 2 : crossing / 2));
  } else {
    aim(i, middle);
  }
  if (up[i] <= 0) lit[i] = 0;
}

/** Where in an interval, 0 … 1, a value that changes sign between its ends passes zero. */
function crossingOf(start: number, middle: number, end: number): number {
  const inFirstHalf = start > 0 !== middle > 0;
  return inFirstHalf ? (0.5 * start) / (start - middle) : 0.5 + (0.5 * middle) / (middle - end);
}

function fillExtraterrestrial(column: Float64Array, times: Float64Array): void {
  let day = Number.NaN;
  let irradiance = 0;
  for (let i = 0; i < column.length; i++) {
    const today = Math.floor(times[i] / DAY);
    if (today !== day) irradiance = extraterrestrialNormal(dayOfYear(today * DAY));
    day = today;
    column[i] = irradiance;
  }
}

function dayOfYear(midnight: number): number {
  return (midnight - Date.UTC(new Date(midnight).getUTCFullYear(), 0, 1)) / DAY + 1;
}
