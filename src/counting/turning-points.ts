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
  /** 1 or 0: whether the series was last rising, whether it was last falling; neither at its start. */
  readonly course: Uint8Array;
}

/** A search that has seen nothing but the series' first value. */
export function createTurningState(first: number): TurningState {
  return { last: Float64Array.of(first), course: new Uint8Array(2) };
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
  const { values, stride, count } = slice;
  let last = state.last[0];
  let [rising, falling] = state.course;
  let found = 0;
  // No branch: whether a noisy series turns is a coin's toss that the processor cannot foretell.
  for (let i = 0, at = slice.offset; i < count; i++, at += stride) {
    const value = values[at];
    const up = Number(value > last);
    const down = Number(value < last);
    out[found] = last;
    found += (up & falling) | (down & rising);
    rising = (rising | up) & (down ^ 1);
    falling = (falling | down) & (up ^ 1);
    last = value;
  }
  state.last[0] = last;
  state.course[0] = rising;
  state.course[1] = falling;
  return found;
}
