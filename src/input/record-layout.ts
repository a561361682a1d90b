import { parse } from 'csv-parse/sync';
import { readHeader } from './header.ts';

/** How the rows of a record are laid out in its file. */
export interface RecordLayout {
  /** What stands between cells. */
  readonly separator: string;
  /** Line of the header, from 1; 0 where there is none. */
  readonly headerLine: number;
  /** First line below the header that may hold data. */
  readonly dataLine: number;
  /** The header's cells; of a record without one, the numbers of its columns. */
  readonly headers: readonly string[];
}

/** A row as it stands: mostly a line, more of them where line ends stand between quotes. */
export interface WrittenRow {
  readonly text: string;
  /** Its first line, from 1. */
  readonly line: number;
}

/** What the job says of the layout; `null` where it is to be found. */
export interface LayoutGiven {
  readonly separator: string | null;
  /** 0 is no header. */
  readonly headerLine: number | null;
  readonly dataLine: number | null;
}

const SEPARATORS = [',', ';', '\t', '|'];

/**
 * Finds the header of a record below whatever a logger writes above it, and what separates its cells: the first
 * line that, cut by one of the separators, holds every wanted header. Where there is none, the line that comes
 * closest, so that what is missing can be told.
 *
 * @param rows the file's first rows
 * @param wanted headers that the job maps; `null` for the plain form with a column `time`
 * @param given what the job says
 */
export function recordLayout(
  rows: readonly WrittenRow[],
  wanted: readonly string[] | null,
  given: LayoutGiven,
): RecordLayout {
  const separators = given.separator === null ? SEPARATORS : [given.separator];
  if (given.headerLine === 0) return withoutHeader(rows, separators, given);
  let best = { score: -1, separator: separators[0], row: rows[0], headers: [] as string[] };
  const whole = wanted?.length ?? 1;
  for (const row of rows) {
    if (best.score >= whole) break;
    if (row.text.trim() === '' || (given.headerLine ?? row.line) !== row.line) continue;
    for (const separator of separators) {
      const headers = cutLine(row.text, separator).map(plainHeader);
      // Of equal scores the line that is cut into more cells, up to one in all.
      const score = scoreOf(headers, wanted) + headers.length / (headers.length + 1);
      if (score > best.score) best = { score, separator, row, headers };
    }
  }
  const { separator, row, headers } = best;
  const below = row.line + row.text.split('\n').length;
  return { separator, headerLine: row.line, headers, dataLine: given.dataLine ?? below };
}

/** A header without line ends and doubled spaces. */
function plainHeader(cell: string): string {
  return cell.trim().replace(/\s+/g, ' ');
}

/** How many wanted headers a line holds. */
function scoreOf(headers: readonly string[], wanted: readonly string[] | null): number {
  if (wanted !== null) return wanted.filter((name) => headers.includes(name)).length;
  const names = headers.map((header) => readHeader(header).name);
  return headers.length > 1 && (names.includes('time') || names.includes('date')) ? 1 : 0;
}

function withoutHeader(
  rows: readonly WrittenRow[],
  separators: readonly string[],
  { dataLine }: LayoutGiven,
): RecordLayout {
  const isData = ({ text, line }: WrittenRow) => line >= (dataLine ?? 1) && text.trim() !== '';
  const first = rows.find(isData) ?? rows[0];
  const cuts = separators.map((separator) => cutLine(first.text, separator).length);
  const most = Math.max(...cuts);
  return {
    separator: separators[cuts.indexOf(most)],
    headerLine: 0,
    dataLine: first.line,
    headers: Array.from({ length: most }, (_, i) => String(i + 1)),
  };
}

/** The longest row, in lines, that a header between quotes may make. */
const MOST_LINES = 10;

/** A text's rows: a line with a quote that is left open goes on in the next ones, where one of them closes it. */
export function writtenRows(text: string): WrittenRow[] {
  const lines = text.split('\n');
  const rows: WrittenRow[] = [];
  for (let i = 0; i < lines.length; ) {
    const end = endOfRow(lines, i);
    rows.push({ text: lines.slice(i, end).join('\n'), line: i + 1 });
    i = end;
  }
  return rows;
}

/** Index behind the last line of the row that begins in a line. */
function endOfRow(lines: readonly string[], start: number): number {
  let open = isOpen(lines[start]);
  if (!open) return start + 1;
  for (let i = start + 1; i < Math.min(lines.length, start + MOST_LINES); i++) {
    open = open !== isOpen(lines[i]);
    if (!open) return i + 1;
  }
  return start + 1;
}

/** True where a quote is left open. */
function isOpen(text: string): boolean {
  return text.split('"').length % 2 === 0;
}

/** One row's cells; a row with a quote that is never closed is cut as it stands. */
export function cutLine(line: string, separator: string): string[] {
  if (!line.includes('"')) return line.split(separator);
  try {
    const rows: string[][] = parse(line, {
      delimiter: separator,
      relax_column_count: true,
      relax_quotes: true,
    });
    return rows[0] ?? [];
  } catch {
    return line.split(separator);
  }
}
