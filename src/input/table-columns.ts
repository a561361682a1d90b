import type { Place } from '../issue.ts';
import { isUnit } from '../units.ts';
import { type Findings, report } from './findings.ts';
import { readHeader } from './header.ts';

/** One cell of a table as typed, without the spaces around it. */
export interface Cell {
  readonly text: string;
  readonly place: Place;
}

/** A column of a table. */
export interface Column {
  /** As a key is written: `Net area` is `net_area`. */
  readonly name: string;
  readonly unit?: string;
  readonly header: Cell;
  /** Where its unit stands, if not in the header. */
  readonly unitPlace?: Place;
}

/** The columns that a header row names, `null` where it names none; one that stands twice is reported. */
export function tableColumns(header: readonly Cell[], findings: Findings): (Column | null)[] {
  const names = new Set<string>();
  return header.map((cell) => {
    const { name: typed, unit } = readHeader(cell.text);
    if (typed === '' && unit === undefined) return null;
    const name = typed.toLowerCase().replace(/[\s-]+/g, '_');
    if (name === '') report(findings, cell.place, { found: cell.text, expected: 'a column name' });
    else if (names.has(name)) {
      report(findings, cell.place, { found: cell.text, expected: 'each column once' });
    }
    names.add(name);
    return unit === undefined ? { name, header: cell } : { name, unit, header: cell };
  });
}

/**
 * Takes the first row below the header as units where it holds nothing else and names no id.
 *
 * @returns the columns with these units, and the rows of values
 */
export function withUnitsRow(
  columns: readonly (Column | null)[],
  rows: readonly (readonly Cell[])[],
): { columns: readonly (Column | null)[]; rows: readonly (readonly Cell[])[] } {
  const [first, ...rest] = rows;
  if (first === undefined || !first.every((cell, i) => fits(cell, columns[i]))) {
    return { columns, rows };
  }
  const withUnits = columns.map((column, i) => {
    const unit = first[i]?.text.replace(/^[[(](.*)[\])]$/, '$1') ?? '';
    return column === null || isNone(unit)
      ? column
      : { ...column, unit, unitPlace: first[i].place };
  });
  return { columns: withUnits, rows: rest };
}

/** A blank or a dash anywhere, or a unit below a header that has none and is no id. */
function fits({ text }: Cell, column: Column | null | undefined): boolean {
  if (isNone(text)) return true;
  if (column === null || column === undefined || column.name === 'id') return false;
  return column.unit === undefined && isUnit(text.replace(/^[[(](.*)[\])]$/, '$1'));
}

function isNone(text: string): boolean {
  return /^[-–—]?$/.test(text);
}
