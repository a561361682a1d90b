import { describe, expect, it } from 'vitest';
import {
  createTurningState,
  findTurningPoints,
  startTurning,
} from '../../src/counting/turning-points.ts';

/** Turning points found in blocks, the last value pending. */
function found(blocks: readonly number[][]): number[] {
  const state = createTurningState();
  startTurning(state, blocks[0][0]);
  return blocks.flatMap((values) => {
    const out = new Float64Array(values.length);
    const slice = { values: Float64Array.from(values), offset: 0, stride: 1, count: values.length };
    return [...out.subarray(0, findTurningPoints(slice, state, out))];
  });
}

describe('turning points', () => {
  it('leave out equal neighbours, values on the way and both ends', () => {
    expect(found([[1, 1, 3, 3, 4, 4, 4, 2, 2, 5]])).toEqual([4, 2]);
    expect(found([[4, 4, 2, 2, 1, 1, 6, 6]])).toEqual([1]);
    expect(found([[3, 3, 3]])).toEqual([]);
  });

  it('are found across blocks', () => {
    expect(found([[1, 1], [1], [3, 4], [4, 4], [2], [2, 5]])).toEqual([4, 2]);
    expect(found([[4], [4], [2], [6]])).toEqual([2]);
  });

  it('are found where steps are too small to multiply', () => {
    expect(found([[0, 1e-300, 0, 1e-300]])).toEqual([1e-300, 0]);
  });
});
