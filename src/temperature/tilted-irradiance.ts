import { LOW_SUN, type SkyParts } from './sky-parts.ts';
import type { SunPath } from './sun-path.ts';

export interface Surface {
  /** Where it faces, degrees clockwise from north. */
  readonly azimuth: number;
  /** Degrees from level: 0 faces up, 90 stands upright, 180 faces down. */
  readonly tilt: number;
  /** Share of the global irradiance that the ground before it throws back, 0 … 1. */
  readonly albedo: number;
  readonly sky: SkyModel;
}

export type SkyModel = 'isotropic' | 'Hay-Davies';

const DEGREE = Math.PI / 180;

/**
 * Irradiance on a surface [W/m²]: direct, sky and ground.
 *
 * `isotropic`: the sky is equally bright, D (1 + cos β)/2, by B. Y. H. Liu and R. C. Jordan, Solar Energy 7(2) 53, 1963.
 * `Hay-Davies`: a share A = direct / extraterrestrial of the diffuse comes from round the sun,
 * D [A cos θ/cos θ_z + (1 − A)(1 + cos β)/2], by J. E. Hay and J. A. Davies, First Canadian Solar Radiation Data
 * Workshop, 1980. Both: ground ρ G (1 − cos β)/2.
 *
 * @param hidden 1 where shade hides the sun; the rest of the sky and the ground are left as they are
 */
export function tiltedIrradiance(
  parts: SkyParts,
  sun: SunPath,
  surface: Surface,
  hidden: Uint8Array | null = null,
): Float64Array {
  const { east, north, up, lit, extraterrestrial } = sun;
  const { cosTilt, toEast, toNorth } = normalOf(surface);
  const sky = (1 + cosTilt) / 2;
  const ground = (surface.albedo * (1 - cosTilt)) / 2;
  const circumsolar = surface.sky === 'Hay-Davies';
  const irradiance = new Float64Array(up.length);
  for (let i = 0; i < irradiance.length; i++) {
    let fromSky = parts.diffuse[i] * sky;
    let fromSun = 0;
    if (lit[i] > 0) {
      const facing = east[i] * toEast + north[i] * toNorth + up[i] * cosTilt;
      const cosIncidence = hidden?.[i] === 1 ? 0 : Math.max(0, facing);
      fromSun = parts.direct[i] * cosIncidence;
      if (circumsolar && up[i] >= LOW_SUN) {
        const share = Math.min(1, parts.direct[i] / (extraterrestrial[i] * lit[i]));
        const near = parts.diffuse[i] * share;
        fromSky -= near * sky;
        fromSun += (near * cosIncidence) / up[i];
      }
    }
    irradiance[i] = fromSun + fromSky + parts.global[i] * ground;
  }
  return irradiance;
}

function normalOf({ azimuth, tilt }: Surface) {
  const sinTilt = Math.sin(tilt * DEGREE);
  return {
    cosTilt: Math.cos(tilt * DEGREE),
    toEast: sinTilt * Math.sin(azimuth * DEGREE),
    toNorth: sinTilt * Math.cos(azimuth * DEGREE),
  };
}
