import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ChainSpec, createChain, moveTo, resetChain } from '../../src/mechanics/chain.ts';
import {
  chainAfter,
  difference,
  forcesOf,
  row,
  slipsOf,
  spanForcesOf,
} from '../support/chain-reading.ts';
import { anyRun, slippingRun, strainPath } from '../support/random-run.ts';

const SEED = { seed: 4711, numRuns: 300 };

/** The stiffness that a rigid fastener stands for: a million times the stiffest span's. */
function realStiffness(spec: ChainSpec): Float64Array {
  const stiffest = Math.max(...spans(spec));
  return spec.stiffness.map((k) => (Number.isFinite(k) ? k : 1e6 * stiffest));
}

function spans({ positions, axialStiffness }: ChainSpec): Float64Array {
  return positions.slice(1).map((x, j) => axialStiffness / (x - positions[j]));
}

/** What rounding may cost [N]: a billionth of the restrained force, and the last digits of the stiffest k·d. */
function roundingOf(spec: ChainSpec, path: readonly number[]): number {
  const strain = Math.max(...path.map(Math.abs));
  const longest = spec.positions[spec.positions.length - 1] - spec.positions[0];
  return (
    1e-6 +
    strain * (1e-9 * spec.axialStiffness + 1e-14 * Math.max(...realStiffness(spec)) * longest)
  );
}

