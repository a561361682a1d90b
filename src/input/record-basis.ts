import type { RecordAxis, RecordFinding, Site, Stamp, WeatherFile } from '../model.ts';
import { timeAxis } from '../temperature/gaps.ts';
import { type SunPath, sunPath } from '../temperature/sun-path.ts';
import type { Files } from './files.ts';
import { FindingList } from './finding-list.ts';
import { type Findings, report } from './findings.ts';
import { judgeChannels, judgeGaps } from './judge-record.ts';
import { judgingRules } from './judging-rules.ts';
import { GAPS_KEYS, RECORD_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { type RecordRules, type RecordTable, readRecord } from './record.ts';
import type { RecordFile } from './record-file.ts';
import { recordForm } from './record-form.ts';
import { RECORD_FORM_KEYS } from './record-keys.ts';
import { readSite } from './record-site.ts';
import { warnOfRecord } from './record-warnings.ts';
import { emptyMap, givenValue, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';
import { readWeatherRecord, type WeatherRecord } from './weather-record.ts';

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
  /** What judging it found, in order of time. */
  readonly found: readonly RecordFinding[];
  /** The sun over the record, reckoned when first asked for; `null` without site or stamp. */
  readonly sun: () => SunPath | null;
}

/** What a job keeps of its record. */
export function keptOf({ axis, found, record, represents, weather }: RecordBasis) {
  return { axis, recordFindings: found, recordReadAs: record.readAs, represents, weather };
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
  const form = recordForm(values, map, findings);
  const judging = judgingRules(values, map, findings);
  const names = fileNames(values, map, findings);
  if (names === null || form === null || judging === null) return null;
  const isWeather = (values.layout ?? (/\.epw$/i.test(names[0]) ? 'EPW' : 'CSV')) === 'EPW';
  const list = new FindingList();
  const weather = isWeather ? await readWeatherFile(names, map, files, findings) : null;
  const record = isWeather
    ? weather
    : await readLogger(names, map, files, { form, judging, list, findings });
  const site = weather?.site ?? readSite(values.site ?? null, record?.offset ?? null, findings);
  if (!complete || record === null || gap.fill_up_to === undefined) return null;
  judgeChannels(record, judging, list);
  const stamp = isWeather ? 'end' : values.stamp;
  const axis = timeAxis(record.times, gap.fill_up_to);
  judgeGaps(record, axis, gap.fill_up_to, list);
  warnOfRecord(list, axis, findings);
  let sun: SunPath | null = null;
  return {
    record,
    axis,
    fillUpTo: gap.fill_up_to,
    represents: values.represents,
    stamp,
    site,
    weather: weather?.weather ?? null,
    found: list.inOrder(),
    sun: () => {
      if (site !== null && stamp !== null) sun ??= sunPath(axis, site, stamp);
      return sun;
    },
  };
}

/** The names of the record's files; `null` where there is none or both ways are used, which is reported. */
function fileNames(
  { file, files }: Partial<Values<typeof RECORD_KEYS>>,
  map: SourceMap,
  findings: Findings,
): readonly string[] | null {
  if (file === undefined || files === undefined) return null;
  if ((file === null) !== (files === null)) return files ?? [file!];
  return report(findings, map.place, {
    found: file === null ? 'neither' : 'both',
    expected: 'either file or files',
  });
}

async function readWeatherFile(
  names: readonly string[],
  map: SourceMap,
  files: Files,
  findings: Findings,
): Promise<WeatherRecord | null> {
  refuseBeside(map, findings);
  const text = await files.read(names[0], placeOf(map, 'file'), findings);
  return text === null ? null : readWeatherRecord(text, names[0], findings);
}

interface LoggerReading extends RecordRules {
  readonly list: FindingList;
  readonly findings: Findings;
}

async function readLogger(
  names: readonly string[],
  map: SourceMap,
  files: Files,
  { list, findings, ...rules }: LoggerReading,
): Promise<RecordTable | null> {
  const place = placeOf(map, names.length === 1 ? 'file' : 'files');
  const opened: RecordFile[] = [];
  for (const name of names) {
    const bytes = await files.open(name, place, findings);
    if (bytes !== null) opened.push({ name, bytes });
  }
  return opened.length < names.length ? null : readRecord(opened, rules, list, findings);
}

/** A weather file says itself what these keys say of a CSV. */
function refuseBeside(map: SourceMap, findings: Findings): void {
  for (const key of ['site', 'stamp', 'columns', 'files', ...Object.keys(RECORD_FORM_KEYS)]) {
    if (givenValue(map, key) === undefined) continue;
    report(findings, map.entries.get(key)!.place, {
      found: key,
      expected: 'nothing of this kind beside a file in the EPW layout, which says it itself',
    });
  }
}
