import { rolesOf } from '../input/run-fasteners.ts';
import type { Run } from '../model.ts';
import { type Candidate, candidateOf, type Search, tryRun } from './candidate.ts';
import { withSpacing } from './changed-run.ts';
import { fewestSlots, trySlots } from './slot-remedy.ts';

/** The fewest added fasteners with which a run passes as it is arranged; `null` where none do. */
export function closerSpacing(run: Run, search: Search): Candidate | null {
  return fewestAdded(run, search, (closer) => {
    const assessment = tryRun(closer, search);
    return assessment && candidateOf(assessment, 0);
  });
}

/**
 * The fewest added fasteners with which a run passes where all but the one nearest mid-run are slotted, and then as few
 * slots as that spacing needs; `null` where none do.
 */
export function closerAndSlotted(run: Run, search: Search): Candidate | null {
  if (!run.fixedType.maySlot) return null;
  const middle = fewestAdded(run, search, (closer) =>
    trySlots(closer, rolesOf('middle', closer.positions), search),
  );
  if (middle === null) return null;
  const { positions } = middle.assessment.run;
  const tight = withSpacing(run, positions[1] - positions[0], (at) => rolesOf('all', at));
  return fewestSlots(tight, search) ?? middle;
}

/** How much closer each try is than the one before. */
const CLOSER = 1.1;
/** As many fasteners as a run may have. */
const MOST_FASTENERS = 500;

/**
 * The first of ever closer spacings that passes, and then the widest that does between it and the last that failed: a
 * closer spacing raises the flexural resistance faster than anything else it does.
 */
function fewestAdded(
  run: Run,
  { job }: Search,
  attempt: (closer: Run) => Candidate | null,
): Candidate | null {
  const { positions } = run;
  const length = positions[positions.length - 1] - positions[0];
  const most = Math.min(
    MOST_FASTENERS - 1,
    Math.floor((length / job.remedies.closestSpacing) * (1 + 1e-9)),
  );
  const withSpans = (spans: number) =>
    attempt(withSpacing(run, length / spans, (at) => rolesOf(arrangement, at)));
  const arrangement = run.roles.includes('slotted') ? 'middle' : 'all';
  let failing = positions.length - 1;
  while (failing < most) {
    let passing = Math.min(most, Math.ceil(failing * CLOSER));
    let found = withSpans(passing);
    if (found === null) {
      failing = passing;
      continue;
    }
    while (passing - failing > 1) {
      const between = (failing + passing) >> 1;
      const candidate = withSpans(between);
      if (candidate === null) failing = between;
      else [passing, found] = [between, candidate];
    }
    return found;
  }
  return null;
}
