/** Published values of the sun's light and its parts. Irradiance in W/m², angles in degrees. */

/** Erbs split, from the test data of the open-source library pvlib (1 January 2019), which compares to 1 W/m². */
export const ERBS_SPLITS = [
  { global: 50, zenith: 85, clearness: 0.405723511, diffuse: 41.5703604, direct: 96.7192672 },
  { global: 1000, zenith: 10, clearness: 0.718132729, diffuse: 217.860117, direct: 794.205651 },
] as const;

/** Outside the atmosphere on 26 October 2016, from the test data of pvlib: several formulas agree to ±10. */
export const EXTRATERRESTRIAL = { dayOfYear: 300, irradiance: 1383.636, tolerance: 10 } as const;

/** Diffuse of an equally bright sky on a tilted surface, from the test data of pvlib. */
export const ISOTROPIC_SKY = { tilt: 40, diffuse: 100, irradiance: 88.30222215594891 } as const;

/** Thrown back by the ground, from the test data of pvlib. */
export const GROUND = [
  { tilt: 40, global: 900, albedo: 0.25, irradiance: 26.32000014911496 },
  { tilt: 45, global: 1000, albedo: 0.2, irradiance: 29.289 },
] as const;

/**
 * Duffie and Beckman, Solar Engineering of Thermal Processes, Ex. 2.15.1 (from memory): 40° N, 9 to 10 h solar time on
 * 20 February, slope 60° to the south. Energies in MJ/m² in the hour.
 */
export const TEXTBOOK_HOUR = {
  latitude: 40,
  /** Of 20 February, by the book's formula for the 51st day. */
  declination: -11.6,
  /** Of 9:30. */
  hourAngle: -37.5,
  tilt: 60,
  albedo: 0.6,
  global: 1.04,
  outside: 2.34,
  clearness: 0.445,
  diffuse: 0.796,
  beam: 0.244,
  beamRatio: 1.71,
  fromBeam: 0.417,
  fromSky: 0.597,
  fromGround: 0.156,
  total: 1.17,
} as const;
