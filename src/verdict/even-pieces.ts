import { rolesOf } from '../input/run-fasteners.ts';
import type { Run } from '../model.ts';
import type { Arrangement } from './arrangement.ts';
import { cutRun, withRoles, withSpacing } from './changed-run.ts';

/** Into how many pieces a run is cut: so many, or as few as are needed for none to be longer than `longest` [mm]. */
export type Cut = { readonly pieces: number } | { readonly longest: number };

/** A run at one spacing, whole or cut into pieces by joints. */
export interface EvenPieces {
  /** The pieces from the left; the whole run alone where it is not cut. */
  readonly runs: readonly Run[];
  /** From fastener to fastener [mm]. */
  readonly spacing: number;
  /** Fasteners of all pieces. */
  readonly count: number;
  /** Length of the longest piece, from joint to joint [mm]. */
  readonly longest: number;
}

/** A piece on one fastener could turn about it. */
const LEAST_FASTENERS = 2;

/** A piece that is longer than asked by no more than this share is as long as asked. */
const ROUNDING = 1e-9;

/**
 * Sets a run's fasteners evenly over its fastened length and cuts it at mid-spans into pieces with as equal numbers of
 * fasteners as there can be, the arrangement anew in each. A piece overhangs a cut by half a span and stands alone: in
 * no line, with no gap.
 *
 * @param run at least two fasteners
 * @param spacing widest spacing [mm]
 * @param arrangement which fasteners of each piece are fixed; not all only where the run has a slotted type
 * @param cut into how many pieces
 * @returns `null` where a piece would have fewer than two fasteners
 */
export function evenPieces(
  run: Run,
  spacing: number,
  arrangement: Arrangement,
  cut: Cut,
): EvenPieces | null {
  const whole = withSpacing(run, spacing, (positions) => rolesOf('all', positions));
  const count = whole.positions.length;
  const most = Math.floor(count / LEAST_FASTENERS);
  const longestAllowed = 'longest' in cut ? cut.longest * (1 + ROUNDING) : Infinity;
  const least = 'pieces' in cut ? cut.pieces : Math.ceil(lengthOf(whole) / longestAllowed);
  for (let pieces = least; pieces === 1 || pieces <= most; pieces++) {
    const runs = piecesOf(whole, pieces);
    const longest = Math.max(...runs.map(lengthOf));
    if (longest > longestAllowed) continue;
    return {
      runs: runs.map((one) => withRoles(one, rolesOf(arrangement, one.positions), run.slottedType)),
      spacing: whole.positions[1] - whole.positions[0],
      count,
      longest,
    };
  }
  return null;
}

function piecesOf(whole: Run, pieces: number): Run[] {
  if (pieces === 1) return [whole];
  const { length } = whole.positions;
  const firsts = Array.from({ length: pieces - 1 }, (_, i) =>
    Math.round(((i + 1) * length) / pieces),
  );
  return cutRun(whole, firsts, 0).map((piece) => ({ ...piece, line: null, gap: null }));
}

function lengthOf({ positions, overhangs }: Run): number {
  return overhangs.left + positions[positions.length - 1] - positions[0] + overhangs.right;
}
