import { erbsDiffuseShare } from './erbs.ts';
import type { SunPath } from './sun-path.ts';

/** What a weather station or file gives of the sun, one value a sample [W/m²]; `null` where it does not. */
export interface MeasuredSun {
  /** Global on the horizontal. */
  readonly global: Float64Array | null;
  /** Direct on a surface that faces the sun. */
  readonly direct: Float64Array | null;
  /** Diffuse on the horizontal. */
  readonly diffuse: Float64Array | null;
}

/** Global and diffuse on the horizontal and direct on a surface that faces the sun, means of each interval [W/m²]. */
export interface SkyParts {
  readonly global: Float64Array;
  readonly direct: Float64Array;
  readonly diffuse: Float64Array;
}

/** Sine of 3°: under it, direct light is not reckoned from horizontal light, which would divide by almost nothing. */
export const LOW_SUN = 0.0523;

/**
 * Splits the sun's light into direct and diffuse: as measured where two of the three are given, by Erbs where only
 * global is. What was measured on the horizontal is kept: what the direct beam cannot carry (a sun under 3°, or more
 * than outside the atmosphere) counts as diffuse, so that direct × up + diffuse is global at each sample.
 * Where direct and diffuse are both given they stand as they are. Negative readings count as zero.
 *
 * @returns `null` where neither global nor both direct and diffuse are given
 */
export function skyParts(measured: MeasuredSun, sun: SunPath): SkyParts | null {
  const { global, direct, diffuse } = measured;
  if (direct !== null && diffuse !== null) {
    return asMeasured({ direct, diffuse }, global, sun);
  }
  return global === null ? null : splitGlobal(global, { direct, diffuse }, sun);
}

function asMeasured(
  { direct, diffuse }: Omit<SkyParts, 'global'>,
  global: Float64Array | null,
  { up, lit }: SunPath,
): SkyParts {
  const parts = emptyParts(up.length);
  for (let i = 0; i < up.length; i++) {
    parts.direct[i] = lit[i] > 0 ? Math.max(0, direct[i]) : 0;
    parts.diffuse[i] = Math.max(0, diffuse[i]);
    parts.global[i] =
      global === null ? parts.direct[i] * up[i] + parts.diffuse[i] : Math.max(0, global[i]);
  }
  return parts;
}

function splitGlobal(
  global: Float64Array,
  { direct, diffuse }: Omit<MeasuredSun, 'global'>,
  { up, lit, extraterrestrial }: SunPath,
): SkyParts {
  const parts = emptyParts(up.length);
  for (let i = 0; i < up.length; i++) {
    const whole = Math.max(0, global[i]);
    parts.global[i] = whole;
    parts.diffuse[i] = whole;
    if (lit[i] === 0 || up[i] < LOW_SUN) continue;
    const outside = extraterrestrial[i] * lit[i];
    let beam: number;
    if (direct !== null) beam = Math.min(direct[i], whole / up[i]);
    else if (diffuse !== null) beam = (whole - Math.max(0, diffuse[i])) / up[i];
    else beam = (whole * (1 - erbsDiffuseShare(whole / (outside * up[i])))) / up[i];
    parts.direct[i] = Math.min(Math.max(0, beam), outside);
    parts.diffuse[i] = whole - parts.direct[i] * up[i];
  }
  return parts;
}

function emptyParts(count: number): SkyParts {
  return {
    global: new Float64Array(count),
    direct: new Float64Array(count),
    diffuse: new Float64Array(count),
  };
}
