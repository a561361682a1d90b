import { seededNormal } from './seeded-random.ts';

/** A side of an invented building on which metal lies in the sun. */
export interface Side {
  readonly name: string;
  /** Where it faces, from south, west positive [°]. */
  readonly azimuth: number;
  /** Coldest and hottest metal of the season [°C]. */
  readonly range: readonly [number, number];
}

/** What is invented about a place and its season. */
export interface Place {
  readonly seed: number;
  /** First hour, on the clock of the sun [ms since 1970]. */
  readonly start: number;
  readonly hours: number;
  readonly latitude: number;
  /** Coldest and hottest air of the season [°C]. */
  readonly air: readonly [number, number];
  readonly sides: readonly Side[];
  /** A heavy structure that follows the air by weeks: its name, coldest and warmest [°C]. */
  readonly structure: { readonly name: string; readonly range: readonly [number, number] } | null;
}

export interface Season {
  readonly times: readonly number[];
  /** Temperatures by the hour [°C], air first. */
  readonly channels: ReadonlyMap<string, readonly number[]>;
}

/** Share by which thin metal and a heavy structure follow what drives them, an hour. */
const METAL_FOLLOWS = 0.6;
const STRUCTURE_FOLLOWS = 1 / (20 * 24);

/**
 * An invented season by the hour. A seed fixes the weather; the sun's path is that of the latitude; how strongly sun and
 * night sky act on the metal is chosen so that its coldest and hottest hours come out as the place says.
 */
export function inventedWeather(place: Place): Season {
  const times = Array.from({ length: place.hours }, (_, h) => place.start + h * 3_600_000);
  const clearness = inventedClearness(place);
  const air = stretch(inventedAir(place, times, clearness), place.air);
  const sky = follow(clearness, METAL_FOLLOWS);
  const calm = inventedCalm(place);
  const channels = new Map<string, readonly number[]>([['air', air]]);
  for (const side of place.sides) {
    const sun = times.map((time, h) => clearness[h] * calm[h] * sunOn(side, time, place.latitude));
    channels.set(side.name, metal(air, follow(sun, METAL_FOLLOWS), sky, side.range));
  }
  if (place.structure !== null) {
    const { name, range } = place.structure;
    channels.set(name, stretch(follow(air, STRUCTURE_FOLLOWS), range));
  }
  return { times, channels };
}

/** How clear the sky is at each hour, 0 … 1: spells of some days, more clear than not, broken by the hour. */
export function inventedClearness({ seed, hours }: Place): number[] {
  const normal = seededNormal(seed);
  const days = spells(normal, hours / 24 + 2, 0.55);
  return Array.from({ length: hours }, (_, h) => {
    const spell = between(days, h / 24);
    return 1 / (1 + Math.exp(-(1.3 + 1.6 * spell + 0.5 * normal())));
  });
}

/** How much of the sun's heat the wind leaves in the metal at each hour, around 1. */
function inventedCalm({ seed, hours }: Place): number[] {
  const days = spells(seededNormal(seed + 2), hours / 24 + 2, 0.4);
  return Array.from({ length: hours }, (_, h) => Math.exp(0.24 * between(days, h / 24)));
}

/** Air at each hour [K] but for an affine stretch: season, spells of weather, and a day that peaks at 15:00. */
export function inventedAir(
  { seed, hours }: Place,
  times: readonly number[],
  clear: number[],
): number[] {
  const normal = seededNormal(seed + 1);
  const days = spells(normal, hours / 24 + 2, 0.75);
  return times.map((time, h) => {
    const season = -10.5 * Math.cos(2 * Math.PI * (yearShare(time) - 20 / 365));
    const day = (1.5 + 3 * clear[h]) * Math.cos((2 * Math.PI * (hourOf(time) - 15)) / 24);
    return season + 3.2 * between(days, h / 24) + day;
  });
}

/** Metal [°C]: air, warmed by the sun and cooled by the sky, each as strongly as the range wants. */
function metal(
  air: readonly number[],
  sun: readonly number[],
  sky: readonly number[],
  [coldest, hottest]: readonly [number, number],
): number[] {
  const loss = Math.min(...air.map((t, h) => (t - coldest) / sky[h]));
  const cooled = air.map((t, h) => t - loss * sky[h]);
  const gain = Math.min(
    ...cooled.map((t, h) => (sun[h] > 1e-3 ? (hottest - t) / sun[h] : Infinity)),
  );
  return cooled.map((t, h) => t + gain * sun[h]);
}

/** Beam of the clear sun on a side's vertical face and a part of its top, over that above the air [1]. */
function sunOn({ azimuth }: Side, time: number, latitude: number): number {
  const radian = Math.PI / 180;
  const declination = 23.45 * radian * Math.sin(2 * Math.PI * (yearShare(time) - 81 / 365));
  const hourAngle = 15 * radian * (hourOf(time) - 12);
  const [sinL, cosL] = [Math.sin(latitude * radian), Math.cos(latitude * radian)];
  const [sinD, cosD] = [Math.sin(declination), Math.cos(declination)];
  const up = sinL * sinD + cosL * cosD * Math.cos(hourAngle);
  if (up <= 0) return 0;
  const south = sinL * cosD * Math.cos(hourAngle) - cosL * sinD;
  const west = cosD * Math.sin(hourAngle);
  const face = south * Math.cos(azimuth * radian) + west * Math.sin(azimuth * radian);
  const beam = Math.exp(-0.22 / Math.max(up, 0.03));
  return beam * (0.7 * Math.max(0, face) + 0.45 * up) + 0.12 * up;
}

/** Daily values that keep a share of the day before. */
export function spells(normal: () => number, days: number, kept: number): number[] {
  let value = normal();
  const fresh = Math.sqrt(1 - kept ** 2);
  return Array.from({ length: Math.ceil(days) }, () => {
    value = kept * value + fresh * normal();
    return value;
  });
}

/** A daily value at a share of days, on the straight line between its neighbours. */
export function between(days: readonly number[], at: number): number {
  const day = Math.floor(at);
  return days[day] + (at - day) * (days[day + 1] - days[day]);
}

/** Values that follow others by a share an hour. */
function follow(values: readonly number[], share: number): number[] {
  let value = values[0];
  return values.map((v) => {
    value += share * (v - value);
    return value;
  });
}

/** The values stretched and shifted to the range. */
export function stretch(
  values: readonly number[],
  [low, high]: readonly [number, number],
): number[] {
  const least = values.reduce((a, b) => Math.min(a, b));
  const scale = (high - low) / (values.reduce((a, b) => Math.max(a, b)) - least);
  return values.map((v) => low + scale * (v - least));
}

function yearShare(time: number): number {
  const year = new Date(time).getUTCFullYear();
  return (time - Date.UTC(year, 0)) / (Date.UTC(year + 1, 0) - Date.UTC(year, 0));
}

function hourOf(time: number): number {
  return (time / 3_600_000) % 24;
}
