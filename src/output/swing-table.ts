import { resultUnit, type UnitSystem } from '../units.ts';
import type { ZoneFacts } from '../verdict/zone-facts.ts';
import { shortNumber } from './number-text.ts';
import { bullet, table } from './summary/text-layout.ts';

/** Round widths of a class, in the unit of the results. */
const WIDTHS = [1, 2, 5, 10, 20, 50, 100];
const MOST_CLASSES = 12;

/** How many swings of each size a year has in each zone, as rainflow counts them; one column a zone. */
export function swingTable(facts: readonly ZoneFacts[], units: UnitSystem): string[] {
  const { name: unit, from } = resultUnit('temperature difference', units);
  const largest = facts.reduce(
    (most, { ranges }) => ranges.reduce((a, b) => Math.max(a, from(b)), most),
    0,
  );
  if (largest === 0) return [];
  const width = WIDTHS.find((one) => largest / one <= MOST_CLASSES) ?? WIDTHS[WIDTHS.length - 1];
  const classes = Math.floor(largest / width) + 1;
  const counts = facts.map(({ ranges, years }) => {
    const count = new Float64Array(classes);
    for (const range of ranges) count[Math.floor(from(range) / width)] += 1 / years;
    return count;
  });
  const labels = Array.from({ length: classes }, (_, c) => `${c * width} to ${(c + 1) * width}`);
  const columns = facts.map(({ zone }, z) => [
    zone.name,
    ...Array.from(counts[z], (count) => (count === 0 ? '' : shortNumber(count))),
  ]);
  const first = [`swing [${unit}]`, ...labels];
  const how = 'All swings between turning points, counted by rainflow, the record repeating.';
  return [...sideBySide(first, columns), bullet(how)];
}

/** Most columns of text that the tables take. */
const WIDTH = 96;

/** The columns in as many tables, each with the first column again, as fit the width. */
function sideBySide(first: readonly string[], columns: readonly (readonly string[])[]): string[] {
  const widthOf = (cells: readonly string[]) => 2 + Math.max(...cells.map(({ length }) => length));
  const tables: (readonly string[])[][] = [];
  let room = 0;
  for (const column of columns) {
    room -= widthOf(column);
    if (room < 0) {
      tables.push([first]);
      room = WIDTH - widthOf(first) - widthOf(column);
    }
    tables[tables.length - 1].push(column);
  }
  return tables.map((one) => {
    const rows = first.map((_, r) => one.map((cells) => cells[r]));
    return table(
      rows,
      one.map((_, i) => i),
    );
  });
}
