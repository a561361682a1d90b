import type { Role } from '../model.ts';

/** Runs of up to this many fasteners are searched over all sets. */
export const ALL_SETS = 12;
/** Runs of up to this many are searched over every contiguous block of fixed fasteners. */
export const EVERY_BLOCK = 60;

/**
 * Every arrangement of a run with a given number of slots that the search tries: for up to twelve fasteners all sets
 * that keep at least one fixed, for up to sixty every contiguous block of fixed fasteners with all others slotted,
 * beyond that the block about the middle.
 *
 * @param count fasteners
 * @param slots how many are slotted, 0 … count − 1
 * @param symmetric whether of two arrangements that mirror each other one is enough
 */
export function* roleSets(count: number, slots: number, symmetric: boolean): Generator<Role[]> {
  if (count > EVERY_BLOCK) {
    yield block(count, slots, slots >> 1);
    return;
  }
  const sets = count > ALL_SETS ? blocks(count, slots) : anySets(count, slots);
  for (const roles of sets) if (!symmetric || isFirstOfMirrored(roles)) yield roles;
}

/** Whether the roles, read from the left, come no later than read from the right. */
function isFirstOfMirrored(roles: readonly Role[]): boolean {
  const differs = roles.findIndex((role, i) => role !== roles[roles.length - 1 - i]);
  return differs < 0 || roles[differs] === 'fixed';
}

function* anySets(count: number, slots: number): Generator<Role[]> {
  for (const fixed of subsets(count, count - slots)) {
    const roles = new Array<Role>(count).fill('slotted');
    for (const i of fixed) roles[i] = 'fixed';
    yield roles;
  }
}

function* blocks(count: number, slots: number): Generator<Role[]> {
  for (let first = 0; first <= slots; first++) yield block(count, slots, first);
}

/** One block of fixed fasteners from `first` on, all others slotted. */
function block(count: number, slots: number, first: number): Role[] {
  const end = first + count - slots;
  return Array.from({ length: count }, (_, i) => (i >= first && i < end ? 'fixed' : 'slotted'));
}

/** All ascending choices of `size` out of 0 … count − 1. */
function* subsets(count: number, size: number, from = 0): Generator<number[]> {
  if (size === 0) {
    yield [];
    return;
  }
  for (let i = from; i <= count - size; i++) {
    for (const rest of subsets(count, size - 1, i + 1)) yield [i, ...rest];
  }
}
