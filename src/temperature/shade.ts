import type { SunPath } from './sun-path.ts';

/** A level ledge of endless length over a surface. Both lengths in one unit. */
export interface Overhang {
  /** How far it stands out from the surface. */
  readonly depth: number;
  /** How far it is above the member. */
  readonly above: number;
}

/** What stands between a surface and the sun. */
export interface Shade {
  readonly overhang: Overhang | null;
  /**
   * The horizon as seen from the surface: its altitude at azimuths clockwise from north, rising from 0 and below 360
   * [degrees]; straight between them and round the circle. Empty is a free horizon.
   */
  readonly horizon: readonly { readonly azimuth: number; readonly altitude: number }[];
}

const DEGREE = Math.PI / 180;

/**
 * When shade hides the sun from a surface.
 *
 * @param azimuth where the surface faces, degrees clockwise from north
 * @returns 1 at each sample whose sun is up and hidden, else 0
 */
export function hiddenSun(sun: SunPath, azimuth: number, shade: Shade): Uint8Array {
  const hidden = new Uint8Array(sun.up.length);
  if (shade.overhang !== null) hideByOverhang(hidden, sun, { azimuth, overhang: shade.overhang });
  if (shade.horizon.length > 0) hideByHorizon(hidden, sun, shade.horizon);
  return hidden;
}

/** The sun is behind the ledge where its profile angle, in the plane across the surface, is over the ledge's edge. */
function hideByOverhang(
  hidden: Uint8Array,
  { east, north, up, lit }: SunPath,
  { azimuth, overhang }: { readonly azimuth: number; readonly overhang: Overhang },
): void {
  const outEast = Math.sin(azimuth * DEGREE);
  const outNorth = Math.cos(azimuth * DEGREE);
  for (let i = 0; i < hidden.length; i++) {
    const out = east[i] * outEast + north[i] * outNorth;
    if (lit[i] > 0 && up[i] * overhang.depth > out * overhang.above) hidden[i] = 1;
  }
}

function hideByHorizon(
  hidden: Uint8Array,
  { east, north, up, lit }: SunPath,
  horizon: Shade['horizon'],
): void {
  const first = horizon[0];
  const last = horizon[horizon.length - 1];
  const circle = [
    { azimuth: last.azimuth - 360, altitude: last.altitude },
    ...horizon,
    { azimuth: first.azimuth + 360, altitude: first.altitude },
  ];
  for (let i = 0; i < hidden.length; i++) {
    if (lit[i] === 0) continue;
    const azimuth = (Math.atan2(east[i], north[i]) / DEGREE + 360) % 360;
    if (up[i] < Math.sin(altitudeAt(azimuth, circle) * DEGREE)) hidden[i] = 1;
  }
}

function altitudeAt(azimuth: number, circle: Shade['horizon']): number {
  let k = 1;
  while (circle[k].azimuth < azimuth) k++;
  const before = circle[k - 1];
  const share = (azimuth - before.azimuth) / (circle[k].azimuth - before.azimuth);
  return before.altitude + share * (circle[k].altitude - before.altitude);
}
