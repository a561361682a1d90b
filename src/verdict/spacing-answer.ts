import type { Run } from '../model.ts';
import type { Arrangement } from './arrangement.ts';
import { type FastenerHelp, fastenerHelp } from './fastener-help.ts';
import type { SpacingRow } from './spacing-row.ts';

/** What the rows of one run say. */
export interface SpacingAnswer {
  /** The widest spacing tried that passes. */
  readonly widest: SpacingRow | null;
  /** Closer spacings that fail all the same. */
  readonly failingBelow: readonly SpacingRow[];
  /** The next wider spacing tried; its governing check stops it. */
  readonly stop: SpacingRow | null;
  /** Where none passes: the one whose governing check is used least. */
  readonly nearest: SpacingRow | null;
  /** Where none passes: of the rows that another check governs, the one used least, for each such check. */
  readonly others: readonly SpacingRow[];
  /** What more fasteners do to each check that decides, the first one first; without those that cannot be told. */
  readonly helps: readonly FastenerHelp[];
}

/**
 * The widest spacing that passes, the check that stops it beyond, and what more fasteners do to that check.
 *
 * @param screened rows of one run, from the closest spacing to the widest; at least one
 * @param run the run that they are of
 * @param arrangement which of its fasteners are fixed in them
 */
export function spacingAnswer(
  screened: readonly SpacingRow[],
  run: Run,
  arrangement: Arrangement,
): SpacingAnswer {
  const rows = unlikeRows(screened);
  const last = rows.findLastIndex(({ passes }) => passes === true);
  const widest = rows[last] ?? null;
  const stop = widest === null ? null : (rows[last + 1] ?? null);
  const [nearest, ...others] = widest === null ? leastUsed(rows) : [];
  const deciding = nearest === undefined ? [stop ?? rows[rows.length - 1]] : [nearest, ...others];
  return {
    widest,
    failingBelow: rows.slice(0, Math.max(0, last)).filter(({ passes }) => passes === false),
    stop,
    nearest: nearest ?? null,
    others,
    helps: deciding.flatMap(({ governing }) =>
      governing === null ? [] : (fastenerHelp(rows, governing.check.check, run, arrangement) ?? []),
    ),
  };
}

/** One row a number of fasteners, of those that come to the same the one with the closest spacing asked for. */
export function unlikeRows(rows: readonly SpacingRow[]): SpacingRow[] {
  return rows.filter(({ count }, i) => i === 0 || count !== rows[i - 1].count);
}

/** For each check that governs anywhere, the row where it governs and is used least; the least of all first. */
function leastUsed(rows: readonly SpacingRow[]): SpacingRow[] {
  const use = ({ governing }: SpacingRow) => governing?.check.utilisation ?? 0;
  const rising = rows.filter(({ governing }) => governing !== null).sort((a, b) => use(a) - use(b));
  const name = ({ governing }: SpacingRow) => governing?.check.check;
  return rising.filter((row, i) => rising.findIndex((one) => name(one) === name(row)) === i);
}
