import { CsvError, parse } from 'csv-parse/sync';

/** Takes a row's cells and its line, from 1; answers false where no more rows are wanted. */
export type TakeRow = (cells: readonly string[], line: number) => boolean;

/** A quote that is opened and never closed, by the line where the row with it begins. */
export class OpenQuoteError extends Error {
  readonly line: number;

  constructor(line: number) {
    super(`a quote in line ${line} is never closed`);
    this.line = line;
  }
}

/** No row is longer than this: a quote is open. */
const LONGEST_ROW = 1 << 20;

/**
 * Cuts a text that comes in blocks into rows and cells. Blank lines are passed over.
 *
 * @param texts the text, with LF line ends
 * @param separator what stands between cells
 * @throws OpenQuoteError
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
    if (held.length > LONGEST_ROW) throw new OpenQuoteError(line + linesIn(text.slice(0, end)));
    const next = takeAll(text.slice(0, end), separator, line, take);
    if (next === null) return;
    line = next;
  }
  takeAll(held, separator, line, take);
}

/** Hands on the rows of a text that holds whole rows only; the line behind it, or `null` for no more. */
function takeAll(text: string, separator: string, first: number, take: TakeRow): number | null {
  const quoted = text.includes('"');
  // Without a quote, line ends and separators are all there is to it, and cutting there is far faster.
  const rows = quoted ? parseRows(text, separator, first) : text.split('\n');
  let line = first;
  for (const row of rows) {
    const cells = typeof row === 'string' ? (row === '' ? [] : row.split(separator)) : row;
    if (cells.some((cell) => cell !== '') && !take(cells, line)) return null;
    line += quoted ? 1 + linesIn(cells.join('')) : 1;
  }
  // What follows the last line end is no line yet.
  return text.endsWith('\n') && !quoted ? line - 1 : line;
}

function parseRows(text: string, separator: string, line: number): string[][] {
  try {
    return parse(text, { delimiter: separator, relax_column_count: true, relax_quotes: true });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    // The text begins with the row whose quote stays open.
    const within = error.code === 'CSV_QUOTE_NOT_CLOSED' ? 1 : Number(error.lines) || 1;
    throw new OpenQuoteError(line - 1 + within);
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
