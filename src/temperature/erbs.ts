/**
 * Diffuse share of the global horizontal irradiance, 0 … 1, by D. G. Erbs, S. A. Klein and J. A. Duffie, Estimation
 * of the diffuse radiation fraction for hourly, daily and monthly-average global radiation, Solar Energy 28(4) 293,
 * 1982.
 *
 * @param clearness k_T, global horizontal irradiance over that outside the atmosphere
 */
export function erbsDiffuseShare(clearness: number): number {
  const k = clearness;
  if (k <= 0.22) return 1 - 0.09 * k;
  if (k <= 0.8) return 0.9511 + k * (-0.1604 + k * (4.388 + k * (-16.638 + k * 12.336)));
  return 0.165;
}
