/**
 * ASHRAE Fundamentals 1985 to 1997, sol-air temperatures for 21 July, 40° N, at noon, and the solar heat gain table of
 * the same date (from memory). Air 90 °F, film 3.0 Btu/(h·ft²·°F); irradiance in Btu/(h·ft²), temperatures in °F,
 * printed to the whole degree. The loss to the sky is that of the correction printed there, −7 °F.
 */
export const SOL_AIR_NOON = {
  air: 90,
  film: 3,
  tolerance: 0.6,
  rows: [
    { surface: 'north', absorptance: 0.45, irradiance: 38, skyLoss: 0, solAir: 96 },
    { surface: 'south', absorptance: 0.45, irradiance: 109, skyLoss: 0, solAir: 106 },
    { surface: 'level', absorptance: 0.45, irradiance: 262, skyLoss: 21, solAir: 122 },
    { surface: 'north', absorptance: 0.9, irradiance: 38, skyLoss: 0, solAir: 101 },
    { surface: 'south', absorptance: 0.9, irradiance: 109, skyLoss: 0, solAir: 123 },
    { surface: 'level', absorptance: 0.9, irradiance: 262, skyLoss: 21, solAir: 162 },
  ],
} as const;

/** ASHRAE Fundamentals: correction of a level surface for the sky, −7 °F printed also as −4 K (SI from memory). */
export const LEVEL_SKY = { film: 17, skyLoss: 63, correction: -4 } as const;

/**
 * EN ISO 6946:2007, Annex A (from memory): external surface resistance [m²·K/W] at wind speed [m/s], ε = 0.9,
 * printed to 0.01.
 */
export const SURFACE_RESISTANCES = [
  { wind: 1, resistance: 0.08 },
  { wind: 2, resistance: 0.06 },
  { wind: 3, resistance: 0.05 },
  { wind: 4, resistance: 0.04 },
  { wind: 5, resistance: 0.04 },
  { wind: 7, resistance: 0.03 },
  { wind: 10, resistance: 0.02 },
] as const;

/** JCSS Probabilistic Model Code, part 2, thermal actions: film coefficients of concrete [W/(m²·K)]. */
export const CONCRETE_FILM = { least: 14, most: 57 } as const;

/**
 * EN 1991-1-5:2003, Table 5.2 (from memory), 45 to 55° N: how far outer surfaces stand over the summer's highest air
 * temperature [K]. For south-west facing or level surfaces and for north-east facing ones.
 */
export const SURFACE_RISES = [
  { absorptance: 0.5, southWest: 18, northEast: 0 },
  { absorptance: 0.7, southWest: 30, northEast: 2 },
  { absorptance: 0.9, southWest: 42, northEast: 4 },
] as const;
