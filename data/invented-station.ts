import type { RecordAxis, Site } from '../src/model.ts';
import { sunPath } from '../src/temperature/sun-path.ts';
import {
  between,
  inventedAir,
  inventedClearness,
  type Place,
  spells,
  stretch,
} from './invented-weather.ts';
import { seededNormal } from './seeded-random.ts';

/** What a weather station would have written down, by the hour that ends at each time. */
export interface StationYear {
  readonly times: readonly number[];
  /** [°C] */
  readonly air: readonly number[];
  /** Global and diffuse on the horizontal, direct on a surface that faces the sun [W/m²]. */
  readonly global: readonly number[];
  readonly direct: readonly number[];
  readonly diffuse: readonly number[];
  /** [m/s] */
  readonly wind: readonly number[];
}

/** The invented weather of a station: a seed fixes air, cloud and wind; the sun stands where it stands. */
export function inventedStation(place: Place, site: Site): StationYear {
  const times = Array.from({ length: place.hours }, (_, h) => place.start + h * 3_600_000);
  const clearness = inventedClearness(place);
  const axis: RecordAxis = {
    times: Float64Array.from(times),
    stepHours: 1,
    sampleHours: null,
    filledHoursBefore: new Float64Array(times.length),
  };
  const { up, lit } = sunPath(axis, site, 'end');
  const direct = times.map((_, h) => lit[h] * clearDirect(up[h]) * clearness[h] ** 1.5);
  // what cloud takes from the beam it scatters in part
  const diffuse = times.map((_, h) => {
    const clear = lit[h] * clearDirect(up[h]);
    return clear * (0.1 + 0.45 * (1 - clearness[h]) * Math.max(0, up[h]));
  });
  return {
    times,
    air: stretch(inventedAir(place, times, clearness), place.air),
    global: times.map((_, h) => direct[h] * Math.max(0, up[h]) + diffuse[h]),
    direct,
    diffuse,
    wind: inventedWind(place),
  };
}

/** The beam of a cloudless sky, 1256/(1 + 0.31 m) W/m² as in the JCSS Probabilistic Model Code, m = 1/sin of the altitude. */
function clearDirect(up: number): number {
  return up <= 0 ? 0 : 1256 / (1 + 0.31 / up);
}

function inventedWind({ seed, hours }: Place): number[] {
  const days = spells(seededNormal(seed + 3), hours / 24 + 2, 0.5);
  return Array.from({ length: hours }, (_, h) => 2.6 * Math.exp(0.5 * between(days, h / 24)));
}
