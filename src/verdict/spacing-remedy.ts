import { rolesOf } from '../input/run-fasteners.ts';
import type { Role, Run } from '../model.ts';
import { type Candidate, candidateOf, type Search, tryRun } from './candidate.ts';
import { withSpacing } from './changed-run.ts';
import { fewestSlots, trySlots } from './slot-remedy.ts';

/** The fewest added fasteners with which a run passes as it is arranged; `null` where none do. */
export function closerSpacing(run: Run, search: Search): Candidate | null {
  for (const closer of closerRuns(run, search)) {
    const assessment = tryRun(closer, search);
    if (assessment !== null) return candidateOf(assessment, 0);
  }
  return null;
}

/**
 * The fewest added fasteners with which a run passes where all but the one nearest mid-run are slotted, and then as few
 * slots as that spacing needs; `null` where none do.
 */
export function closerAndSlotted(run: Run, search: Search): Candidate | null {
  if (!run.fixedType.maySlot) return null;
  for (const closer of closerRuns(run, search)) {
    const middle = trySlots(closer, rolesOf('middle', closer.positions), search);
    if (middle !== null) return fewestSlots(closer, search) ?? middle;
  }
  return null;
}

/** The run at ever closer spacings, one more span each time, all fixed where it was, else fixed at the middle. */
function* closerRuns(run: Run, { job }: Search): Generator<Run> {
  const { positions } = run;
  const length = positions[positions.length - 1] - positions[0];
  const tight = !run.roles.includes('slotted');
  const rolesAt = (at: Float64Array): Role[] =>
    tight ? Array.from(at, () => 'fixed' as const) : rolesOf('middle', at);
  for (let spans = positions.length; spans < MOST_FASTENERS; spans++) {
    const spacing = length / spans;
    if (spacing < job.remedies.closestSpacing * (1 - 1e-9)) return;
    yield withSpacing(run, spacing, rolesAt);
  }
}

/** As many fasteners as a run may have. */
const MOST_FASTENERS = 500;
