import type { Remedy, Rework, Run, RunResult } from '../model.ts';
import { type Candidate, type Search, utilisationOf } from './candidate.ts';
import { fewestJoints } from './joint-remedy.ts';
import { reworkOf } from './rework.ts';
import { fewestSlots } from './slot-remedy.ts';
import { closerAndSlotted, closerSpacing } from './spacing-remedy.ts';

/** A run of which a check fails. */
type FailingRun = Pick<RunResult, 'run' | 'connections' | 'governing'>;

/**
 * The smallest change with which a failing run passes every check that was given, each candidate screened in full:
 * fewest joints, then fewest slots, then fewest added fasteners. Closer spacing is tried where buckling fails.
 */
export function remedyOf(failing: FailingRun, search: Search): Remedy | Rework {
  const { run } = failing;
  const before = utilisationOf(failing);
  const whole = uncut(failing, search);
  if (whole !== null) return remedyFrom(run, before, [whole], null);
  const cut = fewestJoints(run, search);
  if (cut !== null) return remedyFrom(run, before, cut.pieces, cut.gap);
  return reworkOf(failing, search);
}

function uncut({ run, connections }: FailingRun, search: Search): Candidate | null {
  const buckles = connections.some(({ checks }) =>
    checks.some(({ check, status }) => check === 'buckling' && status === 'fail'),
  );
  return (
    (buckles ? closerSpacing(run, search) : null) ??
    fewestSlots(run, search) ??
    (buckles ? closerAndSlotted(run, search) : null)
  );
}

function remedyFrom(
  run: Run,
  utilisationBefore: number,
  candidates: readonly Candidate[],
  gap: number | null,
): Remedy {
  const count = candidates.reduce((sum, { assessment }) => sum + assessment.run.roles.length, 0);
  const added = count - run.roles.length;
  const slots = candidates.reduce((sum, candidate) => sum + candidate.slots, 0);
  return {
    kind: gap !== null ? 'joints' : added > 0 ? 'spacing' : 'slots',
    pieces: candidates.map(({ assessment }) => ({
      run: assessment.run,
      connections: assessment.connections,
      governing: assessment.governing,
    })),
    joints: candidates.length - 1,
    slots,
    added,
    gap,
    utilisationBefore,
    utilisation: Math.max(...candidates.map(({ utilisation }) => utilisation)),
  };
}
