import { rolesOf } from '../input/run-fasteners.ts';
import type { Run } from '../model.ts';

/** Which fasteners of a run are fixed, in words that hold at any spacing. */
export const ARRANGEMENTS = ['all', 'first', 'middle', 'none'] as const;
export type Arrangement = (typeof ARRANGEMENTS)[number];

/**
 * The arrangement that a run's roles follow, or `null` where only a list of numbers describes them. Of two that give
 * the same roles, as `first` and `middle` do on two fasteners, the one that holds the longer length on one side.
 */
export function arrangementOf({ positions, roles }: Run): Arrangement | null {
  const follows = (arrangement: Arrangement) =>
    rolesOf(arrangement, positions).every((role, i) => role === roles[i]);
  return ARRANGEMENTS.find(follows) ?? null;
}
