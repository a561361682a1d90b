import type { Curve } from '../model.ts';

/**
 * Factor on ranges for the size effect of a thick member: (t/t_ref)^exponent, never under 1.
 *
 * @param curve the member's curve
 * @param thickness t [mm], `null` where the user gave none
 * @returns factor that multiplies the range; 1 without a thickness effect, a thickness, or over t_ref
 */
export function thicknessFactor(curve: Curve, thickness: number | null): number {
  const effect = curve.thicknessEffect;
  if (effect === null || thickness === null || thickness <= effect.reference) return 1;
  return (thickness / effect.reference) ** effect.exponent;
}
