import { CsvError, parse } from 'csv-parse/sync';

/** Takes a row's cells and its line, from 1; answers false where no more rows are wanted. */
export type TakeRow = (cells: readonly string[], line: number) => boolean;

/** A text that cannot be cut: a quote is never closed, or a row is far too long. */
export class RowError extends Error {
  /** The line where the row begins. */
  readonly line: number;
  readonly kind: 'quote' | 'length';

  constructor(kind: 'quote' | 'length', line: number) {
    super(`row in line ${line}: ${kind}`);
    this.kind = kind;
    this.line = line;
  }
}

/** No row of a record is longer. */
const LONGEST_ROW = 1 << 20;

/**
 * Cuts a text that comes in blocks into rows and cells. Blank lines are passed over.
 *
 * @param texts the text, with LF line ends
 * @param separator what stands between cells
 * @throws RowError
 */
export async function cutRows(
  texts: AsyncIterable<string>,
  separator: string,
  take: TakeRow,
): Promise<void> {
  let held = '';
  let line = 1;
  for await (const block of texts) {
    const text = held + block;
    const end = text.includes('"') ? lastEndOutsideQuotes(text) : text.lastIndexOf('\n') + 1;
    held = text.slice(end);
    if (end === 0 && held.length <= LONGEST_ROW) continue;
    if (held.length > LONGEST_ROW) throw new RowError('length', line + linesIn(text.slice(0, end)));
    const next = takeAll(text.slice(0, end), separator, line, take);
    if (next === null) return;
    line = next;
  }
  takeAll(held, separator, line, take);
}

/** Hands on the rows of a text that holds whole rows only; the line behind it, or `null` for no more. */
function takeAll(text: string, separator: string, first: number, take: TakeRow): number | null {
  // Without a quote, line ends and separators are all there is to it, and cutting there is far faster.
  const takeRows = text.includes('"') ? takeQuoted : takePlain;
  return takeRows(text, separator, first, take);
}

function takePlain(text: string, separator: string, first: number, take: TakeRow): number | null {
  let line = first;
  for (let start = 0; start < text.length; line++) {
    const found = text.indexOf('\n', start);
    const end = found < 0 ? text.length : found;
    if (end > start && !takeUnlessBlank(cutPlain(text, separator, start, end), line, take)) {
      return null;
    }
    start = end + 1;
  }
  return line;
}

function cutPlain(text: string, separator: string, start: number, end: number): string[] {
  const cells: string[] = [];
  let from = start;
  for (;;) {
    const at = text.indexOf(separator, from);
    if (at < 0 || at >= end) break;
    cells.push(text.slice(from, at));
    from = at + 1;
  }
  cells.push(text.slice(from, end));
  return cells;
}

function takeQuoted(text: string, separator: string, first: number, take: TakeRow): number | null {
  let line = first;
  for (const cells of parseRows(text, separator, first)) {
    if (!takeUnlessBlank(cells, line, take)) return null;
    // A line end inside quotes makes a row longer than a line.
    line += 1 + linesIn(cells.join(''));
  }
  return line;
}

function takeUnlessBlank(cells: readonly string[], line: number, take: TakeRow): boolean {
  for (const cell of cells) if (cell !== '') return take(cells, line);
  return true;
}

function parseRows(text: string, separator: string, line: number): string[][] {
  try {
    return parse(text, { delimiter: separator, relax_column_count: true, relax_quotes: true });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    // The text begins with the row whose quote stays open.
    const within = error.code === 'CSV_QUOTE_NOT_CLOSED' ? 1 : Number(error.lines) || 1;
    throw new RowError('quote', line - 1 + within);
  }
}

/** Where the last row ends whose quotes are all closed. */
function lastEndOutsideQuotes(text: string): number {
  let end = 0;
  let from = 0;
  for (;;) {
    const open = text.indexOf('"', from);
    const last = text.lastIndexOf('\n', open < 0 ? text.length : open) + 1;
    if (last > from) end = last;
    const close = open < 0 ? -1 : text.indexOf('"', open + 1);
    if (close < 0) return end;
    from = close + 1;
  }
}

function linesIn(text: string): number {
  let lines = 0;
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines++;
  return lines;
}
