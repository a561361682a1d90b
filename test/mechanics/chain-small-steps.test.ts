import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ChainSpec, createChain, moveTo } from '../../src/mechanics/chain.ts';
import { difference, forcesOf } from '../support/chain-reading.ts';
import { livelyRun, slippingRun, strainPath } from '../support/random-run.ts';
import { SmallSteps } from '../support/small-steps.ts';

/**
 * Largest difference of any force at any turning point between the event path and a number of small steps a leg, as a
 * share of the restrained force EA·ε.
 */
function errorOf(spec: ChainSpec, path: readonly number[], steps: number): number {
  const small = new SmallSteps(spec);
  const chain = createChain(spec);
  let error = 0;
  for (const strain of path) {
    small.moveTo(strain, steps);
    moveTo(chain, strain);
    error = Math.max(error, difference(forcesOf(chain, spec.positions.length), small.forces()));
  }
  return error / (spec.axialStiffness * Math.max(1e-9, ...path.map(Math.abs)));
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

describe('a run with slip, against small implicit steps', () => {
  const cases = fc.sample(fc.tuple(livelyRun, strainPath), { seed: 1959, numRuns: 120 });
  const errors = [4, 64, 1024].map((steps) => {
    return cases.map(([spec, path]) => errorOf(spec, path, steps));
  });

  it('the steps converge to the event path at first order', () => {
    const [coarse, middle, fine] = errors.map(mean);
    // sixteen times as many steps: a sixteenth of the error at first order, with slack for chance
    expect(middle).toBeLessThan(coarse / 8);
    expect(fine).toBeLessThan(middle / 8);
    expect(Math.max(...errors[2])).toBeLessThan(2e-4);
  });

  it('the runs put it to the test: in many a joint turns round inside a step', () => {
    const turning = errors[0].filter((error) => error > 1e-6).length;
    expect(turning).toBeGreaterThan(cases.length / 4);
  });

  it('agrees on runs of every kind, from loose slots to tight holes', () => {
    fc.assert(
      fc.property(slippingRun(8), strainPath, (spec, path) => {
        expect(errorOf(spec, path, 64)).toBeLessThan(1e-3);
      }),
      { seed: 1968, numRuns: 200 },
    );
  });
});

// Two equal clearance joints on one span go through the whole loop together: stick, slip, bear, and back. The strain of
// every state follows by hand from the compatibility of span and fasteners (statics, no source).
describe('two equal joints worked by hand', () => {
  const axialStiffness = 40e6;
  const length = 1000;
  const stiffness = 10_000;
  const grip = 2000;
  const play = 0.5;
  const spec: ChainSpec = {
    axialStiffness,
    positions: Float64Array.of(0, length),
    stiffness: Float64Array.of(stiffness, stiffness),
    freePlay: Float64Array.of(play, play),
    grip: Float64Array.of(grip, grip),
  };
  // the right-hand fastener moves u = s + f/k, and the span's free expansion is εL = 2u + f·L/EA
  const strainAt = (slip: number, force: number) =>
    (2 * (slip + force / stiffness) + (force * length) / axialStiffness) / length;

  it.each([
    { name: 'sticks', path: [[0, 1999]] },
    { name: 'slips at the grip', path: [[0.3, grip]] },
    { name: 'bears beyond the grip', path: [[play, 9000]] },
    {
      name: 'unloads while it bears',
      path: [
        [play, 9000],
        [play, -1500],
      ],
    },
    {
      name: 'slips back at the other grip',
      path: [
        [play, 9000],
        [-0.2, -grip],
      ],
    },
    {
      name: 'sticks where it stopped',
      path: [
        [0.3, grip],
        [0.3, 500],
      ],
    },
    {
      name: 'bears on the other side',
      path: [
        [play, 9000],
        [-play, -7000],
      ],
    },
    {
      name: 'closes the loop',
      path: [
        [play, 9000],
        [-play, -7000],
        [play, 9000],
      ],
    },
  ] as const)('$name', ({ path }) => {
    const chain = createChain(spec);
    for (const [slip, force] of path) moveTo(chain, strainAt(slip, force));
    const [left, right] = forcesOf(chain, 2);
    const [, force] = path[path.length - 1];
    expect(right).toBeCloseTo(force, 2);
    expect(left).toBeCloseTo(-force, 2);
  });
});
