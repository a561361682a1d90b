import type { RecordAxis } from '../model.ts';
import { timeAxis } from '../temperature/gaps.ts';
import type { Files } from './files.ts';
import type { Findings } from './findings.ts';
import { GAPS_KEYS, RECORD_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { type RecordTable, readRecord } from './record.ts';
import { emptyMap, placeOf, type SourceMap } from './source.ts';

/** The record on its time axis, with what the job says of it. */
export interface RecordBasis {
  readonly record: RecordTable;
  readonly axis: RecordAxis;
  /** The longest gap that is filled [h]. */
  readonly fillUpTo: number;
  /** Years that one pass stands for, where the job says so. */
  readonly represents: number | null;
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
  const record = readRecord(text, file, values.columns, findings);
  if (!complete || record === null || gap.fill_up_to === undefined) return null;
  return {
    record,
    axis: timeAxis(record.times, gap.fill_up_to),
    fillUpTo: gap.fill_up_to,
    represents: values.represents,
  };
}
