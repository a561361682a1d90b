import type { Residue, Spectrum } from '../model.ts';
import { closeCycles } from './close-cycles.ts';
import { FloatList } from './float-list.ts';
import { halfRanges, repeatedRanges } from './residue.ts';
import {
  createTurningState,
  findTurningPoints,
  type Slice,
  startTurning,
} from './turning-points.ts';

/** Ranges under this share of the series' largest are rounding, not cycles. */
const NEGLIGIBLE = 1e-6;

/** Values taken through each pass at a time: small enough for the processor's first cache. */
const BLOCK = 4096;

/** Passed on within one block and no further, so all counters share them. */
const mapped = new Float64Array(BLOCK);
const points = new Float64Array(BLOCK);

/** A series' cycles and its own bounds. */
export interface CountedSeries extends Spectrum {
  /** Largest value, before the compression share; 0 of an empty series. */
  readonly max: number;
  /** Smallest value, before the compression share; 0 of an empty series. */
  readonly min: number;
  /** max − min of what was counted, that is after the compression share. */
  readonly largestRange: number;
}

/** Counts one series that arrives in blocks. Memory grows with its cycles, not with its samples. */
export interface RainflowCounter {
  /** Takes the next `count` values, found in `values` from `offset`, `stride` apart. */
  push(values: Float64Array, offset: number, stride: number, count: number): void;
  /**
   * The cycles of all values since the last reset, in the series' unit. May be called again, or with
   * another residue; the counter is not changed.
   *
   * @param residue `repeat`: the record repeats, whole cycles only; `half`: leftovers are half cycles
   * @param floor ranges under this are not counted, such as a still fastener's rounding [series' unit]
   */
  finish(residue: Residue, floor?: number): CountedSeries;
  /** Forgets the series and keeps the memory for the next. */
  reset(): void;
}

/**
 * A rainflow counter as in ASTM E1049-85 (2017), 5.4.4, and 5.4.5 for a record that repeats.
 *
 * Each range has the standard's count. Where neighbouring ranges are equal, the standard may take two
 * half cycles for what is here one whole cycle of the same range.
 *
 * @param options.compressionShare share c of compression that counts, 0 … 1 (default 1): a value
 *   v < 0 is counted as c·v. Since that keeps the order of values, it is the same as the range
 *   max(σ_max, 0) − max(σ_min, 0) + c·(min(σ_max, 0) − min(σ_min, 0)) of each cycle.
 */
export function createRainflow(options: { compressionShare?: number } = {}): RainflowCounter {
  const share = options.compressionShare ?? 1;
  const state = createTurningState();
  const bounds = new Float64Array(2);
  const stack = new FloatList();
  const ranges = new FloatList();
  let empty = true;

  function start(first: number): void {
    const counted = first < 0 ? share * first : first;
    bounds.fill(first);
    startTurning(state, counted);
    stack.data[0] = counted;
    stack.length = 1;
    empty = false;
  }

  function pushBlock(block: Slice): void {
    const slice = share === 1 ? block : mapCompression(block, share, bounds);
    const found = findTurningPoints(slice, state, points);
    closeCycles(points, found, stack, ranges);
  }

  return {
    push(values, offset, stride, count) {
      if (count === 0) return;
      if (empty) start(values[offset]);
      for (let done = 0; done < count; done += BLOCK) {
        const block = Math.min(BLOCK, count - done);
        pushBlock({ values, offset: offset + done * stride, stride, count: block });
      }
    },

    finish(residue, floor = 0) {
      const open = new FloatList();
      const late = new FloatList();
      if (!empty) closePending(stack, state.last, open, late);
      const left = open.data.subarray(0, open.length);
      const [least, most] = boundsOf(left);
      const [min, max] = share === 1 ? [least, most] : bounds;
      const smallest = Math.max(NEGLIGIBLE * (most - least), floor);
      const whole: Float64Array[] = [ranges, late].map((list) =>
        list.data.subarray(0, list.length),
      );
      if (residue === 'repeat') whole.push(repeatedRanges(left));
      const half = residue === 'half' ? [halfRanges(left)] : [];
      return {
        ranges: rangesFrom(smallest, whole),
        halfRanges: rangesFrom(smallest, half),
        max,
        min,
        largestRange: most - least,
      };
    },

    reset() {
      stack.length = 0;
      ranges.length = 0;
      bounds.fill(0);
      empty = true;
    },
  };
}

/** The block with its compression scaled, in `mapped`; widens `bounds` by what was there before. */
function mapCompression(slice: Slice, share: number, bounds: Float64Array): Slice {
  const { values, stride, count } = slice;
  let min = bounds[0];
  let max = bounds[1];
  for (let i = 0, at = slice.offset; i < count; i++, at += stride) {
    const value = values[at];
    min = Math.min(min, value);
    max = Math.max(max, value);
    mapped[i] = value < 0 ? share * value : value;
  }
  bounds[0] = min;
  bounds[1] = max;
  return { values: mapped, offset: 0, stride: 1, count };
}

/** Copies the stack to `open` and ends the series there: its last value may close further cycles. */
function closePending(
  stack: FloatList,
  last: Float64Array,
  open: FloatList,
  ranges: FloatList,
): void {
  open.reserve(stack.length + 1);
  open.data.set(stack.data.subarray(0, stack.length));
  open.length = stack.length;
  // The series has left its last turning point, so the two are equal only if it never moved.
  if (last[0] !== stack.data[stack.length - 1]) closeCycles(last, 1, open, ranges);
}

/** Smallest and largest of what is left open, which always holds the whole series' own; 0 if empty. */
function boundsOf(open: Float64Array): [number, number] {
  if (open.length === 0) return [0, 0];
  let least = open[0];
  let most = open[0];
  for (const value of open) {
    least = Math.min(least, value);
    most = Math.max(most, value);
  }
  return [least, most];
}

/** All ranges of the lists that are at least `smallest`, in one array of their own. */
function rangesFrom(smallest: number, lists: readonly Float64Array[]): Float64Array {
  const room = lists.reduce((sum, list) => sum + list.length, 0);
  const kept = new Float64Array(room);
  let count = 0;
  for (const list of lists) {
    for (let i = 0; i < list.length; i++) {
      if (list[i] >= smallest) kept[count++] = list[i];
    }
  }
  return count === room ? kept : kept.slice(0, count);
}
