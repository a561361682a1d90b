import type { Role, Run } from '../model.ts';
import type { RunAssessment } from './assess.ts';
import {
  type Candidate,
  CLEARLY_OVER,
  candidateOf,
  lookAt,
  type Search,
  screenInFull,
} from './candidate.ts';
import { withRoles } from './changed-run.ts';
import { EVERY_BLOCK, roleSets } from './role-sets.ts';
import { drawnTravel, longestTravel, slotType } from './slot-type.ts';

/** Numbers of slots that a long run is looked at roughly with, before any is screened. */
const LEVELS = 30;

/**
 * The fewest slots with which a run passes every check that was given; of as few, those that need the shortest free
 * play, and of these the lowest utilisation. At least one fastener stays fixed. `null` where no number of slots passes.
 *
 * A long run is looked at roughly with some thirty numbers of slots first, and searched only from the fewest that come
 * near.
 */
export function fewestSlots(run: Run, search: Search): Candidate | null {
  const count = run.roles.length;
  const symmetric = isSymmetric(run);
  const least = count > EVERY_BLOCK ? leastWorthTrying(run, search) : 0;
  for (let slots = least; slots < count; slots++) {
    const found: Slotting[] = [];
    for (const roles of roleSets(count, slots, symmetric)) {
      const slotting = mayBe(run, roles) ? trySlotting(run, roles, search) : null;
      if (slotting !== null) found.push(slotting);
    }
    const candidate = firstDrawn(run, found.sort(byTravel), search);
    if (candidate !== null) return candidate;
  }
  return null;
}

/** The largest number of slots below the first one that does not clearly fail; all of them where each does. */
function leastWorthTrying(run: Run, search: Search): number {
  const count = run.roles.length;
  for (let level = 0; level < LEVELS; level++) {
    const slots = Math.round((level * count) / LEVELS);
    for (const roles of roleSets(count, slots, false)) {
      const near = mayBe(run, roles) && roughSlotting(run, roles, search) !== null;
      if (near) return Math.max(0, Math.round(((level - 1) * count) / LEVELS));
    }
  }
  return count;
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
  const { remedies } = search.job;
  const ample = roughSlotting(run, roles, search);
  const whole = ample && screenInFull(ample, search);
  if (whole === null) return null;
  const needed = travelOf(whole);
  const travel = roles.includes('slotted') ? drawnTravel(needed, remedies) : 0;
  if (travel === null) return null;
  // a slot that is longer than the bolt goes changes nothing but its own check
  const checks = whole.connections.flatMap((connection) => connection.checks);
  const others = checks
    .filter(({ check, status }) => check !== 'slot travel' && status === 'pass')
    .reduce((most, { utilisation }) => Math.max(most, utilisation!), 0);
  return { roles, travel, utilisation: travel === 0 ? others : Math.max(others, needed / travel) };
}

/** The run with these roles and slots that no bolt reaches the end of; `null` where it clearly fails. */
function roughSlotting(run: Run, roles: readonly Role[], search: Search): Run | null {
  const longest = longestTravel(search.job.remedies);
  const ample = slottedRun(run, roles, 2 * longest, search);
  const rough = lookAt(ample, search);
  return rough === null || travelOf(rough) > CLEARLY_OVER * longest ? null : ample;
}

/** The free play each way that the slots of a run need [mm]. */
function travelOf({ connections }: RunAssessment): number {
  const checks = connections.flatMap((connection) => connection.checks);
  return checks
    .filter(({ check }) => check === 'slot travel')
    .reduce((most, { demand }) => Math.max(most, demand!), 0);
}

/** The first of the slottings that passes in the slots that it would be drawn with. */
function firstDrawn(run: Run, found: readonly Slotting[], search: Search): Candidate | null {
  for (const { roles, travel } of found) {
    const drawn = screenInFull(slottedRun(run, roles, travel, search), search);
    if (drawn !== null) return candidateOf(drawn, travel);
  }
  return null;
}

function slottedRun(run: Run, roles: readonly Role[], travel: number, { job }: Search): Run {
  const slotted = roles.includes('slotted') ? slotType(run, travel, job.remedies) : run.slottedType;
  return withRoles(run, roles, slotted);
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
