import { type RecordAxis, VALID, type Zone } from '../model.ts';
import { isRowMissingBefore } from './gaps.ts';

/**
 * Which samples lie in a gap or next to one, in any of the zones: there the true top or bottom of a swing may have
 * been missed.
 *
 * @returns 1 at such samples and 0 at all others; `null` where there is none
 */
export function gapEdges(axis: RecordAxis, zones: readonly Zone[]): Uint8Array | null {
  const count = axis.times.length;
  const edges = new Uint8Array(count);
  let some = false;
  for (let i = 0; i < count; i++) {
    const missing = zones.some(({ standing }) => standing[i] !== VALID);
    const before = i > 0 && isRowMissingBefore(axis, i);
    if (missing || before) edges[Math.max(0, i - 1)] = 1;
    if (missing) edges[Math.min(count - 1, i + 1)] = 1;
    if (missing || before) edges[i] = 1;
    some ||= missing || before;
  }
  return some ? edges : null;
}
