import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { HEATED_ROW } from '../reference/heated-row.ts';
import {
  chainAfter,
  difference,
  forcesOf,
  largest,
  row,
  spanForcesOf,
} from '../support/chain-reading.ts';
import { denseRowForces } from '../support/dense-row.ts';
import { anyStrain, elasticRun } from '../support/random-run.ts';

describe('a run of tight fasteners', () => {
  it('agrees with LU decomposition of the whole matrix (mathjs lusolve)', () => {
    fc.assert(
      fc.property(elasticRun, anyStrain, (spec, strain) => {
        const forces = forcesOf(chainAfter(spec, strain), spec.positions.length);
        const dense = denseRowForces(spec, strain);
        // soft fasteners on stiff spans cost the dense solution some six digits
        expect(difference(forces, dense)).toBeLessThanOrEqual(1e-9 * largest(dense));
      }),
      { seed: 2031, numRuns: 150 },
    );
  });

  it.each(HEATED_ROW)('heated row of $count, k/K = $ratio', ({ count, ratio, shears, ...bar }) => {
    const link = 5000; // K, N/mm
    const spacing = 400;
    const strain = 1e-3;
    const spec = row({
      axialStiffness: link * spacing,
      spacing,
      stiffness: new Array(count).fill(ratio * link),
    });
    const chain = chainAfter(spec, strain);
    const unit = link * strain * spacing;
    const forces = forcesOf(chain, count);
    shears.forEach((shear, i) => {
      expect(-forces[i] / unit).toBeCloseTo(shear, 4);
      expect(forces[count - 1 - i] / unit).toBeCloseTo(shear, 4);
    });
    const spans = spanForcesOf(chain, count);
    expect(Math.min(...spans) / unit).toBeCloseTo(-bar.largest, 4);
  });

  // N_j = −EAε·[1 − cosh((j − n/2)φ)/cosh(nφ/2)], cosh φ = 1 + ks/(2EA): the closed form of the difference
  // equation of a uniform row with free ends (Volkersen's shear lag at discrete fasteners; derivation, no source).
  it.each([
    { count: 2, stiffness: 700 },
    { count: 11, stiffness: 2000 },
    { count: 21, stiffness: 40_000 },
    { count: 100, stiffness: 300 },
    { count: 500, stiffness: 2000 },
  ])('shear lag along $count fasteners of $stiffness N/mm', ({ count, stiffness }) => {
    const axialStiffness = 31.5e6;
    const spacing = 600;
    const strain = -9e-4;
    const spec = row({ axialStiffness, spacing, stiffness: new Array(count).fill(stiffness) });
    const chain = chainAfter(spec, strain);
    const phi = Math.acosh(1 + (stiffness * spacing) / axialStiffness / 2);
    const full = axialStiffness * strain;
    const expected = Float64Array.from({ length: count - 1 }, (_, i) => {
      const from = Math.abs(i + 1 - count / 2) * phi;
      return -full * (1 - Math.cosh(from) / Math.cosh((count / 2) * phi));
    });
    expect(difference(spanForcesOf(chain, count), expected)).toBeLessThan(1e-9 * Math.abs(full));
    expect(forcesOf(chain, count)[0]).toBeCloseTo(expected[0], 4);
  });

  // N = −EAε/(1 + 2EA/(kL)): two springs in series with the bar; statics, no source.
  it.each([50, 4000, 1e6])('a bar between two springs of %d N/mm', (stiffness) => {
    const axialStiffness = 4.2e7;
    const length = 1250;
    const strain = 6e-4;
    const spec = row({ axialStiffness, spacing: length, stiffness: [stiffness, stiffness] });
    const [force] = spanForcesOf(chainAfter(spec, strain), 2);
    const expected = (-axialStiffness * strain) / (1 + (2 * axialStiffness) / (stiffness * length));
    expect(force / expected).toBeCloseTo(1, 12);
  });

  it('a single fastener carries nothing', () => {
    const spec = row({ axialStiffness: 1e7, stiffness: [5000] });
    expect(forcesOf(chainAfter(spec, 1e-3, -1e-3), 1)[0]).toBe(0);
  });
});
