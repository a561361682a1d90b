import { readCsv } from './csv.ts';
import type { Files } from './files.ts';
import type { Findings } from './findings.ts';
import { CURVE_POINT_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { givenText, type Source, type SourceMap } from './source.ts';
import { rowOf } from './table.ts';
import type { PointValue } from './values.ts';

/** A curve as the user gave it. */
export interface CurveRow {
  /** Its keys; of a curve in a CSV file, the id alone. */
  readonly map: SourceMap;
  /** Points of a curve in a CSV file, `faulty` where one of its rows is; `null` for a curve of the job. */
  readonly points: readonly PointValue[] | 'faulty' | null;
}

/**
 * All curves of the job: those of its list, and those of the CSV files that it names, whose rows of one id
 * are one curve.
 *
 * @param source the job's `curves`, or `null`
 */
export async function readCurveRows(
  source: Source | null,
  files: Files,
  findings: Findings,
): Promise<CurveRow[]> {
  if (source === null) return [];
  const items = source.type === 'list' ? source.items : [source];
  const rows: CurveRow[] = [];
  for (const item of items) {
    if (item.type !== 'text') {
      rows.push(...rowOf(item, findings).map((map) => ({ map, points: null })));
      continue;
    }
    const text = await files.read(item.text, item.place, findings);
    if (text !== null) rows.push(...groupPoints(readCsv(text, item.text, findings), findings));
  }
  return rows;
}

/** Rows of points gathered by id, in the order of the first row of each. */
function groupPoints(rows: readonly SourceMap[], findings: Findings): CurveRow[] {
  const groups = new Map<string, { map: SourceMap; points: PointValue[]; faulty: boolean }>();
  for (const row of rows) {
    const { complete, values } = readKeys(CURVE_POINT_KEYS, row, '', findings);
    const id = row.entries.get('id');
    const name = givenText(row, 'id');
    if (id === undefined || name === undefined) continue;
    const map: SourceMap = { ...row, entries: new Map([['id', id]]) };
    const group = groups.get(name) ?? { map, points: [], faulty: false };
    groups.set(name, group);
    if (complete) group.points.push({ ...values, place: row.place });
    else group.faulty = true;
  }
  return [...groups.values()].map(({ map, points, faulty }) => ({
    map,
    points: faulty ? 'faulty' : points,
  }));
}
