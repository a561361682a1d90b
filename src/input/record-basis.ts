import type { RecordAxis, Site, Stamp, WeatherFile } from '../model.ts';
import { timeAxis } from '../temperature/gaps.ts';
import { type SunPath, sunPath } from '../temperature/sun-path.ts';
import type { Files } from './files.ts';
import { type Findings, report } from './findings.ts';
import { GAPS_KEYS, RECORD_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { type RecordTable, readRecord } from './record.ts';
import { readSite } from './record-site.ts';
import { emptyMap, givenValue, placeOf, type SourceMap } from './source.ts';
import { readWeatherRecord } from './weather-record.ts';

/** The record on its time axis, with what the job says of it. */
export interface RecordBasis {
  readonly record: RecordTable;
  readonly axis: RecordAxis;
  /** The longest gap that is filled [h]. */
  readonly fillUpTo: number;
  /** Years that one pass stands for, where the job says so. */
  readonly represents: number | null;
  /** What a row of irradiance or wind stands for; `null` where nobody says. */
  readonly stamp: Stamp | null;
  /** Where it was taken; `null` where nobody says. */
  readonly site: Site | null;
  /** The weather file that it was read from; `null` for a CSV. */
  readonly weather: WeatherFile | null;
  /** The sun over the record, reckoned when first asked for; `null` without site or stamp. */
  readonly sun: () => SunPath | null;
}

/**
 * Reads the record that the job names.
 *
 * @param map the job's `record`
 * @returns `null` with a fault, which is reported
 */
export async function readRecordBasis(
  map: SourceMap,
  files: Files,
  findings: Findings,
): Promise<RecordBasis | null> {
  const { complete, values } = readKeys(RECORD_KEYS, map, 'record.', findings);
  const gaps = values.gaps ?? emptyMap(map.place, 'gaps');
  const { values: gap } = readKeys(GAPS_KEYS, gaps, 'record.gaps.', findings);
  const { file } = values;
  const text = file === undefined ? null : await files.read(file, placeOf(map, 'file'), findings);
  if (file === undefined || text === null || values.columns === undefined) return null;
  const isWeather = (values.layout ?? (/\.epw$/i.test(file) ? 'EPW' : 'CSV')) === 'EPW';
  if (isWeather) refuseBeside(map, findings);
  const weather = isWeather ? readWeatherRecord(text, file, findings) : null;
  const record = isWeather ? weather : readRecord(text, file, values.columns, findings);
  const site = weather?.site ?? readSite(values.site ?? null, record?.offset ?? null, findings);
  if (!complete || record === null || gap.fill_up_to === undefined) return null;
  const stamp = isWeather ? 'end' : values.stamp;
  const axis = timeAxis(record.times, gap.fill_up_to);
  let sun: SunPath | null = null;
  return {
    record,
    axis,
    fillUpTo: gap.fill_up_to,
    represents: values.represents,
    stamp,
    site,
    weather: weather?.weather ?? null,
    sun: () => {
      if (site !== null && stamp !== null) sun ??= sunPath(axis, site, stamp);
      return sun;
    },
  };
}

/** A weather file says itself what these keys say of a CSV. */
function refuseBeside(map: SourceMap, findings: Findings): void {
  for (const key of ['site', 'stamp', 'columns']) {
    if (givenValue(map, key) === undefined) continue;
    report(findings, map.entries.get(key)!.place, {
      found: key,
      expected: 'nothing of this kind beside a file in the EPW layout, which says it itself',
    });
  }
}
