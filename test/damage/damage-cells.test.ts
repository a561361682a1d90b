import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { cyclesToFailure } from '../../src/damage/cycles-to-failure.ts';
import { createDamageCells, type DamageCells, sumDamage } from '../../src/damage/damage-cells.ts';
import type { Curve } from '../../src/model.ts';
import { curvesOfEveryKind } from './built.ts';

let curves: Record<string, Curve>;
beforeAll(async () => {
  curves = await curvesOfEveryKind();
});

/** Ranges from 0.01 to 12 000, several to a cell. */
const RANGES = Array.from({ length: 20_000 }, (_, i) => 0.01 * 1.0007 ** i);

const exact = (curve: Curve, range: number) => 1 / cyclesToFailure(curve, range, true);

/** Largest relative error of the ranges, each by itself; infinite where one is wrongly thought harmless or harmful. */
function worst(cells: DamageCells, ranges: readonly number[]): number {
  const errors = ranges.map((range) => {
    const damage = exact(cells.curve, range);
    const { sum, damaging } = sumDamage(cells, Float64Array.of(range), 1);
    if (damaging !== Number(damage > 0)) return Number.POSITIVE_INFINITY;
    return damage === 0 ? 0 : Math.abs(sum / damage - 1);
  });
  return Math.max(...errors);
}

describe('damage over range', () => {
  it('is within 1e-6 of the curve at each range, asked for a second time', () => {
    for (const [name, curve] of Object.entries(curves)) {
      const cells = createDamageCells(curve);
      worst(cells, RANGES); // the first range in a cell asks the curve
      expect(worst(cells, RANGES), name).toBeLessThan(1e-6);
    }
  });

  it('seldom asks the curve again', () => {
    for (const name of ['EN direct', 'AISC', 'a high slope', 'a formula with a kink']) {
      const cells = createDamageCells(curves[name]);
      worst(cells, RANGES);
      const tried = cells.tried.reduce((total, one) => total + one, 0);
      const laid = cells.coefficients.filter((value) => !Number.isNaN(value)).length / 4;
      expect(laid / tried, name).toBeGreaterThan(0.9);
    }
  });

  it('is exact beside kinks, cut-offs and thresholds', () => {
    for (const [name, curve] of Object.entries(curves)) {
      const cells = createDamageCells(curve);
      const kinks = curve.line.kind === 'points' ? [...curve.line.ranges] : [90.3, 20, 400];
      for (const kink of [...kinks, curve.limitRange]) {
        const beside = [-1e-2, -1e-4, -1e-9, -2e-16, 0, 2e-16, 1e-9, 1e-4, 1e-2];
        const ranges = beside.map((step) => kink * (1 + step));
        worst(cells, ranges);
        expect(worst(cells, ranges), `${name} at ${kink}`).toBeLessThan(1e-6);
      }
    }
  });

  it('sums a spectrum to within 1e-6, factors applied', () => {
    const octaves = fc.double({ min: -6, max: 9, noNaN: true });
    const spectra = fc.array(octaves, { minLength: 1, maxLength: 3000 });
    fc.assert(
      fc.property(
        spectra,
        fc.double({ min: 0.3, max: 3, noNaN: true }),
        fc.constantFrom(...Object.keys(curves)),
        (logs, factor, name) => {
          const curve = curves[name];
          const cells = createDamageCells(curve);
          const ranges = Float64Array.from(logs, (log) => 2 ** log);
          sumDamage(cells, ranges, factor);
          const { sum, damaging } = sumDamage(cells, ranges, factor);
          const damages = [...ranges].map((range) => exact(curve, factor * range));
          const total = damages.reduce((a, b) => a + b, 0);
          expect(Math.abs(sum - total)).toBeLessThanOrEqual(1e-6 * total);
          expect(damaging).toBe(damages.filter((damage) => damage > 0).length);
        },
      ),
      { seed: 80, numRuns: 300 },
    );
  });
});
