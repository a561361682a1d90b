import type { Site, WeatherFile } from '../model.ts';
import { readEpw } from './epw.ts';
import type { Findings } from './findings.ts';
import type { RecordTable } from './record.ts';

const HOUR = 3_600_000;

/** A record from a weather file, with what such a file knows of itself. */
export interface WeatherRecord extends RecordTable {
  readonly site: Site;
  readonly weather: WeatherFile;
}

/**
 * Reads an hourly weather file in the EPW layout as a record with the channels `air`, `global`, `direct`, `diffuse` and
 * `wind`. Its hours end at their times.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @returns `null` where it has faults, which are reported
 */
export function readWeatherRecord(
  text: string,
  file: string,
  findings: Findings,
): WeatherRecord | null {
  const read = readEpw(text, file, findings);
  if (read === null) return null;
  const { name, site, times, columns, years, setOn } = read;
  return {
    times,
    channels: new Map(Object.entries(columns)),
    quantities: new Map([
      ['air', 'temperature'],
      ['global', 'irradiance'],
      ['direct', 'irradiance'],
      ['diffuse', 'irradiance'],
      ['wind', 'speed'],
    ]),
    offset: site.utcOffset * HOUR,
    zone: null,
    fileStarts: [],
    readAs: [],
    site,
    weather: { place: name, years, setOn },
  };
}
