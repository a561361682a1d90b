import { describe, expect, it } from 'vitest';
import {
  BROWN_FREE,
  COMPOSITE_PLATE,
  FREE_BRIDGE,
  HELD_BARS,
  HIBBELER_FORCE,
  TUBE_WITH_GAP,
  TWO_BARS_WITH_GAP,
} from '../reference/restrained-bars.ts';
import { chainAfter, forcesOf, row, slipsOf, spanForcesOf } from '../support/chain-reading.ts';

const RIGID = Number.POSITIVE_INFINITY;

describe('restrained bars of the textbooks', () => {
  it.each(HELD_BARS)('$name: held at both ends', (bar) => {
    const spec = row({ axialStiffness: bar.modulus, spacing: 1000, stiffness: [RIGID, RIGID] });
    const [stress] = spanForcesOf(chainAfter(spec, bar.expansion * bar.rise), 2);
    // rigid is a million times the span: a share 2e-6 short of the textbook
    expect(-stress / (bar.modulus * bar.expansion * bar.rise)).toBeCloseTo(1, 5);
    expect(-stress).toBeCloseTo(bar.stress, bar.digits);
  });

  it('Hibbeler SI 4.10: rigid fasteners between the ends change nothing', () => {
    const bar = HELD_BARS[1];
    const count = 6;
    const spec = row({
      axialStiffness: bar.modulus * HIBBELER_FORCE.area,
      spacing: 200,
      stiffness: new Array(count).fill(RIGID),
    });
    const chain = chainAfter(spec, bar.expansion * bar.rise);
    const spans = spanForcesOf(chain, count);
    for (const force of spans) expect(-force / HIBBELER_FORCE.force).toBeCloseTo(1, 5);
    const shears = forcesOf(chain, count);
    expect(shears[count - 1] / HIBBELER_FORCE.force).toBeCloseTo(1, 5);
    for (const inner of shears.slice(1, -1)) {
      expect(Math.abs(inner) / HIBBELER_FORCE.force).toBeLessThan(1e-5);
    }
  });

  // Held at one end; the other sits in a slot too long to end, its grip the least that counts, 1 N.
  it.each([
    ['Brown ENGN0310', BROWN_FREE, 2],
    ['OpenStax bridge', FREE_BRIDGE, -1],
  ] as const)('%s: free movement', (_name, bar, digits) => {
    const spec = row({
      axialStiffness: 1e10,
      spacing: bar.length,
      stiffness: [RIGID, RIGID],
      freePlay: [0, 1e4],
    });
    const slips = slipsOf(chainAfter(spec, bar.expansion * bar.rise), 2);
    expect(slips[1] / (bar.expansion * bar.rise * bar.length)).toBeCloseTo(1, 3);
    expect(slips[1]).toBeCloseTo(bar.movement, digits);
  });

  // The gap is the free play of the right-hand joint: the tube slides until it bears there.
  it('Bhandari 4.22: a tube that closes a gap', () => {
    const t = TUBE_WITH_GAP;
    const spec = row({
      axialStiffness: t.modulus * t.area,
      spacing: t.length,
      stiffness: [RIGID, RIGID],
      freePlay: [0, t.gap],
    });
    const strain = t.expansion * t.rise;
    const chain = chainAfter(spec, strain);
    const [force] = spanForcesOf(chain, 2);
    expect(-force / t.area).toBeCloseTo(t.stress, 2);
    expect(-force / t.force).toBeCloseTo(1, 3);
    expect(slipsOf(chain, 2)[1]).toBeCloseTo(t.gap, 12);
    // short of the gap nothing but the least grip of 1 N acts, and the trace of stiffness of a slipping joint
    const open = chainAfter(spec, (0.99 * t.gap) / t.length);
    expect(-spanForcesOf(open, 2)[0]).toBeCloseTo(1, 3);
  });

  // The aluminium is the member. The stainless bar is the spring EA/L of its right-hand joint, the gap that joint's free
  // play, and its own expansion towards the aluminium is a structure that moves the other way.
  it('Beer & Johnston 2.60: two bars with a gap between', () => {
    const { aluminium, stainless, gap, rise, ...answer } = TWO_BARS_WITH_GAP;
    const axialStiffness = aluminium.modulus * aluminium.area;
    const spec = row({
      axialStiffness,
      spacing: aluminium.length,
      stiffness: [RIGID, (stainless.modulus * stainless.area) / stainless.length],
      freePlay: [0, gap],
    });
    const towards = (stainless.expansion * stainless.length) / aluminium.length;
    const [force] = spanForcesOf(chainAfter(spec, (aluminium.expansion + towards) * rise), 2);
    expect(-force / answer.force).toBeCloseTo(1, 3);
    expect(-force / aluminium.area).toBeCloseTo(answer.aluminiumStress, 1);
    const change = aluminium.length * (aluminium.expansion * rise + force / axialStiffness);
    expect(change).toBeCloseTo(answer.aluminiumLengthChange, 3);
  });

  // The coppers are the member on a structure of steel; the steel's own give, E_s·A_s/L, is shared by the two end
  // fasteners in series, twice that each.
  it('Scilab companion 8.29: copper on steel', () => {
    const { steel, copper, length, rise, ...answer } = COMPOSITE_PLATE;
    const copperArea = 2 * copper.areaEach;
    const give = (2 * steel.modulus * steel.area) / length;
    const spec = row({
      axialStiffness: copper.modulus * copperArea,
      spacing: length,
      stiffness: [give, give],
    });
    const [force] = spanForcesOf(chainAfter(spec, (copper.expansion - steel.expansion) * rise), 2);
    expect(-force / 2).toBeCloseTo(answer.copperForceEach, -1);
    expect(force / copperArea).toBeCloseTo(answer.copperStress, 2);
    expect(-force / steel.area).toBeCloseTo(answer.steelStress, 2);
    const change = length * (steel.expansion * rise - force / (steel.modulus * steel.area));
    expect(change).toBeCloseTo(answer.lengthChange, 2);
  });
});
