import { type Findings, report } from './findings.ts';

/** The columns of a weather file that are read, one value an hour; `NaN` where the file marks it missing. */
export interface EpwColumns {
  /** Dry-bulb temperature [°C]. */
  readonly air: Float64Array;
  /** Global on the horizontal [W/m²]. */
  readonly global: Float64Array;
  /** Direct on a surface that faces the sun [W/m²]. */
  readonly direct: Float64Array;
  /** Diffuse on the horizontal [W/m²]. */
  readonly diffuse: Float64Array;
  /** Wind speed [m/s]. */
  readonly wind: Float64Array;
}

/** The data rows: the date that each names, and its values. */
export interface EpwRows {
  readonly year: Int32Array;
  /** 1 … 12 */
  readonly month: Int32Array;
  readonly day: Int32Array;
  /** 1 … 24, the hour that ends the row. */
  readonly hour: Int32Array;
  /** Line of each row in the file, from 1. */
  readonly line: Int32Array;
  readonly columns: EpwColumns;
}

/** Order and missing marks: D. B. Crawley, J. W. Hand and L. K. Lawrie, Building Simulation, 1999 (from memory). */
const VALUES = [
  { key: 'air', index: 6, name: 'dry bulb temperature', missing: 99.9 },
  { key: 'global', index: 13, name: 'global horizontal radiation', missing: 9999 },
  { key: 'direct', index: 14, name: 'direct normal radiation', missing: 9999 },
  { key: 'diffuse', index: 15, name: 'diffuse horizontal radiation', missing: 9999 },
  { key: 'wind', index: 21, name: 'wind speed', missing: 999 },
] as const;
/** The first fields, in order, with the most that each may be. */
const DATE = [
  { key: 'year', most: 9999 },
  { key: 'month', most: 12 },
  { key: 'day', most: 31 },
  { key: 'hour', most: 24 },
] as const;
const FIELDS_READ = 22;

/** The lines of a file in the EPW layout, and the index of the first that holds data. */
interface DataLines {
  readonly lines: readonly string[];
  readonly first: number;
  readonly file: string;
}

/** Reads the data rows. Blank lines are passed over; every fault is reported. */
export function readRows({ lines, first, file }: DataLines, findings: Findings): EpwRows {
  const wanted = lines.flatMap((line, i) => (i >= first && line.trim() !== '' ? [i] : []));
  const rows = emptyRows(wanted.length);
  for (const [row, at] of wanted.entries()) {
    rows.line[row] = at + 1;
    // Plain numbers between commas, never quoted: split so, a row takes a third of a CSV parser's time.
    const cells = lines[at].split(',', FIELDS_READ);
    if (cells.length < FIELDS_READ) {
      const expected = `at least ${FIELDS_READ} fields`;
      report(findings, { file, line: at + 1 }, { found: `${cells.length} fields`, expected });
      continue;
    }
    const wrong = (index: number, key: string, expected: string): void => {
      const place = { file, line: at + 1, column: columnOf(lines[at], index), key };
      report(findings, place, { found: cells[index].trim(), expected });
    };
    readDate(rows, row, cells, wrong);
    readValues(rows, row, cells, wrong);
  }
  return rows;
}

type Wrong = (index: number, key: string, expected: string) => void;

function readDate(rows: EpwRows, row: number, cells: readonly string[], wrong: Wrong): void {
  for (const [index, { key, most }] of DATE.entries()) {
    const value = Number(cells[index]);
    const known = Number.isInteger(value) && value >= 1 && value <= most;
    if (!known) wrong(index, key, `a whole number from 1 to ${most}`);
    rows[key][row] = value;
  }
}

function readValues(rows: EpwRows, row: number, cells: readonly string[], wrong: Wrong): void {
  for (const { key, index, name, missing } of VALUES) {
    const text = cells[index];
    const value = text.trim() === '' ? Number.NaN : Number(text);
    if (Number.isNaN(value)) wrong(index, name, `a number, or ${missing} where it is missing`);
    rows.columns[key][row] = value >= missing ? Number.NaN : value;
  }
}

function emptyRows(count: number): EpwRows {
  const whole = () => new Int32Array(count);
  const real = () => new Float64Array(count);
  const columns = { air: real(), global: real(), direct: real(), diffuse: real(), wind: real() };
  return { year: whole(), month: whole(), day: whole(), hour: whole(), line: whole(), columns };
}

/** Column, from 1, at which a field of a line begins. */
export function columnOf(line: string, field: number): number {
  return line.split(',').slice(0, field).join(',').length + (field > 0 ? 2 : 1);
}
