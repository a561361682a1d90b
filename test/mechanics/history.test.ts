import { describe, expect, it } from 'vitest';
import { createChain } from '../../src/mechanics/chain.ts';
import type { ChainSpec } from '../../src/mechanics/chain-state.ts';
import { followRecord, type PassCounter } from '../../src/mechanics/history.ts';
import { momentOf, strainPath } from '../../src/mechanics/strain-path.ts';

const EA = 30e6;
const SPACING = 600;
const COUNT = 5;

/** Takes the first fastener's force of every row of the counted pass. */
function collector(): PassCounter & { forces: number[]; begun: number } {
  const taken = {
    forces: [] as number[],
    begun: 0,
    begin() {
      taken.forces = [];
      taken.begun++;
    },
    take(fasteners: Float64Array, _spans: Float64Array, rows: number) {
      for (let row = 0; row < rows; row++) taken.forces.push(fasteners[row * COUNT]);
    },
  };
  return taken;
}

/** Five fasteners, the middle one tight, the others in slots with a grip. */
function slottedRun(grip: number, freePlay: number): ChainSpec {
  const middle = (i: number) => i === 2;
  const column = (of: (i: number) => number) =>
    Float64Array.from({ length: COUNT }, (_, i) => of(i));
  return {
    axialStiffness: EA,
    positions: column((i) => i * SPACING),
    stiffness: column(() => 5000),
    freePlay: column((i) => (middle(i) ? 0 : freePlay)),
    grip: column(() => grip),
  };
}

const follow = (spec: ChainSpec, strain: number[], options = {}) => {
  const path = strainPath(Float64Array.from(strain));
  const counter = collector();
  const chain = createChain(spec);
  const history = followRecord(
    chain,
    path,
    { extremes: [], residue: 'repeat', ...options },
    counter,
  );
  return { history, counter, path };
};

describe('a record', () => {
  it('builds friction up from the free ends to the fixed point', () => {
    const [grip, strain] = [250, 1.2e-3];
    const { history } = follow(slottedRun(grip, 50), [0, strain]);
    // statics: every slot slips, so the outer span carries one grip and the inner one two
    expect([...history.allSpans.min]).toEqual(
      [-grip, -2 * grip, -2 * grip, -grip].map((n) => expect.closeTo(n, 3)),
    );
    // free expansion less what the friction squeezes, less the elastic give of the fastener itself
    const inner = SPACING * (strain - (2 * grip) / EA);
    const outer = inner + SPACING * (strain - grip / EA);
    const give = grip / 5000;
    const slips = [outer - give, inner - give, 0, inner - give, outer - give];
    expect([...history.slipPeak]).toEqual(slips.map((s) => expect.closeTo(s, 6)));
  });

  it('moves its free ends by the free strain less what the friction squeezes', () => {
    const [grip, strain] = [250, 1.2e-3];
    const overhangs = { left: 50, right: 150 };
    const { history } = follow({ ...slottedRun(grip, 50), overhangs }, [0, strain]);
    const out = SPACING * (2 * strain - (3 * grip) / EA);
    expect(history.allEnds.max[1]).toBeCloseTo(out + 150 * strain, 6);
    expect(history.allEnds.min[0]).toBeCloseTo(-out - 50 * strain, 6);
    expect(history.allEnds.min[1]).toBeCloseTo(0, 6);
  });

  it('slides there and back once a cycle', () => {
    const grip = 250;
    const { history } = follow(slottedRun(grip, 50), [0, 1.2e-3, 0]);
    // on the way back a slot first gives up its elastic strain twice over before it slips
    expect(history.passes).toBe(2);
    expect(history.walks).toBe(false);
    for (const [i, slid] of history.slid.entries()) {
      if (i === 2) expect(slid).toBe(0);
      else expect(slid).toBeGreaterThan(0.5);
    }
    expect(history.slid[0]).toBeCloseTo(history.slid[4], 9);
    expect([...history.drift].every((drift) => Math.abs(drift) < 1e-6)).toBe(true);
  });

  it('is counted from the second pass on, and closed only where it repeats', () => {
    const strain = [0, 1e-3, -1e-3, 5e-4];
    const tight = slottedRun(0, 0);
    const repeat = follow(tight, strain).counter;
    const half = follow(tight, strain, { residue: 'half' }).counter;
    expect(repeat.begun).toBe(1);
    // a run of springs: force over strain is one number; heating pushes the left end to the left
    const perStrain = half.forces[1] / 1e-3;
    expect(perStrain).toBeLessThan(0);
    expect(half.forces).toEqual(strain.map((e) => expect.closeTo(perStrain * e, 6)));
    // the way back from the last sample to the first comes before the record
    expect(repeat.forces).toEqual([expect.closeTo(0, 6), ...half.forces]);
  });

  it('slides only where it is counted', () => {
    const oneWay = follow(slottedRun(250, 50), [0, 1.2e-3], { residue: 'half' }).history;
    const round = follow(slottedRun(250, 50), [0, 1.2e-3]).history;
    // there and back is twice the way there, which alone an open record holds
    expect(oneWay.slid[0]).toBeGreaterThan(0.5);
    expect(round.slid[0]).toBeCloseTo(2 * oneWay.slid[0], 6);
  });

  it('keeps peaks from lock-in and extremes out of the counted ranges', () => {
    const spec = slottedRun(0, 0);
    const { history, path } = follow(spec, [1e-4, 2e-4], { extremes: [1e-3, -2e-3] });
    const perStrain = history.countedShear.max[4] / 2e-4;
    expect(history.countedShear.min[4]).toBeCloseTo(perStrain * 1e-4, 6);
    expect(history.allShear.max[4]).toBeCloseTo(perStrain * 1e-3, 6);
    expect(history.allShear.min[4]).toBeCloseTo(perStrain * -2e-3, 6);
    expect(momentOf(path, history.allShear.maxMark[4])).toEqual({ extreme: 0 });
    expect(momentOf(path, history.allShear.minMark[4])).toEqual({ extreme: 1 });
    expect(momentOf(path, history.countedShear.maxMark[4])).toEqual({ sample: 1 });
    expect(momentOf(path, history.countedShear.minMark[4])).toEqual({ sample: 0 });
  });

  it('names the first sample at which an event between samples had happened', () => {
    const strain = Array.from({ length: 11 }, (_, i) => i * 1e-4);
    const tight = follow(slottedRun(0, 0), [0, 1e-3]).history;
    const slipsAt = (1e-3 * 250) / tight.allShear.max[4];
    const { history, path } = follow(slottedRun(250, 50), strain);
    // once it slips the force stays at the grip, but for the slip tangent's billionth
    expect(history.allShear.max[4]).toBeCloseTo(250, 3);
    const reached = history.slipPeakMark[4];
    expect(momentOf(path, reached)).toEqual({ sample: 10 });
    expect(momentOf(path, 1 + slipsAt / 1e-3)).toEqual({ sample: Math.ceil(slipsAt / 1e-4) });
  });

  it('of one temperature does nothing', () => {
    const { history, counter } = follow(slottedRun(250, 2), [0, 0, 0]);
    expect(history.passes).toBe(2);
    expect([...history.allShear.max, ...history.allShear.min].every((f) => f === 0)).toBe(true);
    expect(counter.forces).toEqual([0]);
  });
});
