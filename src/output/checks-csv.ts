import { stringify } from 'csv-stringify/sync';
import type { Check, Connection, Result } from '../model.ts';
import type { UnitSystem } from '../units.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, quantityOf, unitOf } from './quantity.ts';

/**
 * checks.csv: one row a connection and check, with demand and limit in the unit that the row names;
 * the unit of a ratio is `1`.
 *
 * @returns the CSV text with a header row and LF line ends
 */
export function checksCsv(result: Result): string {
  const { units } = result.job;
  const rows = result.runs.flatMap((run) =>
    run.connections.flatMap((connection) =>
      connection.checks.map((check) => row(connection, check, units)),
    ),
  );
  return stringify([HEADER, ...rows]);
}

const HEADER = [
  'run',
  'connection',
  'check',
  'demand',
  'limit',
  'unit',
  'utilisation',
  'status',
  'when',
];

function row(connection: Connection, check: Check, units: UnitSystem): string[] {
  const quantity = quantityOf(check.unit);
  const cell = (value: number | null) =>
    cellNumber(value === null ? null : inUnits(value, quantity, units));
  return [
    connection.run,
    String(connection.number),
    check.check,
    cell(check.demand),
    cell(check.limit),
    unitOf(quantity, units) || '1',
    cellNumber(check.utilisation),
    check.status,
    check.when,
  ];
}
