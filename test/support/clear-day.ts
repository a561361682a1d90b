import type { RecordAxis } from '../../src/model.ts';
import type { SkyParts } from '../../src/temperature/sky-parts.ts';
import type { SunPath } from '../../src/temperature/sun-path.ts';

const HOUR = 3_600_000;

/** Samples a given time apart, from a moment on [ms, h]. */
export function axisOf(start: number, count: number, stepHours = 1): RecordAxis {
  const times = new Float64Array(count).map((_, i) => start + i * stepHours * HOUR);
  return { times, stepHours, sampleHours: null, filledHoursBefore: new Float64Array(count) };
}

/**
 * A cloudless sky by the JCSS Probabilistic Model Code, part 2, thermal actions: direct S = 1256/(1 + 0.31 m) W/m²,
 * diffuse on the horizontal 0.38 · 0.31 S; the optical mass m is taken as 1/sin of the altitude.
 */
export function clearSky({ up, lit }: SunPath): SkyParts {
  const direct = up.map((sine, i) => (lit[i] > 0 ? (lit[i] * 1256) / (1 + 0.31 / sine) : 0));
  const diffuse = direct.map((value) => 0.38 * 0.31 * value);
  return { direct, diffuse, global: direct.map((value, i) => value * up[i] + diffuse[i]) };
}

/** A sun that stands still, for published cases that give its direction. Angles in degrees. */
export function stillSun(zenith: number, azimuth: number, extraterrestrial: number): SunPath {
  const degree = Math.PI / 180;
  const level = Math.sin(zenith * degree);
  return {
    east: Float64Array.of(level * Math.sin(azimuth * degree)),
    north: Float64Array.of(level * Math.cos(azimuth * degree)),
    up: Float64Array.of(Math.cos(zenith * degree)),
    lit: Float64Array.of(1),
    extraterrestrial: Float64Array.of(extraterrestrial),
  };
}
