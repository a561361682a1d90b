import type { Role, Run } from '../model.ts';
import { type Candidate, candidateOf, type Search, tryRun } from './candidate.ts';
import { withRoles } from './changed-run.ts';
import { roleSets } from './role-sets.ts';
import { drawnTravel, longestTravel, slotType } from './slot-type.ts';

/**
 * The fewest slots with which a run passes every check that was given; of as few, those that need the shortest free
 * play, and of these the lowest utilisation. At least one fastener stays fixed. `null` where no number of slots passes.
 *
 * @param least fewest slots to try
 */
export function fewestSlots(run: Run, search: Search, least = 0): Candidate | null {
  for (let slots = least; slots < run.roles.length; slots++) {
    let best: Candidate | null = null;
    for (const roles of roleSets(run.roles.length, slots)) {
      if (mayBe(run, roles)) best = better(best, trySlots(run, roles, search));
    }
    if (best !== null) return best;
  }
  return null;
}

/** The run with these roles and the shortest slots that do; `null` where it fails. */
export function trySlots(run: Run, roles: readonly Role[], search: Search): Candidate | null {
  if (!roles.includes('slotted')) {
    const tight = tryRun(withRoles(run, roles, run.slottedType), search);
    return tight && candidateOf(tight, 0);
  }
  const { remedies } = search.job;
  const withTravel = (travel: number) =>
    tryRun(withRoles(run, roles, slotType(run, travel, remedies)), search);
  const ample = withTravel(longestTravel(remedies));
  if (ample === null) return null;
  const checks = ample.connections.flatMap((connection) => connection.checks);
  const needed = checks
    .filter(({ check }) => check === 'slot travel')
    .reduce((most, { demand }) => Math.max(most, demand ?? 0), 0);
  const travel = drawnTravel(needed, remedies);
  const drawn = travel === null ? null : withTravel(travel);
  return drawn && candidateOf(drawn, travel ?? 0);
}

/** A fastener that may not be slotted stays as it is. */
function mayBe(run: Run, roles: readonly Role[]): boolean {
  return (
    run.fixedType.maySlot || roles.every((role, i) => role === 'fixed' || run.roles[i] === role)
  );
}

function better(one: Candidate | null, other: Candidate | null): Candidate | null {
  if (one === null || other === null) return one ?? other;
  if (one.travel !== other.travel) return one.travel < other.travel ? one : other;
  return other.utilisation < one.utilisation * (1 - 1e-9) ? other : one;
}
