import type { Role } from '../model.ts';

/** Runs of up to this many fasteners are searched over all sets; longer ones over one fixed block. */
const ALL_SETS = 12;

/**
 * Every arrangement of a run with a given number of slots that the search tries: for up to twelve fasteners all sets
 * that keep at least one fixed, beyond that one contiguous block of fixed fasteners with all others slotted.
 *
 * @param count fasteners
 * @param slots how many are slotted, 0 … count − 1
 */
export function* roleSets(count: number, slots: number): Generator<Role[]> {
  if (count > ALL_SETS) yield* blocks(count, slots);
  else for (const fixed of subsets(count, count - slots)) yield rolesOf(count, fixed);
}

function* blocks(count: number, slots: number): Generator<Role[]> {
  const length = count - slots;
  for (let first = 0; first <= slots; first++) {
    yield Array.from({ length: count }, (_, i) =>
      i >= first && i < first + length ? 'fixed' : 'slotted',
    );
  }
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

function rolesOf(count: number, fixed: readonly number[]): Role[] {
  const roles = new Array<Role>(count).fill('slotted');
  for (const i of fixed) roles[i] = 'fixed';
  return roles;
}
