/** Surface film coefficient of ASHRAE's sol-air tables, convection and radiation together [W/(m²·K)], 3.0 Btu/(h·ft²·°F). */
export const ASHRAE_FILM = 17;

/** Stefan–Boltzmann constant [W/(m²·K⁴)], CODATA (from memory). */
const STEFAN_BOLTZMANN = 5.670374419e-8;
const ZERO_CELSIUS = 273.15;

/**
 * Surface film coefficient from wind speed [W/(m²·K)], EN ISO 6946:2007, Annex A (from memory):
 * h = h_c + h_r with h_c = 4 + 4v and h_r = 4εσT_m³. The mean absolute temperature T_m of the surface and what it
 * faces is taken as that of the air, which errs to the warm side for a surface in the sun.
 *
 * @param wind speed at the surface, v [m/s]
 * @param air air temperature [°C]
 * @param emissivity ε, 0 … 1
 */
export function filmFromWind(wind: number, air: number, emissivity: number): number {
  return 4 + 4 * wind + 4 * emissivity * STEFAN_BOLTZMANN * (air + ZERO_CELSIUS) ** 3;
}
