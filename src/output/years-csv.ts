import { stringify } from 'csv-stringify/sync';
import type { Result, RunResult } from '../model.ts';
import { shortSeason } from '../temperature/short-season.ts';
import { stamp } from './names.ts';
import { cellNumber } from './number-text.ts';

/**
 * years.csv: one row a connection and year of a record of several years, each year as if it stood alone. `scaled_from`
 * names the days where a year is not whole and its damage a year was scaled from them.
 *
 * @returns the CSV text with a header row and LF line ends; `null` for a record of one year or less
 */
export function yearsCsv({ runs }: Result): string | null {
  const rows = runs.flatMap(runRows);
  return rows.length === 0 ? null : stringify([HEADER, ...rows]);
}

const HEADER = [
  'run',
  'connection',
  'from',
  'to',
  'covered_days',
  'scaled_from [days]',
  'member_damage_per_year',
  'fastener_damage_per_year',
  'life [years]',
];

function runRows({ run, yearByYear }: RunResult): string[][] {
  return yearByYear().flatMap(({ from, to, coveredHours, connections }) =>
    connections.map(({ memberDamagePerYear, fastenerDamagePerYear, life }, i) => [
      run.id,
      String(i + 1),
      timeCell(from),
      timeCell(to),
      cellNumber(coveredHours / 24),
      cellNumber(shortSeason(coveredHours)),
      cellNumber(memberDamagePerYear),
      cellNumber(fastenerDamagePerYear),
      cellNumber(life, 'unlimited'),
    ]),
  );
}

function timeCell(time: number): string {
  return stamp(time).replace(' ', 'T');
}
