import type { RecordAxis, Stamp } from '../model.ts';
import { filmFromWind } from './film-coefficient.ts';
import { type SurfaceRadiation, solAirExcess } from './sol-air.ts';
import { type HeatStore, lagStep, timeConstant } from './thermal-lag.ts';

/** What surrounds a member, one value a sample. */
export interface Surroundings {
  readonly axis: RecordAxis;
  /** Air temperature at the sample's time [°C]. */
  readonly air: Float64Array;
  /** Irradiance on the member's surface [W/m²]. */
  readonly irradiance: Float64Array;
  /** What a sample of irradiance and of wind stands for. */
  readonly stamp: Stamp;
}

export interface SunlitMember extends SurfaceRadiation {
  /** Film coefficient [W/(m²·K)], or the wind speed at each sample [m/s] that it is reckoned from. */
  readonly film: number | { readonly wind: Float64Array };
  /** Time constant [h], 0 for a member that follows at once, or the heat store that it is reckoned from. */
  readonly lag: number | HeatStore;
}

const HOUR = 3_600_000;

/**
 * A member's temperature in sun and air at each sample [°C]: sol-air temperature, then the member's lag.
 * Air goes straight from sample to sample. The sun's gain does so too where its samples are moments; means of a step
 * stay through their step, which keeps what a day brought. The member begins at its sol-air temperature.
 */
export function sunlitTemperature(around: Surroundings, member: SunlitMember): Float64Array {
  const { air, irradiance, stamp } = around;
  const { times } = around.axis;
  const film = filmColumn(air, member);
  const temperature = new Float64Array(air.length);
  const excess = (i: number) => solAirExcess(irradiance[i], film[i], member);
  temperature[0] = air[0] + excess(0);
  for (let i = 1; i < air.length; i++) {
    const meanOf = stamp === 'start' ? i - 1 : i;
    const gainTo = excess(meanOf);
    const gainFrom = stamp === 'instant' ? excess(i - 1) : gainTo;
    const lag =
      typeof member.lag === 'number' ? member.lag : timeConstant(member.lag, film[meanOf]);
    const step = (times[i] - times[i - 1]) / HOUR / lag;
    temperature[i] = lagStep(temperature[i - 1], air[i - 1] + gainFrom, air[i] + gainTo, step);
  }
  return temperature;
}

function filmColumn(air: Float64Array, { film, emissivity }: SunlitMember): Float64Array {
  if (typeof film === 'number') return new Float64Array(air.length).fill(film);
  return film.wind.map((wind, i) => filmFromWind(wind, air[i], emissivity));
}
