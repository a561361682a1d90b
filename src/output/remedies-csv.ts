import { stringify } from 'csv-stringify/sync';
import {
  CHECKS,
  type CheckName,
  type Connection,
  type Fastener,
  type RemediedPiece,
  type Remedy,
  type Result,
  type Rework,
  type RunResult,
} from '../model.ts';
import type { UnitSystem } from '../units.ts';
import { connectionName, connectionNames } from './names.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, unitOf, type Written } from './quantity.ts';
import { changedFasteners } from './remedies/changed-fasteners.ts';
import { changeWords, reworkWords, schemeWords, widestSpan } from './remedies/remedy-words.ts';
import { slotLength } from './remedies/slot-length.ts';

/**
 * remedies.csv: one row a run that is to be changed or reworked, and after a run that is cut one row a piece of it. The
 * utilisation of a check is the largest in the changed run or piece; blank where it is given nowhere.
 *
 * @returns the CSV text with a header row and LF line ends, in the units of the job; `null` where nothing is to be done
 */
export function remediesCsv({ job: { units }, runs }: Result): string | null {
  const rows = runs.flatMap((run) => rowsOf(run));
  if (rows.length === 0) return null;
  const header = COLUMNS.map(({ name, quantity }) =>
    quantity === undefined ? name : `${name} [${unitOf(quantity, units)}]`,
  );
  const lines = rows.map((row) =>
    COLUMNS.map(({ quantity, value }) => {
      const found = value(row, units);
      if (typeof found === 'string') return found;
      if (found === null || quantity === undefined) return cellNumber(found);
      return cellNumber(inUnits(found, quantity, units));
    }),
  );
  return stringify([header, ...lines]);
}

/** A run, or one piece of it, with what it is changed to. */
interface Row {
  readonly run: RunResult;
  readonly remedy: Remedy | Rework;
  /** Of the whole changed run, or the one; none where it is to be reworked. */
  readonly pieces: readonly RemediedPiece[];
  /** Given for one piece of several. */
  readonly piece: RemediedPiece | null;
}

function rowsOf(run: RunResult): Row[] {
  const { remedy } = run;
  if (remedy === null) return [];
  if (remedy.kind === 'rework') return [{ run, remedy, pieces: [], piece: null }];
  const { pieces } = remedy;
  const parts = pieces.length === 1 ? [] : pieces;
  return [
    { run, remedy, pieces, piece: null },
    ...parts.map((piece) => ({ run, remedy, pieces: [piece], piece })),
  ];
}

interface Column {
  readonly name: string;
  /** Given where the value is in base units and the header names the unit. */
  readonly quantity?: Written;
  readonly value: (row: Row, units: UnitSystem) => string | number | null;
}

const COLUMNS: readonly Column[] = [
  { name: 'run', value: ({ run }) => run.run.id },
  { name: 'piece', value: ({ piece }) => piece?.run.id ?? '' },
  { name: 'remedy', value: ({ remedy }) => remedy.kind },
  { name: 'scheme', value: schemeOf },
  { name: 'slotted', value: (row) => ofWhole(row, (remedy) => changed(row, remedy).slotted) },
  { name: 'fixed', value: (row) => ofWhole(row, (remedy) => changed(row, remedy).fixed) },
  { name: 'fasteners', value: (row) => sum(row, ({ roles }) => roles.length) },
  {
    name: 'slots',
    value: (row) => sum(row, ({ roles }) => roles.filter((role) => role === 'slotted').length),
  },
  { name: 'added', value: (row) => ofWhole(row, ({ added }) => added) },
  { name: 'joints', value: (row) => ofWhole(row, ({ joints }) => joints) },
  { name: 'gap', quantity: 'length', value: gapOf },
  { name: 'free_play', quantity: 'length', value: (row) => slotOf(row)?.freePlay ?? null },
  { name: 'slot_length', quantity: 'length', value: slotLengthOf },
  { name: 'spacing', quantity: 'length', value: spacingOf },
  { name: 'utilisation_before', value: ({ run }) => useOf(run.connections) },
  { name: 'utilisation', value: (row) => useOf(connectionsOf(row)) },
  { name: 'governing_check', value: (row) => governingOf(row)?.governing?.check ?? '' },
  { name: 'connection', value: governingName },
  ...CHECKS.map((name) => ({
    name: `${name.replaceAll(' ', '_')}_utilisation`,
    value: (row: Row) => useOf(connectionsOf(row), name),
  })),
];

function schemeOf({ run, remedy, piece }: Row, units: UnitSystem): string {
  if (piece !== null) return '';
  if (remedy.kind !== 'rework') return schemeWords(run, remedy, units);
  const changes = remedy.changes.map((change) => changeWords(change, units));
  const alone = changes.length === 0 ? '' : `; passes as drawn with ${changes.join(', or ')}`;
  return `${reworkWords(remedy, units)}${alone}`;
}

/** What is said once a run, of a remedy that passes. */
function ofWhole<T>({ remedy, piece }: Row, value: (remedy: Remedy) => T): T | null {
  return piece !== null || remedy.kind === 'rework' ? null : value(remedy);
}

/** Names of the fasteners that are newly slotted and newly fixed. */
function changed(
  { run: { run } }: Row,
  remedy: Remedy,
): { readonly slotted: string; readonly fixed: string } {
  const { slotted, fixed } = changedFasteners(run, remedy);
  const names = (numbers: readonly number[]) =>
    connectionNames(numbers.map((number) => ({ run: run.id, number })));
  return { slotted: names(slotted), fixed: names(fixed) };
}

function sum({ pieces }: Row, of: (run: RemediedPiece['run']) => number): number | null {
  return pieces.length === 0 ? null : pieces.reduce((total, { run }) => total + of(run), 0);
}

/** Of a whole run the new joints' or the widened one's, of a piece the one at its right end. */
function gapOf({ remedy, piece }: Row): number | null {
  if (remedy.kind === 'rework') return null;
  return piece === null ? (remedy.gap ?? remedy.endGap ?? null) : piece.run.gap;
}

/** The longest slot. */
function slotOf({ pieces }: Row): Fastener | null {
  const slotted = pieces.flatMap(({ run }) =>
    run.fasteners.filter((_, i) => run.roles[i] === 'slotted'),
  );
  if (slotted.length === 0) return null;
  return slotted.reduce((most, one) => (one.freePlay > most.freePlay ? one : most));
}

function slotLengthOf(row: Row): number | null {
  const slot = slotOf(row);
  return slot && slotLength(slot);
}

function spacingOf({ pieces }: Row): number | null {
  return pieces.length === 0
    ? null
    : Math.max(...pieces.map(({ run }) => widestSpan(run.positions)));
}

function connectionsOf({ pieces }: Row): Connection[] {
  return pieces.flatMap(({ connections }) => connections);
}

function governingOf(row: Row): Connection | null {
  const uses = connectionsOf(row);
  if (uses.length === 0) return null;
  const use = ({ governing }: Connection) => governing?.utilisation ?? 0;
  return uses.reduce((most, one) => (use(one) > use(most) ? one : most));
}

function governingName(row: Row): string {
  const governing = governingOf(row);
  return governing === null ? '' : connectionName(governing);
}

/** The largest utilisation of one check, or of any. */
function useOf(connections: readonly Connection[], name?: CheckName): number | null {
  const uses = connections.flatMap(({ checks }) =>
    checks.flatMap(({ check, status, utilisation }) =>
      (name === undefined || check === name) && (status === 'pass' || status === 'fail')
        ? [utilisation ?? 0]
        : [],
    ),
  );
  return uses.length === 0 ? null : Math.max(...uses);
}
