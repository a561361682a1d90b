import { parse } from 'csv-parse/sync';
import type { Place } from '../issue.ts';
import { reportCsvFault } from './csv-fault.ts';
import { type Findings, report } from './findings.ts';
import { readIsoTime } from './iso-time.ts';
import { COLDEST, HOTTEST } from './keys.ts';
import { type ChannelQuantity, type RecordColumn, recordColumns } from './record-columns.ts';
import { type RepeatedFaults, repeatedFaults } from './repeated-faults.ts';
import type { SourceMap } from './source.ts';

/** The record as it stands in its file: times that rise, and channels with blanks. */
export interface RecordTable {
  /** Time of each row [ms since 1970 on the record's own clock]. */
  readonly times: Float64Array;
  /** Value in each row [°C, W/m² or m/s], `NaN` where the cell is blank. */
  readonly channels: ReadonlyMap<string, Float64Array>;
  /** What each channel measures. */
  readonly quantities: ReadonlyMap<string, ChannelQuantity>;
  /** Offset of the record's clock from UTC [ms]; `null` where the record names none. */
  readonly offset: number | null;
}

/**
 * Reads the record's CSV.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @param mapping the job's `record.columns`, or `null`
 * @returns the record, or `null` where it has faults, which are reported
 */
export function readRecord(
  text: string,
  file: string,
  mapping: SourceMap | null,
  findings: Findings,
): RecordTable | null {
  const rows = cutRows(text, file, findings);
  if (rows === null) return null;
  const headers = rows[0].cells.map((cell) => cell.trim());
  const columns = recordColumns(headers, file, mapping, findings);
  if (columns === null) return null;
  const body = rows.slice(1);
  if (body.length < 2) {
    return report(
      findings,
      { file },
      { found: `${body.length} rows`, expected: 'two rows or more' },
    );
  }
  const before = findings.issues.length;
  const faults = repeatedFaults(findings);
  checkWidths(body, headers.length, file, faults);
  const [time, ...others] = columns;
  const clock = readTimes(body, time, file, faults);
  const channels = others.map(
    (column) => [column.name, readChannel(body, column, file, faults)] as const,
  );
  faults.finish();
  if (findings.issues.length > before) return null;
  const quantities = others.map(({ name, measure }) => [name, measure!.quantity] as const);
  return { ...clock, channels: new Map(channels), quantities: new Map(quantities) };
}

interface Row {
  readonly cells: readonly string[];
  readonly line: number;
}

/** The rows that are not blank, the header first; `null` where there is none. */
function cutRows(text: string, file: string, findings: Findings): Row[] | null {
  const quoted = text.includes('"');
  let cut: string[][];
  try {
    // Without a quote, lines and commas are all there is to it, and cutting there is far faster.
    cut = quoted ? parse(text, { relax_column_count: true }) : text.split(LINE_BREAK).map(cutLine);
  } catch (error) {
    return reportCsvFault(error, file, findings);
  }
  const rows: Row[] = [];
  let line = 1;
  for (const cells of cut) {
    if (cells.some((cell) => cell !== '')) rows.push({ cells, line });
    // A line break inside quotes makes a row longer than a line.
    line += quoted ? cells.join('').split(LINE_BREAK).length : 1;
  }
  if (rows.length > 0) return rows;
  return report(findings, { file, line: 1 }, { expected: 'a header row' });
}

const LINE_BREAK = /\r\n|\r|\n/;

function cutLine(line: string): string[] {
  return line.split(',');
}

function checkWidths(rows: readonly Row[], width: number, file: string, faults: RepeatedFaults) {
  for (const { cells, line } of rows) {
    if (cells.length === width) continue;
    const found = `${cells.length} cells`;
    faults.add('cells', { file, line }, { found, expected: `${width} cells, as in the header` });
  }
}

function readTimes(
  rows: readonly Row[],
  column: RecordColumn,
  file: string,
  faults: RepeatedFaults,
): Pick<RecordTable, 'times' | 'offset'> {
  const times = new Float64Array(rows.length);
  let offset: number | null | undefined;
  let previous = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < rows.length; i++) {
    const text = (rows[i].cells[column.index] ?? '').trim();
    const time = readIsoTime(text);
    const fault = (kind: keyof typeof TIME_FAULTS) =>
      faults.add(kind, placeIn(rows[i], column, file), { found: text, ...TIME_FAULTS[kind] });
    if (time === null) {
      fault('none');
      continue;
    }
    offset ??= time.offset;
    if ((offset === null) !== (time.offset === null)) fault('offset');
    // On a clock that keeps the first row's offset, summer time or not.
    times[i] = time.local - (time.offset ?? 0) + (offset ?? 0);
    if (times[i] === previous) fault('twice');
    if (times[i] < previous) fault('earlier');
    previous = times[i];
  }
  return { times, offset: offset ?? null };
}

const TIME_FAULTS = {
  none: { expected: 'a date and time that there is, such as 2031-01-01T00:00' },
  offset: { expected: 'an offset from UTC in every time or in none' },
  twice: { expected: 'each time once', hint: 'The row above has the same time.' },
  earlier: { expected: 'a time after the row above' },
} as const;

/** Values beyond these are mostly a logger's mark for a fault [°C, W/m², m/s]. */
const BOUNDS: Readonly<Record<ChannelQuantity, { from: number; to: number; words: string }>> = {
  temperature: {
    from: COLDEST,
    to: HOTTEST,
    words: `a temperature from ${COLDEST} to ${HOTTEST} degC`,
  },
  // a pyranometer reads a little under zero at night
  irradiance: { from: -100, to: 2000, words: 'an irradiance from -100 to 2000 W/m^2' },
  speed: { from: 0, to: 150, words: 'a speed from 0 to 150 m/s' },
};

const NUMBER = /^\s*[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?\s*$/;

function readChannel(
  rows: readonly Row[],
  column: RecordColumn,
  file: string,
  faults: RepeatedFaults,
): Float64Array {
  const { index } = column;
  const { quantity, convert } = column.measure!;
  const { from, to, words } = BOUNDS[quantity];
  const values = new Float64Array(rows.length).fill(Number.NaN);
  for (let i = 0; i < rows.length; i++) {
    const text = rows[i].cells[index] ?? '';
    if (text.trim() === '') continue;
    const value = NUMBER.test(text) ? convert(Number(text)) : Number.NaN;
    if (value >= from && value <= to) values[i] = value;
    else {
      const expected = Number.isNaN(value)
        ? 'a number, or a blank where there is none'
        : `${words}, or a blank where there is none`;
      faults.add(`value ${column.name}`, placeIn(rows[i], column, file), { found: text, expected });
    }
  }
  return values;
}

/** The place of a row's cell in a column. */
function placeIn({ cells, line }: Row, { index, header }: RecordColumn, file: string): Place {
  const before = cells.slice(0, index).reduce((length, cell) => length + cell.length + 1, 0);
  return { file, line, column: before + 1, key: header };
}
