import type { BucklingRule } from '../model.ts';

/** One span of a member as a pin-ended strut. */
export interface Strut {
  /** Young's modulus E [MPa]. */
  readonly modulus: number;
  /** Yield strength f_y [MPa]. */
  readonly yield: number;
  /** Gross area A [mm²]. */
  readonly area: number;
  /** Second moment of area about the weak axis I [mm⁴]. */
  readonly inertia: number;
  /** Buckling length L [mm]. */
  readonly length: number;
}

/**
 * Flexural buckling resistance of a strut [N], before any partial or resistance factor.
 * `EN`: EN 1993-1-1:2005, 6.3.1.2, χ A f_y with the rule's imperfection α and plateau λ̄₀ [1].
 * `AISC`: ANSI/AISC 360, E3, the nominal strength F_cr A.
 * The strut's values are positive; local, torsional and distortional buckling are not in it.
 */
export function bucklingResistance(strut: Strut, rule: BucklingRule): number {
  const squash = strut.area * strut.yield;
  const euler = (Math.PI ** 2 * strut.modulus * strut.inertia) / strut.length ** 2;
  const share =
    rule.rule === 'EN'
      ? reductionFactor(Math.sqrt(squash / euler), rule)
      : criticalShare(squash / euler);
  return share * squash;
}

/** χ at the slenderness λ̄ = √(A f_y / N_cr), equations (6.49) and (6.50) of EN 1993-1-1:2005. */
function reductionFactor(
  slenderness: number,
  { imperfection, plateau }: { readonly imperfection: number; readonly plateau: number },
): number {
  if (slenderness <= plateau) return 1;
  const phi = 0.5 * (1 + imperfection * (slenderness - plateau) + slenderness ** 2);
  return Math.min(1, 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2)));
}

/** F_cr/F_y at the ratio F_y/F_e, equations (E3-2) and (E3-3) of AISC 360. */
function criticalShare(ratio: number): number {
  return ratio <= 2.25 ? 0.658 ** ratio : 0.877 / ratio;
}
