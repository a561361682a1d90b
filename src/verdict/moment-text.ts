import { momentOf, type StrainPath } from '../mechanics/strain-path.ts';
import type { RunExtreme } from './run-chain.ts';

/**
 * When a mark on the path was, as the user would write it: `2031-07-03T14:00` on the record's own clock, or
 * `extreme hot`.
 *
 * @param times time of each sample [ms since 1970]
 */
export function momentText(
  path: StrainPath,
  mark: number,
  times: Float64Array,
  extremes: readonly RunExtreme[],
): string {
  const moment = momentOf(path, mark);
  if ('extreme' in moment) return `extreme ${extremes[moment.extreme].name}`;
  return new Date(times[moment.sample]).toISOString().slice(0, 16);
}
