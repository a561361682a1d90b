import type { Role } from '../model.ts';
import type { KindValues } from './values.ts';

/**
 * The role of each fastener of a run.
 *
 * @param fixed which are fixed: a word, or their numbers from the left, from 1
 * @param positions of the fasteners [mm], rising
 */
export function rolesOf(fixed: KindValues['fixed'], positions: Float64Array): Role[] {
  const numbers = fixedNumbers(fixed, positions);
  return Array.from(positions, (_, i) => (numbers.includes(i + 1) ? 'fixed' : 'slotted'));
}

function fixedNumbers(fixed: KindValues['fixed'], positions: Float64Array): readonly number[] {
  if (fixed === 'all') return Array.from(positions, (_, i) => i + 1);
  if (fixed === 'none') return [];
  if (fixed === 'first') return [1];
  return fixed === 'middle' ? [nearestMiddle(positions)] : fixed;
}

/** Number of the fastener nearest the middle between the first and the last; the left one of two. */
function nearestMiddle(positions: Float64Array): number {
  const last = positions[positions.length - 1];
  const middle = (positions[0] + last) / 2;
  let nearest = 0;
  for (let i = 1; i < positions.length; i++) {
    const closer = Math.abs(positions[nearest] - middle) - Math.abs(positions[i] - middle);
    // Two that a rounding error sets apart are as near as each other.
    if (closer > 1e-9 * last) nearest = i;
  }
  return nearest + 1;
}
