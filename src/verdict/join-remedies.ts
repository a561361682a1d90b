import type { DamageTables } from '../damage/damage-table.ts';
import type { Connection, Job, Remedy, Rework, RunResult } from '../model.ts';
import { assessConnections } from './assess.ts';
import { utilisationOf } from './candidate.ts';
import { type JointedRun, withJointGaps } from './joint-gaps.ts';
import { drawnGap } from './joint-remedy.ts';
import { judge } from './judge.ts';

/**
 * The runs with their remedies as they would stand beside each other: a run in slots moves further at its ends than it
 * did tight, so every gap is checked again, and one at the end of a run is widened where it must be.
 *
 * @param runs the job's runs, each with its remedy found on its own
 */
export function joinRemedies(
  runs: readonly RunResult[],
  job: Job,
  tables: DamageTables,
): RunResult[] {
  const settled = runs.every(
    ({ remedy, connections }) => !isFound(remedy) && !connections.some(failsGap),
  );
  if (settled) return [...runs];
  const drawn = runs.map((run) => piecesOf(run, job, tables));
  const widened = drawn.map((pieces, r) => widenLast(pieces, drawn.slice(r + 1).flat(), job));
  const joined = withJointGaps(widened.flat());
  let before = 0;
  return runs.map((run, r) => {
    const pieces = joined.slice(before, before + drawn[r].length);
    before += drawn[r].length;
    const last = pieces[pieces.length - 1];
    return joinedRun(run, pieces, last.run.gap === run.run.gap ? null : last.run.gap);
  });
}

function isFound(remedy: Remedy | Rework | null): remedy is Remedy {
  return remedy !== null && remedy.kind !== 'rework';
}

/** A run as it would be drawn, its joints yet unchecked. */
function piecesOf(run: RunResult, job: Job, tables: DamageTables): JointedRun[] {
  const { remedy } = run;
  if (!isFound(remedy)) return [{ ...run, connections: run.connections.map(withoutGap) }];
  const uneven = { ...job, unevenFriction: true };
  return remedy.pieces.map((piece) => assessConnections(piece.run, uneven, tables));
}

function withoutGap(connection: Connection): Connection {
  const { checks } = connection;
  if (!checks.some(({ check }) => check === 'joint gap')) return connection;
  return { ...connection, ...judge(checks.filter(({ check }) => check !== 'joint gap')) };
}

/** The pieces, the last of them with a wider gap where its own fails and a wider one does not. */
function widenLast(
  pieces: readonly JointedRun[],
  after: readonly JointedRun[],
  { remedies }: Job,
): JointedRun[] {
  const last = pieces[pieces.length - 1];
  const own = last.run.gap;
  if (own === null || !gapFails(last, after)) return [...pieces];
  for (
    let gap = drawnGap(own + remedies.gapStep * 1e-3, remedies);
    gap <= remedies.widestGap;
    gap = drawnGap(gap + remedies.gapStep, remedies)
  ) {
    const wider = { ...last, run: { ...last.run, gap } };
    if (!gapFails(wider, after)) return pieces.with(-1, wider);
  }
  return [...pieces];
}

function gapFails(run: JointedRun, after: readonly JointedRun[]): boolean {
  const { checks } = withJointGaps([run, ...after])[0].connections.at(-1)!;
  return checks.some(({ check, status }) => check === 'joint gap' && status === 'fail');
}

function joinedRun(
  run: RunResult,
  pieces: readonly JointedRun[],
  widened: number | null,
): RunResult {
  const failing = pieces.flatMap(({ connections }) => connections).find(failsGap);
  const touched = isFound(run.remedy) || (run.remedy === null && (widened !== null || failing));
  if (!touched) return run;
  if (failing !== undefined) {
    const check = failing.checks.find((one) => one.check === 'joint gap')!;
    const at = `${failing.run}/${failing.number}`;
    // it may pass as the job stands, and not beside its changed neighbour
    const last = { ...run.connections.at(-1)!, verdict: 'fails' as const };
    return {
      ...run,
      connections: run.connections.with(-1, last),
      remedy: { kind: 'rework', check, at, changes: [] },
    };
  }
  const found = isFound(run.remedy) ? run.remedy : unchanged(run);
  return {
    ...run,
    remedy: {
      ...found,
      pieces: pieces.map(({ run, connections, governing }) => ({ run, connections, governing })),
      ...(widened === null ? {} : { endGap: widened }),
      utilisation: Math.max(...pieces.map(utilisationOf)),
    },
  };
}

function failsGap({ checks }: Connection): boolean {
  return checks.some(({ check, status }) => check === 'joint gap' && status === 'fail');
}

/** A run that passes by itself, and of which only the joint to its neighbour changes. */
function unchanged(run: RunResult): Remedy {
  return {
    kind: 'joints',
    pieces: [],
    joints: 0,
    slots: run.run.roles.filter((role) => role === 'slotted').length,
    added: 0,
    gap: null,
    utilisationBefore: utilisationOf(run),
    utilisation: 0,
  };
}
