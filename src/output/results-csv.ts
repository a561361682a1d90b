import { stringify } from 'csv-stringify/sync';
import type { Connection, Result, RunResult } from '../model.ts';
import { scaledFrom } from '../temperature/short-season.ts';
import type { UnitSystem } from '../units.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, unitOf, type Written } from './quantity.ts';
import { connectionWords } from './remedies/connection-words.ts';

/**
 * results.csv: one row a connection, in the order of the job.
 *
 * @param result a screened job; its `job.units` decide the units, which stand in the headers
 * @returns the CSV text with a header row and LF line ends
 */
export function resultsCsv(result: Result): string {
  const { units } = result.job;
  const rows = result.runs.flatMap((run) =>
    run.connections.map((connection) =>
      COLUMNS.map(({ quantity, value }) => {
        const found = value(connection, run, units);
        if (typeof found === 'string') return found;
        if (found === null || quantity === undefined) return cellNumber(found);
        return cellNumber(inUnits(found, quantity, units));
      }),
    ),
  );
  const header = COLUMNS.map(({ name, quantity }) =>
    quantity === undefined ? name : `${name} [${unitOf(quantity, units)}]`,
  );
  return stringify([header, ...rows]);
}

interface Column {
  readonly name: string;
  /** Given where the value is in base units and the header names the unit. */
  readonly quantity?: Written;
  readonly value: (
    connection: Connection,
    run: RunResult,
    units: UnitSystem,
  ) => string | number | null;
}

const COLUMNS: readonly Column[] = [
  { name: 'run', value: (c) => c.run },
  { name: 'connection', value: (c) => c.number },
  { name: 'position', quantity: 'length', value: (c) => c.position },
  { name: 'fastener', value: (c) => c.fastener.id },
  { name: 'role', value: (c) => c.role },
  { name: 'shear_peak', quantity: 'force', value: (c) => c.shearPeak },
  { name: 'shear_range_max', quantity: 'force', value: (c) => c.shearRange },
  {
    name: 'shear_range_equivalent',
    quantity: 'force',
    value: (c) => c.fastenerDamage.equivalentRange,
  },
  { name: 'cycles_per_year', value: (c) => c.cyclesPerYear },
  { name: 'fastener_damage_per_year', value: (c) => c.fastenerDamagePerYear },
  { name: 'stress_range_max', quantity: 'stress', value: (c) => c.stressRange },
  {
    name: 'stress_range_equivalent',
    quantity: 'stress',
    value: (c) => c.memberDamage.equivalentRange,
  },
  { name: 'member_damage_per_year', value: (c) => c.memberDamagePerYear },
  { name: 'life [years]', value: (c) => cellNumber(c.life, 'unlimited') },
  { name: 'slip_peak', quantity: 'length', value: (c) => c.slipPeak },
  { name: 'sliding_per_year', quantity: 'length', value: (c) => c.slidingPerYear },
  { name: 'buckling_utilisation', value: (c) => c.bucklingUtilisation },
  { name: 'governing_check', value: (c) => c.governing?.check ?? '' },
  { name: 'utilisation', value: (c) => c.governing?.utilisation ?? null },
  { name: 'passes', value: (_, run) => run.passes },
  { name: 'verdict', value: (c) => c.verdict },
  { name: 'remedy', value: (c, _, units) => connectionWords(c.change, units) },
  // blank where the record is a whole year
  { name: 'damage_scaled_from [days]', value: (_, run) => scaledFrom(run) },
  {
    name: 'fastener_damage_filled_share',
    value: (c, run) => run.filledShares()[c.number - 1].fastener,
  },
  {
    name: 'member_damage_filled_share',
    value: (c, run) => run.filledShares()[c.number - 1].member,
  },
];
