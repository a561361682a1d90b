import { epwText } from '../../data/epw-text.ts';
import { inventedStation } from '../../data/invented-station.ts';
import { STATION } from '../../data/places.ts';
import { noFindings } from '../../src/input/findings.ts';
import { readWeatherRecord, type WeatherRecord } from '../../src/input/weather-record.ts';
import type { SunlitBasis } from '../../src/model.ts';
import { timeAxis } from '../../src/temperature/gaps.ts';
import { sunPath } from '../../src/temperature/sun-path.ts';
import { sunlitZone } from '../../src/temperature/sunlit-zone.ts';
import { type BenchRow, inTurns } from './in-turns.ts';

const YEARS = 30;

/** Thirty years by the hour into three zones in the sun, from the sun's path on, against reading the file. */
export function sunBench(): BenchRow[] {
  const { name, site, place } = STATION;
  const hours = Math.round(YEARS * 8766);
  const text = epwText(name, site, inventedStation({ ...place, hours }, site));
  const read = (): WeatherRecord => {
    const record = readWeatherRecord(text, 'bench.epw', noFindings());
    if (record === null) throw new Error('the weather file was not read');
    return record;
  };
  const record = read();
  const before = process.memoryUsage().arrayBuffers;
  const zones = threeZones(record);
  const held = (process.memoryUsage().arrayBuffers - before) / 2 ** 20;
  if (zones.some(({ temperature }) => !temperature.every(Number.isFinite))) {
    throw new Error('a temperature is not a number');
  }
  const rows = inTurns(
    () => void read(),
    [
      {
        name: `${hours} hours into three zones with shade, wind and lag`,
        goal: 1,
        run: () => void threeZones(record),
      },
    ],
    5,
  );
  return rows.map((row) => {
    const perSecond = Math.round(hours / row.milliseconds) / 1000;
    return {
      ...row,
      name: `${row.name} (${perSecond} million rows a second, ${Math.round(held)} MB of arrays)`,
    };
  });
}

function threeZones(record: WeatherRecord) {
  const axis = timeAxis(record.times, 3);
  const sun = sunPath(axis, record.site, 'end');
  const { channels } = record;
  return [90, 180, 270].map((faces) =>
    sunlitZone(`facing ${faces}`, basisOf(faces, record), { axis, channels, fillUpTo: 3, sun }),
  );
}

function basisOf(faces: number, { site }: WeatherRecord): SunlitBasis {
  return {
    air: 'air',
    light: {
      from: 'sky',
      global: 'global',
      direct: 'direct',
      diffuse: 'diffuse',
      site,
      stamp: 'end',
      faces,
      albedo: 0.2,
      sky: 'Hay-Davies',
      overhang: { depth: 300, above: 600 },
      horizon: [
        { azimuth: 90, altitude: 10 },
        { azimuth: 270, altitude: 5 },
      ],
    },
    tilt: 90,
    absorptance: 0.9,
    surface: null,
    emissivity: 0.9,
    skyLoss: 0,
    film: { wind: 'wind' },
    lag: { mass: 1.2, heatCapacity: 900, exposedPerimeter: 260 },
  };
}
