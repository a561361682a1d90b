import type { RecordAxis, SunlitBasis, Zone } from '../model.ts';
import { bridgeGaps } from './gaps.ts';
import { hiddenSun } from './shade.ts';
import { skyParts } from './sky-parts.ts';
import type { SunPath } from './sun-path.ts';
import { sunlitTemperature } from './sunlit-temperature.ts';
import { tiltedIrradiance } from './tilted-irradiance.ts';

/** The record as a sunlit zone needs it. */
export interface SunRecord {
  readonly axis: RecordAxis;
  /** Value of each channel at each sample [°C, W/m² or m/s], `NaN` where missing. */
  readonly channels: ReadonlyMap<string, Float64Array>;
  /** Longest gap that counts as covered [h]. */
  readonly fillUpTo: number;
  /** The sun over the record; `null` only where every light is measured on its surface. */
  readonly sun: SunPath | null;
}

/**
 * A zone whose temperature follows from sun and air: gaps of its channels bridged, the light brought onto the surface,
 * the sol-air temperature and the member's lag.
 *
 * @param name the zone's name
 * @param basis surface, sun and lag; each channel that it names must hold at least one value
 * @param record the channels on their time axis
 * @throws RangeError if a channel is missing, or the light comes from the sky and there is no sun path
 */
export function sunlitZone(name: string, basis: SunlitBasis, record: SunRecord): Zone {
  const { axis } = record;
  const standing = new Uint8Array(axis.times.length);
  const column = (channel: string) => bridged(channel, record, standing);
  const air = column(basis.air);
  const irradiance = lightOn(basis, record, column);
  const film = typeof basis.film === 'number' ? basis.film : { wind: column(basis.film.wind) };
  const stamp = basis.light.stamp;
  const temperature = sunlitTemperature({ axis, air, irradiance, stamp }, { ...basis, film });
  return { name, temperature, standing, constant: false, sunlit: { basis, air, irradiance } };
}

/** A channel without gaps; `standing` is raised to the worst of the channels at each sample. */
function bridged(channel: string, record: SunRecord, standing: Uint8Array): Float64Array {
  const values = record.channels.get(channel);
  if (values === undefined) throw new RangeError(`the record has no channel ${channel}`);
  const whole = bridgeGaps(values, record.axis, record.fillUpTo);
  for (let i = 0; i < standing.length; i++) {
    standing[i] = Math.max(standing[i], whole.standing[i]);
  }
  return whole.temperature;
}

function lightOn(
  { light, tilt }: SunlitBasis,
  record: SunRecord,
  column: (channel: string) => Float64Array,
): Float64Array {
  if (light.from === 'surface') return column(light.channel).map((value) => Math.max(0, value));
  const { sun, channels } = record;
  if (sun === null) throw new RangeError('the sun over the record is not known');
  const part = (channel: string | null) =>
    channel === null ? null : darkAtNight(column(channel), channels.get(channel)!, sun);
  const measured = {
    global: part(light.global),
    direct: part(light.direct),
    diffuse: part(light.diffuse),
  };
  const parts = skyParts(measured, sun);
  if (parts === null) throw new RangeError('neither global nor both direct and diffuse are given');
  const { faces: azimuth, albedo, sky } = light;
  const hidden =
    light.overhang === null && light.horizon.length === 0 ? null : hiddenSun(sun, azimuth, light);
  return tiltedIrradiance(parts, sun, { azimuth, tilt, albedo, sky }, hidden);
}

/** A channel of sunlight without gaps: a straight line across one would carry daylight through the night. */
function darkAtNight(whole: Float64Array, raw: Float64Array, { lit }: SunPath): Float64Array {
  return whole.map((value, i) => (Number.isNaN(raw[i]) && lit[i] === 0 ? 0 : value));
}
