/** A column of a row-major block: `count` values from `offset`, `stride` apart. */
export interface Slice {
  readonly values: Float64Array;
  readonly offset: number;
  readonly stride: number;
  readonly count: number;
}

/** What the search carries from block to block. */
export interface TurningState {
  /** The last value seen. One element: a field that changes from integers to fractions is slow in V8. */
  readonly last: Float64Array;
  /** 1 while the series rises, 0 while it falls, `LEVEL` before its first step. */
  readonly course: Uint8Array;
}

/** The series has not left its first value yet. */
const LEVEL = 2;

/** A search that has seen nothing. */
export function createTurningState(): TurningState {
  return { last: new Float64Array(1), course: new Uint8Array(1) };
}

/** Starts the search anew at a series' first value. */
export function startTurning(state: TurningState, first: number): void {
  state.last[0] = first;
  state.course[0] = LEVEL;
}

/**
 * Writes the turning points that a block completes to `out`, and returns how many.
 *
 * A value is known to be a turning point once the series leaves it the other way, so the last value
 * is always pending. Equal neighbours and values on the way up or down drop out, as does the first
 * value of the series.
 *
 * @param slice the block's values
 * @param state carried from block to block, changed in place
 * @param out room for `slice.count` values; what lies beyond the returned count is scrap
 */
export function findTurningPoints(slice: Slice, state: TurningState, out: Float64Array): number {
  if (state.course[0] === LEVEL) state.course[0] = firstCourse(slice, state.last[0]);
  if (state.course[0] === LEVEL) return 0;
  const { values, stride, count } = slice;
  let last = state.last[0];
  let rising = state.course[0];
  let found = 0;
  // No branch: whether a noisy series turns is a coin's toss that the processor cannot foretell.
  for (let i = 0, at = slice.offset; i < count; i++, at += stride) {
    const value = values[at];
    const turns = Number(value !== last) & (Number(value > last) ^ rising);
    out[found] = last;
    found += turns;
    rising ^= turns;
    last = value;
  }
  state.last[0] = last;
  state.course[0] = rising;
  return found;
}

/** Which way the series leaves its first value, or `LEVEL` if it does not in this block. */
function firstCourse({ values, offset, stride, count }: Slice, first: number): number {
  for (let i = 0; i < count; i++) {
    const value = values[offset + i * stride];
    if (value !== first) return Number(value > first);
  }
  return LEVEL;
}
