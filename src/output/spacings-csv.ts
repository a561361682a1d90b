import { stringify } from 'csv-stringify/sync';
import { CHECKS, type CheckName } from '../model.ts';
import type { SpacingRow } from '../verdict/spacing-row.ts';
import type { SpacingCase, SpacingComparison } from '../verdict/spacings.ts';
import { connectionName } from './names.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, unitOf, type Written } from './quantity.ts';

/**
 * spacings.csv: one row a run, arrangement, cut and spacing. The utilisation of a check is the largest in the run;
 * blank where the check passes and fails nowhere, and `not_given` and `exempt` say why. Joint gaps take two neighbours
 * and are not checked here. Forces are unfactored.
 *
 * @returns the CSV text with a header row and LF line ends, in the units of the job
 */
export function spacingsCsv({ job: { units }, cases }: SpacingComparison): string {
  const header = COLUMNS.map(({ name, quantity }) =>
    quantity === undefined ? name : `${name} [${unitOf(quantity, units)}]`,
  );
  const lines = cases.flatMap((one) =>
    one.rows.map((row) =>
      COLUMNS.map(({ quantity, value }) => {
        const found = value(row, one);
        if (typeof found === 'string') return found;
        if (found === null || quantity === undefined) return cellNumber(found);
        return cellNumber(inUnits(found, quantity, units));
      }),
    ),
  );
  return stringify([header, ...lines]);
}

interface Column {
  readonly name: string;
  /** Given where the value is in base units and the header names the unit. */
  readonly quantity?: Written;
  readonly value: (row: SpacingRow, of: SpacingCase) => string | number | null;
}

const COLUMNS: readonly Column[] = [
  { name: 'run', value: (_, { run }) => run.id },
  { name: 'fixed', value: (_, { arrangement }) => arrangement },
  { name: 'pieces', value: (row) => row.pieces },
  { name: 'longest_piece', quantity: 'length', value: (row) => row.pieceLength },
  { name: 'spacing_asked', quantity: 'length', value: (row) => row.asked },
  { name: 'spacing', quantity: 'length', value: (row) => row.spacing },
  { name: 'count', value: (row) => row.count },
  ...CHECKS.filter((name) => name !== 'joint gap').map((name) => ({
    name: `${name.replaceAll(' ', '_')}_utilisation`,
    value: (row: SpacingRow) => useOf(row, name),
  })),
  { name: 'governing_check', value: (row) => row.governing?.check.check ?? '' },
  {
    name: 'connection',
    value: ({ governing }) => (governing === null ? '' : connectionName(governing.connection)),
  },
  {
    name: 'position',
    quantity: 'length',
    value: (row) => row.governing?.connection.position ?? null,
  },
  { name: 'utilisation', value: (row) => row.governing?.check.utilisation ?? null },
  { name: 'shear_range_max', quantity: 'force', value: (row) => row.shearRange },
  { name: 'member_force_max', quantity: 'force', value: (row) => row.memberForce },
  { name: 'life [years]', value: (row) => cellNumber(row.life, 'unlimited') },
  { name: 'not_given', value: (row) => row.notGiven.join('; ') },
  { name: 'exempt', value: (row) => row.exempt.join('; ') },
  { name: 'verdict', value: verdictOf },
];

function useOf({ worst }: SpacingRow, name: CheckName): number | null {
  return worst.find(({ check }) => check.check === name)?.check.utilisation ?? null;
}

function verdictOf({ passes }: SpacingRow): string {
  if (passes === null) return 'nothing to check';
  return passes ? 'ok' : 'fails';
}
