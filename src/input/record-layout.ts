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
 * @param lines the file's first lines
 * @param wanted headers that the job maps; `null` for the plain form with a column `time`
 * @param given what the job says
 */
export function recordLayout(
  lines: readonly string[],
  wanted: readonly string[] | null,
  given: LayoutGiven,
): RecordLayout {
  const separators = given.separator === null ? SEPARATORS : [given.separator];
  if (given.headerLine === 0) return withoutHeader(lines, separators, given);
  let best = { score: -1, separator: separators[0], headerLine: 1, headers: [] as string[] };
  const from = given.headerLine === null ? 0 : given.headerLine - 1;
  const to = given.headerLine === null ? lines.length : given.headerLine;
  const whole = wanted?.length ?? 1;
  for (let i = from; i < to && best.score < whole; i++) {
    if ((lines[i] ?? '').trim() === '') continue;
    for (const separator of separators) {
      const headers = cutLine(lines[i], separator).map((cell) => cell.trim());
      // Of equal scores the line that is cut into more cells, up to one in all.
      const score = scoreOf(headers, wanted) + headers.length / (headers.length + 1);
      if (score > best.score) best = { score, separator, headerLine: i + 1, headers };
    }
  }
  const { separator, headerLine, headers } = best;
  return { separator, headerLine, headers, dataLine: given.dataLine ?? headerLine + 1 };
}

/** How many wanted headers a line holds. */
function scoreOf(headers: readonly string[], wanted: readonly string[] | null): number {
  if (wanted !== null) return wanted.filter((name) => headers.includes(name)).length;
  const names = headers.map((header) => readHeader(header).name);
  return headers.length > 1 && (names.includes('time') || names.includes('date')) ? 1 : 0;
}

function withoutHeader(
  lines: readonly string[],
  separators: readonly string[],
  { dataLine }: LayoutGiven,
): RecordLayout {
  const first = Math.max(
    0,
    lines.findIndex((line, i) => i + 1 >= (dataLine ?? 1) && line.trim() !== ''),
  );
  const cuts = separators.map((separator) => cutLine(lines[first] ?? '', separator).length);
  const most = Math.max(...cuts);
  return {
    separator: separators[cuts.indexOf(most)],
    headerLine: 0,
    dataLine: first + 1,
    headers: Array.from({ length: most }, (_, i) => String(i + 1)),
  };
}

/** One line's cells; a line with a quote that is never closed is cut as it stands. */
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
