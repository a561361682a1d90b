import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bucklingResistance, type Strut } from '../../src/mechanics/buckling.ts';
import {
  CRITICAL_STRESS,
  LIMIT_SLENDERNESS,
  MODULUS_KSI,
  PHI,
  W14X90,
} from '../reference/aisc-360-e3.ts';
import {
  type BucklingCurve,
  IMPERFECTION,
  LAMBDA_1,
  PLATEAU,
  REDUCTION_FACTORS,
} from '../reference/en-1993-1-1-buckling.ts';

const AISC = { rule: 'AISC' } as const;
const KSI = 6.894757293168361; // MPa: 1000 lbf/in², 1 lbf = 4.4482216152605 N, 1 in = 25.4 mm exactly
const KIP = 4448.2216152605; // N
const IN = 25.4; // mm

/** A strut whose slenderness L/i is the one given, of unit area unless stated. */
function strut(props: { modulus: number; yield: number; ratio: number; area?: number }): Strut {
  const { modulus, ratio, area = 1 } = props;
  return { modulus, yield: props.yield, area, inertia: area, length: ratio };
}

describe('EN 1993-1-1:2005, 6.3.1.2', () => {
  const cases = REDUCTION_FACTORS.flatMap((row) =>
    (Object.keys(IMPERFECTION) as BucklingCurve[]).map((curve) => ({ row, curve })),
  );

  it.each(cases)('curve $curve at λ̄ = $row.slenderness', ({ row, curve }) => {
    const rule = { rule: 'EN', imperfection: IMPERFECTION[curve], plateau: PLATEAU } as const;
    // π²E = f_y at unit area, inertia and f_y, so that the length is λ̄ itself.
    const unit = { modulus: 1 / Math.PI ** 2, yield: 1, ratio: row.slenderness };
    expect(bucklingResistance(strut(unit), rule)).toBeCloseTo(row[curve], 4);
  });

  it.each(LAMBDA_1)('λ̄ is 1 at L/i = $lambda1 for f_y = $yield MPa', ({ yield: fy, lambda1 }) => {
    const rule = { rule: 'EN', imperfection: IMPERFECTION.c, plateau: PLATEAU } as const;
    const resistance = bucklingResistance(
      strut({ modulus: 210_000, yield: fy, ratio: lambda1 }),
      rule,
    );
    // λ₁ has three figures, and χ falls by about 0.5 for a unit of λ̄ here.
    expect(resistance / fy).toBeCloseTo(0.5399, 3);
  });

  it('gives the squash load up to the plateau, and never more', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 5, noNaN: true }),
        fc.double({ min: 0, max: 0.8, noNaN: true }),
        fc.double({ min: 0, max: 0.5, noNaN: true }),
        (slenderness, imperfection, plateau) => {
          const unit = strut({ modulus: 1 / Math.PI ** 2, yield: 1, ratio: slenderness });
          const chi = bucklingResistance(unit, { rule: 'EN', imperfection, plateau });
          expect(chi).toBeLessThanOrEqual(1);
          if (slenderness < plateau) expect(chi).toBe(1);
          if (slenderness > plateau)
            expect(chi).toBeLessThanOrEqual(slenderness ** -2 * (1 + 1e-9));
        },
      ),
      { seed: 1993 },
    );
  });
});

describe('AISC 360, E3', () => {
  const cases = CRITICAL_STRESS.flatMap((row) => [
    { row, yield: 50, fcr: row.fcr50, phi: row.phi50 },
    { row, yield: 36, fcr: row.fcr36, phi: row.phi36 },
  ]);

  it.each(cases)('F_cr at L_c/r = $row.slenderness, F_y = $yield ksi', (c) => {
    const fcr =
      bucklingResistance(
        strut({ modulus: MODULUS_KSI * KSI, yield: c.yield * KSI, ratio: c.row.slenderness }),
        AISC,
      ) / KSI;
    expect(Math.abs(fcr - c.fcr)).toBeLessThanOrEqual(0.0051);
    expect(Number((PHI * fcr).toPrecision(3))).toBe(c.phi);
  });

  it('W14×90 carries the nominal and design strength of the Design Examples', () => {
    const area = W14X90.area * IN ** 2;
    const column = strut({
      modulus: MODULUS_KSI * KSI,
      yield: W14X90.yield * KSI,
      ratio: W14X90.slenderness,
      area,
    });
    const pn = bucklingResistance(column, AISC) / KIP;
    expect(Number(pn.toPrecision(3))).toBe(W14X90.pn);
    expect(Math.abs(PHI * pn - W14X90.phiPn)).toBeLessThan(1.5); // F_cr is rounded to 38.9 there
  });

  it.each(LIMIT_SLENDERNESS)(
    'turns elastic at L_c/r = $slenderness for F_y = $yield ksi',
    (row) => {
      const at = (ratio: number) =>
        bucklingResistance(strut({ modulus: MODULUS_KSI, yield: row.yield, ratio }), AISC);
      const elastic = (ratio: number) => (0.877 * Math.PI ** 2 * MODULUS_KSI) / ratio ** 2;
      expect(at(row.slenderness + 0.1)).toBeCloseTo(elastic(row.slenderness + 0.1), 9);
      expect(
        Math.abs(at(row.slenderness - 0.2) / elastic(row.slenderness - 0.2) - 1),
      ).toBeGreaterThan(1e-7);
    },
  );
});