describe('a run with slip, whatever the run and the path', () => {
  it('is in equilibrium: spans built from movements carry what the fasteners hand on', () => {
    fc.assert(
      fc.property(anyRun(30), strainPath, (spec, path) => {
        const n = spec.positions.length;
        const stiffness = realStiffness(spec);
        const chain = createChain(spec);
        for (const strain of path) {
          moveTo(chain, strain);
          const forces = forcesOf(chain, n);
          const slips = slipsOf(chain, n);
          const movement = forces.map((f, i) => f / stiffness[i] + slips[i]);
          // N = EA·((d₂ − d₁)/L − ε), from the fasteners' own movements
          const stretched = spans(spec).map((span, j) => {
            return span * (movement[j + 1] - movement[j]) - spec.axialStiffness * strain;
          });
          const rounding = roundingOf(spec, path);
          expect(difference(stretched, spanForcesOf(chain, n))).toBeLessThan(rounding);
          let held = 0;
          for (let i = 0; i < n; i++) held += forces[i];
          expect(Math.abs(held)).toBeLessThan(rounding);
        }
      }),
      SEED,
    );
  });

  it('keeps every slip within the free play, and every force within the grip or pushed against the end', () => {
    fc.assert(
      fc.property(anyRun(30), strainPath, (spec, path) => {
        const n = spec.positions.length;
        const stiffness = realStiffness(spec);
        const softest = Math.min(...spans(spec));
        const chain = createChain(spec);
        for (const strain of path) {
          moveTo(chain, strain);
          const forces = forcesOf(chain, n);
          const slips = slipsOf(chain, n);
          for (let i = 0; i < n; i++) {
            const play = spec.freePlay[i];
            expect(Math.abs(slips[i])).toBeLessThanOrEqual(play * (1 + 1e-9));
            if (play === 0 || slips[i] * Math.sign(forces[i]) > play * (1 - 1e-9)) continue;
            // a slipping joint keeps a billionth of the softer of its spring and the softest span
            const trace = 1e-9 * Math.min(softest, stiffness[i]) * Math.abs(slips[i]);
            const most = spec.grip[i] * (1 + 1e-9) + trace * (1 + 1e-6) + roundingOf(spec, path);
            expect(Math.abs(forces[i])).toBeLessThanOrEqual(most);
          }
        }
      }),
      SEED,
    );
  });

  it('is the same when a monotone stretch has more samples', () => {
    const shares = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 12 });
    fc.assert(
      fc.property(anyRun(20), strainPath, shares, (spec, path, cuts) => {
        const n = spec.positions.length;
        const sorted = [...cuts].sort((a, b) => a - b);
        const finer = path.flatMap((to, i) => {
          const from = path[i - 1] ?? 0;
          return [...sorted.map((share) => from + share * (to - from)), to];
        });
        const coarse = chainAfter(spec, ...path);
        const fine = chainAfter(spec, ...finer);
        expect(difference(forcesOf(coarse, n), forcesOf(fine, n))).toBeLessThan(
          roundingOf(spec, path),
        );
      }),
      SEED,
    );
  });

  it('mirrors: from the other end every force has the other sign', () => {
    fc.assert(
      fc.property(anyRun(20), strainPath, (spec, path) => {
        const n = spec.positions.length;
        const mirrored: ChainSpec = {
          axialStiffness: spec.axialStiffness,
          positions: spec.positions.map((x) => 1e6 - x).reverse(),
          stiffness: spec.stiffness.slice().reverse(),
          freePlay: spec.freePlay.slice().reverse(),
          grip: spec.grip.slice().reverse(),
        };
        const forces = forcesOf(chainAfter(spec, ...path), n);
        const other = forcesOf(chainAfter(mirrored, ...path), n).reverse();
        const negated = other.map((f) => -f);
        expect(difference(forces, negated)).toBeLessThan(roundingOf(spec, path));
      }),
      SEED,
    );
  });

  it('cooling is heating with the other sign', () => {
    fc.assert(
      fc.property(anyRun(20), strainPath, (spec, path) => {
        const n = spec.positions.length;
        const hot = forcesOf(chainAfter(spec, ...path), n);
        const cold = forcesOf(chainAfter(spec, ...path.map((strain) => -strain)), n);
        expect(
          difference(
            hot,
            cold.map((f) => -f),
          ),
        ).toBeLessThan(roundingOf(spec, path));
      }),
      SEED,
    );
  });

  it('doubles every force where EA, k and grip are doubled, and leaves every slip', () => {
    fc.assert(
      fc.property(slippingRun(20), strainPath, (spec, path) => {
        const n = spec.positions.length;
        const twice: ChainSpec = {
          ...spec,
          axialStiffness: 2 * spec.axialStiffness,
          stiffness: spec.stiffness.map((k) => 2 * k),
          grip: spec.grip.map((g) => 2 * g),
        };
        const one = chainAfter(spec, ...path);
        const two = chainAfter(twice, ...path);
        const halved = forcesOf(two, n).map((f) => f / 2);
        expect(difference(forcesOf(one, n), halved)).toBeLessThan(roundingOf(spec, path));
        expect(difference(slipsOf(one, n), slipsOf(two, n))).toBeLessThan(1e-6);
      }),
      SEED,
    );
  });

  // Equal grips on both sides of mid-run: the row slides as a whole and only symmetry says where it stands.
  it.each([2000, 2e7, Number.POSITIVE_INFINITY])(
    'a symmetric row of joints of %d N/mm stays symmetric',
    (k) => {
      const count = fc.integer({ min: 1, max: 10 });
      const play = fc.integer({ min: 1, max: 40 });
      fc.assert(
        fc.property(count, play, strainPath, (half, twentieths, path) => {
          const n = 2 * half;
          const spec = row({
            axialStiffness: 3e7,
            spacing: 600,
            stiffness: new Array(n).fill(k),
            freePlay: new Array(n).fill(twentieths / 20),
            grip: new Array(n).fill(1000),
          });
          const forces = forcesOf(chainAfter(spec, ...path), n);
          const mirrored = forces.map((_, i) => -forces[n - 1 - i]);
          expect(difference(forces, mirrored)).toBeLessThan(1e-3);
        }),
        SEED,
      );
    },
  );

  it('begins anew after a reset', () => {
    fc.assert(
      fc.property(anyRun(20), strainPath, strainPath, (spec, before, path) => {
        const n = spec.positions.length;
        const used = chainAfter(spec, ...before);
        resetChain(used);
        for (const strain of path) moveTo(used, strain);
        const fresh = chainAfter(spec, ...path);
        expect(forcesOf(used, n)).toEqual(forcesOf(fresh, n));
        expect(slipsOf(used, n)).toEqual(slipsOf(fresh, n));
      }),
      SEED,
    );
  });
});
