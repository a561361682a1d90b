import type { DamageTables } from '../damage/damage-table.ts';
import { CHECKS, type Check, type CheckName, type Connection, type Job } from '../model.ts';
import { assessConnections, type RunAssessment } from './assess.ts';
import type { EvenPieces } from './even-pieces.ts';
import { firstLargest } from './first-largest.ts';

/** A check and the connection that it was made at. */
export interface CheckAt {
  readonly check: Check;
  readonly connection: Connection;
}

/** A run at one spacing, all its pieces screened. */
export interface SpacingRow {
  /** Spacing that was asked for [mm]. */
  readonly asked: number;
  /** From fastener to fastener, never wider [mm]. */
  readonly spacing: number;
  /** Fasteners of all pieces. */
  readonly count: number;
  readonly pieces: number;
  /** Length of the longest piece, from joint to joint [mm]. */
  readonly pieceLength: number;
  /** Of each check that passes or fails anywhere, the one with the largest utilisation, in the order of `CHECKS`. */
  readonly worst: readonly CheckAt[];
  /** The one of them with the largest utilisation; `null` where nothing was given to check against. */
  readonly governing: CheckAt | null;
  /** Checks that lack a limit or curve somewhere, and those that the rule on the shear range makes unnecessary. */
  readonly notGiven: readonly CheckName[];
  readonly exempt: readonly CheckName[];
  /** Whether every given check passes; `null` where none was given. */
  readonly passes: boolean | null;
  /** Largest shear range of a fastener in the counted pass [N]. */
  readonly shearRange: number;
  /** Largest magnitude of a span force from lock-in on and at the extremes [N]; zero without a span. */
  readonly memberForce: number;
  /** Shortest life of a connection [years]; `Infinity` is unlimited, `null` where no curve was given. */
  readonly life: number | null;
  readonly coveredHours: number;
  /** Years that one pass of the record stands for. */
  readonly years: number;
  /** True where slips had not settled after the last allowed pass. */
  readonly walks: boolean;
}

/**
 * Screens a run at one spacing, each piece alone.
 *
 * @param asked the spacing that was asked for [mm]
 * @param tables damage tables shared by all runs of the job
 */
export function spacingRow(
  asked: number,
  even: EvenPieces,
  job: Job,
  tables: DamageTables,
): SpacingRow {
  const assessed = unlike(even).map((run) => assessConnections(run, job, tables));
  const connections = assessed.flatMap((one) => one.connections);
  const worst = CHECKS.flatMap((name) => worstOf(connections, name) ?? []);
  const having = (status: Check['status']) =>
    CHECKS.filter((name) =>
      connections.some(({ checks }) =>
        checks.some((one) => one.check === name && one.status === status),
      ),
    );
  const lives = connections.map(({ life }) => life).filter((life) => life !== null);
  return {
    asked,
    spacing: even.spacing,
    count: even.count,
    pieces: even.runs.length,
    pieceLength: even.longest,
    worst,
    governing: mostUsed(worst),
    notGiven: having('not given'),
    exempt: having('exempt'),
    passes: worst.length === 0 ? null : worst.every(({ check }) => check.status === 'pass'),
    shearRange: Math.max(...connections.map(({ shearRange }) => shearRange)),
    memberForce: Math.max(...assessed.map(memberForce)),
    life: lives.length === 0 ? null : Math.min(...lives),
    coveredHours: assessed[0].coveredHours,
    years: assessed[0].years,
    walks: assessed.some(({ walks }) => walks),
  };
}

/** The first piece of each number of fasteners: at one spacing such pieces bear the same. */
function unlike({ runs }: EvenPieces) {
  return runs.filter(
    ({ positions }, i) =>
      i === runs.findIndex((other) => other.positions.length === positions.length),
  );
}

function worstOf(connections: readonly Connection[], name: CheckName): CheckAt | null {
  const judged = connections.flatMap((connection): CheckAt[] => {
    const check = connection.checks.find((one) => one.check === name);
    return check?.status === 'pass' || check?.status === 'fail' ? [{ check, connection }] : [];
  });
  return mostUsed(judged);
}

function mostUsed(checks: readonly CheckAt[]): CheckAt | null {
  if (checks.length === 0) return null;
  return checks[firstLargest(checks.map(({ check }) => check.utilisation ?? 0))];
}

function memberForce({ history: { allSpans } }: RunAssessment): number {
  const most = (values: Float64Array) => values.reduce((m, n) => Math.max(m, Math.abs(n)), 0);
  return Math.max(most(allSpans.max), most(allSpans.min));
}
