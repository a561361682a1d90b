import type { Role, Run } from '../model.ts';
import type { RunAssessment } from './assess.ts';
import { type Candidate, candidateOf, type Search, tryRun } from './candidate.ts';
import { withRoles } from './changed-run.ts';
import { roleSets } from './role-sets.ts';
import { drawnTravel, longestTravel, slotType } from './slot-type.ts';

/**
 * The fewest slots with which a run passes every check that was given; of as few, those that need the shortest free
 * play, and of these the lowest utilisation. At least one fastener stays fixed. `null` where no number of slots passes.
 */
export function fewestSlots(run: Run, search: Search): Candidate | null {
  const symmetric = isSymmetric(run);
  for (let slots = 0; slots < run.roles.length; slots++) {
    const found: Slotting[] = [];
    for (const roles of roleSets(run.roles.length, slots, symmetric)) {
      const slotting = mayBe(run, roles) ? trySlotting(run, roles, search) : null;
      if (slotting !== null) found.push(slotting);
    }
    const candidate = firstDrawn(run, found.sort(byTravel), search);
    if (candidate !== null) return candidate;
  }
  return null;
}

/** The run with these roles and the shortest slots that do; `null` where it fails. */
export function trySlots(run: Run, roles: readonly Role[], search: Search): Candidate | null {
  const slotting = trySlotting(run, roles, search);
  return slotting && firstDrawn(run, [slotting], search);
}

/** Roles with which a run passes in the longest slots, and what it needs of them. */
interface Slotting {
  readonly roles: readonly Role[];
  /** Free play each way that the slots would be drawn with [mm]. */
  readonly travel: number;
  /** Largest utilisation in such slots. */
  readonly utilisation: number;
}

function trySlotting(run: Run, roles: readonly Role[], search: Search): Slotting | null {
  const ample = tryRun(slottedRun(run, roles, longestTravel(search.job.remedies), search), search);
  if (ample === null) return null;
  const needed = largest(ample, (check) => check === 'slot travel', 'demand');
  const travel = roles.includes('slotted') ? drawnTravel(needed, search.job.remedies) : 0;
  if (travel === null) return null;
  // a slot that is longer than the bolt goes changes nothing but its own check
  const others = largest(ample, (check) => check !== 'slot travel', 'utilisation');
  return { roles, travel, utilisation: Math.max(others, needed === 0 ? 0 : needed / travel) };
}

/** The first of the slottings that passes in the slots that it would be drawn with. */
function firstDrawn(run: Run, found: readonly Slotting[], search: Search): Candidate | null {
  for (const { roles, travel } of found) {
    const drawn = tryRun(slottedRun(run, roles, travel, search), search);
    if (drawn !== null) return candidateOf(drawn, travel);
  }
  return null;
}

function slottedRun(run: Run, roles: readonly Role[], travel: number, { job }: Search): Run {
  const slotted = roles.includes('slotted') ? slotType(run, travel, job.remedies) : run.slottedType;
  return withRoles(run, roles, slotted);
}

function largest(
  { connections }: RunAssessment,
  which: (check: string) => boolean,
  value: 'demand' | 'utilisation',
): number {
  const checks = connections.flatMap((connection) => connection.checks);
  return checks
    .filter(({ check, status }) => which(check) && status === 'pass')
    .reduce((most, check) => Math.max(most, check[value] ?? 0), 0);
}

/** Shorter slots first, then lower utilisation; of equal ones the earlier stays first. */
function byTravel(one: Slotting, other: Slotting): number {
  if (one.travel !== other.travel) return one.travel - other.travel;
  const difference = one.utilisation - other.utilisation;
  return Math.abs(difference) <= 1e-9 * one.utilisation ? 0 : difference;
}

/** A fastener that may not be slotted stays as it is. */
function mayBe(run: Run, roles: readonly Role[]): boolean {
  return (
    run.fixedType.maySlot || roles.every((role, i) => role === 'fixed' || run.roles[i] === role)
  );
}

/** Whether the run looks the same from its other end, so that mirrored arrangements behave alike. */
function isSymmetric({ positions, overhangs, fixedType, roles }: Run): boolean {
  const last = positions.length - 1;
  const length = positions[last] - positions[0];
  const even = positions.every((x, i) => {
    const mirrored = positions[0] + positions[last] - positions[last - i];
    return Math.abs(x - mirrored) <= 1e-9 * length;
  });
  // where only some may be slotted, which these are must be the same from both ends too
  const free = fixedType.maySlot || roles.every((role, i) => role === roles[last - i]);
  return even && free && overhangs.left === overhangs.right;
}
