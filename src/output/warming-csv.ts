import { stringify } from 'csv-stringify/sync';
import type { Connection, Result } from '../model.ts';
import { cellNumber } from './number-text.ts';

/**
 * warming.csv: one row a connection with the record as it is and in warmer zones (`warmer_…`).
 *
 * @returns the CSV text with a header row and LF line ends; `null` where the job asks for no warming
 */
export function warmingCsv({ runs, warmed }: Result): string | null {
  if (warmed === null) return null;
  const header = ['run', 'connection', ...NAMES, ...NAMES.map((name) => `warmer_${name}`)];
  const rows = runs.flatMap(({ run, connections }, r) =>
    connections.map((connection, i) => [
      run.id,
      String(i + 1),
      ...cells(connection),
      ...cells(warmed[r].connections[i]),
    ]),
  );
  return stringify([header, ...rows]);
}

const COLUMNS: Readonly<Record<string, (connection: Connection) => string>> = {
  member_damage_per_year: (c) => cellNumber(c.memberDamagePerYear),
  fastener_damage_per_year: (c) => cellNumber(c.fastenerDamagePerYear),
  'life [years]': (c) => cellNumber(c.life, 'unlimited'),
  governing_check: (c) => c.governing?.check ?? '',
  utilisation: (c) => cellNumber(c.governing?.utilisation ?? null),
};

const NAMES = Object.keys(COLUMNS);

function cells(connection: Connection): string[] {
  return Object.values(COLUMNS).map((cell) => cell(connection));
}
