import { parse } from 'csv-parse/sync';
import type { Place } from '../issue.ts';
import { reportCsvFault } from './csv-fault.ts';
import { type Findings, report } from './findings.ts';
import { readHeader } from './header.ts';
import type { SourceEntry, SourceMap } from './source.ts';

/**
 * Reads a small CSV table (RFC 4180: commas, double quotes, a header row) into rows whose cells know
 * their line and column. Blank lines are passed over.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @returns the rows, none where the text is no table; every fault is reported
 */
export function readCsv(text: string, file: string, findings: Findings): SourceMap[] {
  const [header, ...rows] = readCells(text.replace(/\r\n?/g, '\n'), file, findings);
  if (header === undefined) return [];
  const columns = readColumns(header, findings);
  return rows.map((row) => toMap(row, columns, findings));
}

interface Cell {
  readonly text: string;
  readonly place: Place;
}

interface Column {
  readonly name: string;
  readonly unit?: string;
  readonly header: Cell;
}

/** The table's cells, row by row; none where it has a fault. */
function readCells(text: string, file: string, findings: Findings): Cell[][] {
  const placeAt = placeFinder(text, file);
  let end = -1;
  const cast = (cell: string, { bytes, column }: { bytes: number; column: number | string }) => {
    // The parser stands at the end of the cell: the next one begins behind the separator.
    const place = placeAt(end + 1, column === 0);
    end = bytes;
    return { text: cell, place };
  };
  let rows: Cell[][];
  try {
    const options = { trim: true, relax_column_count: true, skip_empty_lines: true, cast };
    rows = parse(text, options) as unknown as Cell[][];
  } catch (error) {
    reportCsvFault(error, file, findings);
    return [];
  }
  if (rows.length === 0) report(findings, { file, line: 1 }, { expected: 'a header row' });
  return rows.filter((row) => row.some((cell) => cell.text !== ''));
}

/**
 * Turns rising byte offsets into places. A cell begins at its first character that is no space; the first
 * of a row also behind any blank lines.
 */
function placeFinder(text: string, file: string): (offset: number, first: boolean) => Place {
  const bytes = Buffer.from(text);
  let line = 1;
  let lineStart = 0;
  let at = 0;
  return (offset, first) => {
    let start = offset;
    while (bytes[start] === SPACE || (first && bytes[start] === NEWLINE)) start++;
    for (; at < start; at++) {
      if (bytes[at] !== NEWLINE) continue;
      line++;
      lineStart = at + 1;
    }
    return { file, line, column: bytes.toString('utf8', lineStart, start).length + 1 };
  };
}

const NEWLINE = 10;
const SPACE = 32;

function readColumns(header: readonly Cell[], findings: Findings): Column[] {
  const names = new Set<string>();
  return header.map((cell) => {
    const { name, unit } = readHeader(cell.text);
    if (name === '') report(findings, cell.place, { found: cell.text, expected: 'a column name' });
    else if (names.has(name)) {
      report(findings, cell.place, { found: cell.text, expected: 'each column once' });
    }
    names.add(name);
    return unit === undefined ? { name, header: cell } : { name, unit, header: cell };
  });
}

function toMap(row: readonly Cell[], columns: readonly Column[], findings: Findings): SourceMap {
  const entries = new Map<string, SourceEntry>();
  for (const [i, { text, place }] of row.entries()) {
    const column = columns[i];
    if (column === undefined) {
      if (text !== '') reportExtra(text, place, columns.length, findings);
      continue;
    }
    const header = {
      place: column.header.place,
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

function reportExtra(found: string, place: Place, count: number, findings: Findings): void {
  report(findings, place, {
    found,
    expected: `no more than the ${count} cells of the header`,
    hint: 'Put a text that holds a comma in double quotes.',
  });
}
