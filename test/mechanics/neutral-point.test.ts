import { expect, it } from 'vitest';
import { createChain } from '../../src/mechanics/chain.ts';
import { followRecord } from '../../src/mechanics/history.ts';
import { strainPath } from '../../src/mechanics/strain-path.ts';

const [COUNT, SPACING, EA] = [21, 600, 31.5e6];
const column = (of: (i: number) => number) => Float64Array.from({ length: COUNT }, (_, i) => of(i));

/** Ten tight fasteners and eleven in slots that hardly grip, on one side of them or the other. */
const follow = (tight: (i: number) => boolean, strain: readonly number[]) => {
  const chain = createChain({
    axialStiffness: EA,
    positions: column((i) => i * SPACING),
    stiffness: column(() => 2000),
    freePlay: column((i) => (tight(i) ? 0 : 9)),
    grip: column((i) => (tight(i) ? 0 : 1)),
  });
  const options = { extremes: [], residue: 'repeat' } as const;
  const counter = { begin() {}, take() {} };
  return followRecord(chain, strainPath(Float64Array.from(strain)), options, counter);
};

// One of the tight ones stands at the neutral point, where nothing moves: it reaches no limit, however near it is to one.
it.each([
  ['right', (i: number) => i < 10, [0, 1e-3, -1e-3, 5e-4]],
  ['left', (i: number) => i > 10, [-1e-3, 1e-3, 0]],
] as const)(
  'a run slotted on its %s goes on past a fastener that does not move',
  (side, tight, strain) => {
    const { passes, slipPeak, allShear } = follow(tight, strain);
    expect(passes).toBe(2);
    // statics: every slot slips at its grip of 1 N, and all of them together load the tight side
    const slots = [...allShear.max].filter((_, i) => !tight(i));
    expect(slots).toEqual(slots.map(() => expect.closeTo(1, 4)));
    // free expansion of the slotted length from end to end, less what 11 N at most squeeze it by
    const free = Math.abs(slipPeak[side === 'right' ? COUNT - 1 : 0] - slipPeak[10]);
    expect(Math.abs(free - 10 * SPACING * 1e-3)).toBeLessThan((10 * SPACING * 11) / EA);
  },
);
