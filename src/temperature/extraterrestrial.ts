/** Solar constant [W/m²], ASTM E490-00a (from memory). */
const SOLAR_CONSTANT = 1366.1;

/**
 * Irradiance outside the atmosphere on a surface that faces the sun [W/m²], by J. W. Spencer, Fourier series
 * representation of the position of the sun, Search 2(5) 172, 1971.
 *
 * @param dayOfYear 1 on the first of January
 */
export function extraterrestrialNormal(dayOfYear: number): number {
  const angle = (2 * Math.PI * (dayOfYear - 1)) / 365;
  const nearness =
    1.00011 +
    0.034221 * Math.cos(angle) +
    0.00128 * Math.sin(angle) +
    0.000719 * Math.cos(2 * angle) +
    0.000077 * Math.sin(2 * angle);
  return SOLAR_CONSTANT * nearness;
}
