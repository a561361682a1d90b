/** How a surface trades heat by radiation. */
export interface SurfaceRadiation {
  /** Share of the sun's light that it takes in, a, 0 … 1. */
  readonly absorptance: number;
  /** ε, 0 … 1. */
  readonly emissivity: number;
  /** ΔR [W/m²]. */
  readonly skyLoss: number;
}

/**
 * How far the sol-air temperature lies above the air [K]: a·I/h − ε·ΔR/h, ASHRAE Fundamentals, sol-air temperature.
 *
 * @param irradiance I on the surface [W/m²]
 * @param film h [W/(m²·K)], over 0
 */
export function solAirExcess(
  irradiance: number,
  film: number,
  { absorptance, emissivity, skyLoss }: SurfaceRadiation,
): number {
  return (absorptance * irradiance - emissivity * skyLoss) / film;
}
