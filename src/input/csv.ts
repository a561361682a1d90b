import { parse } from 'csv-parse/sync';
import type { Place } from '../issue.ts';
import { cellName } from './cell-name.ts';
import { reportCsvFault } from './csv-fault.ts';
import { type Findings, report } from './findings.ts';
import { LONGEST_TEXT, soundText } from './sound-text.ts';
import type { SourceEntry, SourceMap } from './source.ts';
import { type Cell, type Column, tableColumns, withUnitsRow } from './table-columns.ts';

/**
 * Reads a small CSV table as spreadsheets write it (RFC 4180; cells between commas, semicolons or tabs; a header
 * row, and if need be a row of units below it) into rows whose cells know their places. Blank lines, rows and
 * columns are passed over.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @returns the rows, none where the text is no table; every fault is reported
 */
export function readCsv(text: string, file: string, findings: Findings): SourceMap[] {
  const [header, ...body] = readCells(text.replace(/\r\n?/g, '\n'), file, findings);
  if (header === undefined) return [];
  const plain = tableColumns(header, findings);
  const { columns, rows } = withUnitsRow(plain, body);
  return rows.map((row) => toMap(row, columns, findings));
}

/** The table's cells, row by row, those that are not all blank; none where it has a fault. */
function readCells(text: string, file: string, findings: Findings): Cell[][] {
  const { delimiter, body } = delimiterOf(text);
  const placeAt = placeFinder(body, file);
  let end = -1;
  const cast = (cell: string, { bytes, index }: { bytes: number; index: number }): Cell => {
    // The parser stands at the end of the cell: the next one begins behind the separator.
    const place = placeAt(end + 1, index);
    end = bytes;
    return { text: soundText(cell.trim(), place, findings), place };
  };
  let rows: Cell[][];
  try {
    const how = {
      trim: true,
      relax_column_count: true,
      relax_quotes: true,
      skip_empty_lines: true,
    };
    rows = parse(body, { ...how, delimiter, cast }) as unknown as Cell[][];
  } catch (error) {
    reportCsvFault(error, file, findings);
    return [];
  }
  const filled = rows.filter((row) => row.some((cell) => cell.text !== ''));
  if (filled.length === 0) report(findings, { file, line: 1 }, { expected: 'a header row' });
  return filled;
}

/** What stands between the cells: what a first line `sep=;` says, else the commonest in the header. */
function delimiterOf(text: string): { delimiter: string; body: string } {
  const said = /^sep=(.)(?=\n|$)/i.exec(text);
  if (said !== null) return { delimiter: said[1], body: text.slice(said[0].length) };
  const header = (/^.*\S.*$/m.exec(text)?.[0] ?? '').slice(0, LONGEST_TEXT);
  const count = (mark: string) => header.replace(/"[^"]*"/g, '').split(mark).length;
  const [best] = [',', ';', '\t'].sort((a, b) => count(b) - count(a));
  return { delimiter: best, body: text };
}

/**
 * Turns rising byte offsets into places. A cell begins at its first character that is no space; the first
 * of a row also behind any blank lines. A line end inside quotes begins no row of a spreadsheet.
 */
function placeFinder(text: string, file: string): (offset: number, index: number) => Place {
  const bytes = Buffer.from(text);
  let line = 1;
  let inner = 0;
  let lineStart = 0;
  let at = 0;
  return (offset, index) => {
    let start = offset;
    while (bytes[start] === SPACE || (index === 0 && bytes[start] === NEWLINE)) start++;
    for (; at < start; at++) {
      if (bytes[at] !== NEWLINE) continue;
      line++;
      if (at < offset - 1) inner++;
      lineStart = at + 1;
    }
    const column = bytes.toString('utf8', lineStart, start).length + 1;
    return { file, line, column, cell: cellName(index, line - inner) };
  };
}

const NEWLINE = 10;
const SPACE = 32;

function toMap(
  row: readonly Cell[],
  columns: readonly (Column | null)[],
  findings: Findings,
): SourceMap {
  const entries = new Map<string, SourceEntry>();
  for (const [i, { text, place }] of row.entries()) {
    const column = columns[i];
    if (column === undefined || column === null) {
      if (text !== '') reportStray(text, place, columns, findings);
      continue;
    }
    const header = {
      place: column.unitPlace ?? column.header.place,
      ...(column.unit === undefined ? {} : { unit: column.unit }),
    };
    const value = {
      type: 'text',
      text,
      place: { ...place, key: column.header.text },
      column: header,
    } as const;
    entries.set(column.name, { value, place: column.header.place });
  }
  const { file, line } = row[0].place;
  return { type: 'map', entries, place: { file, ...(line === undefined ? {} : { line }) } };
}

/** A text in no column, or in one without a name. */
function reportStray(
  found: string,
  place: Place,
  columns: readonly (Column | null)[],
  findings: Findings,
): void {
  const named = columns.filter((column) => column !== null).length;
  report(findings, place, {
    found,
    expected: `nothing here: the header names ${named} ${named === 1 ? 'column' : 'columns'}, and none stands over it`,
    hint: 'Name the column, clear the cell, or put a text that holds a comma in double quotes.',
  });
}
