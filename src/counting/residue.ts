import { closeCycles } from './close-cycles.ts';
import { FloatList } from './float-list.ts';
import { createTurningState, findTurningPoints, startTurning } from './turning-points.ts';

/**
 * Ranges of the half cycles that an open history leaves: one between each two neighbours.
 *
 * @param residue the turning points that closed no cycle, in order, with the series' last value
 * @returns half-cycle ranges in the residue's unit (ASTM E1049-85, 5.4.4, step 6)
 */
export function halfRanges(residue: Float64Array): Float64Array {
  const ranges = new Float64Array(Math.max(residue.length - 1, 0));
  for (let i = 0; i < ranges.length; i++) ranges[i] = Math.abs(residue[i + 1] - residue[i]);
  return ranges;
}

/**
 * Ranges of the whole cycles that a residue holds if the history repeats without end.
 *
 * The loop starts at its largest value and is closed there, so that no half cycle is left
 * (ASTM E1049-85, 5.4.5). Cycles that the history closed by itself do not depend on where it
 * starts, so the residue is all that need be turned round.
 *
 * @param residue the turning points that closed no cycle, in order, with the series' last value
 * @returns whole-cycle ranges in the residue's unit
 */
export function repeatedRanges(residue: Float64Array): Float64Array {
  if (residue.length < 2) return new Float64Array(0);
  const loop = closedLoop(residue);
  const points = new Float64Array(loop.length);
  const state = createTurningState();
  startTurning(state, loop[0]);
  const slice = { values: loop, offset: 0, stride: 1, count: loop.length };
  const found = findTurningPoints(slice, state, points);
  const stack = new FloatList();
  const ranges = new FloatList();
  closeCycles(loop, 1, stack, ranges);
  closeCycles(points, found, stack, ranges);
  closeCycles(loop, 1, stack, ranges);
  // What stays open runs from the largest value to the smallest and back: the one great cycle.
  ranges.reserve(1);
  ranges.data[ranges.length++] = stack.data[0] - stack.data[1];
  return ranges.data.slice(0, ranges.length);
}

/** The residue turned round to start and end at its largest value. */
function closedLoop(residue: Float64Array): Float64Array {
  const size = residue.length;
  let top = 0;
  for (let i = 1; i < size; i++) if (residue[i] > residue[top]) top = i;
  const loop = new Float64Array(size + 1);
  for (let i = 0; i <= size; i++) loop[i] = residue[(top + i) % size];
  return loop;
}
