/**
 * Textbook examples of bars kept from expanding. Length mm, area mm², modulus MPa, force N unless stated; a fall or
 * rise of temperature in K (or °F with a coefficient in 1/°F).
 */

/** One bar held rigidly at both ends: stress = −Eα·ΔT, in the units of the modulus. */
export const HELD_BARS = [
  {
    // Hibbeler, Mechanics of Materials, 8th ed., Ex. 4.10 (from memory): A-36, 29e3 ksi, 60 to 120 °F
    name: 'Hibbeler 4.10 [ksi]',
    modulus: 29_000,
    expansion: 6.6e-6,
    rise: 60,
    stress: 11.5,
    digits: 1,
  },
  {
    // Hibbeler, SI edition, Ex. 4.10 (from memory): 200 GPa, 30 to 60 °C
    name: 'Hibbeler SI 4.10 [MPa]',
    modulus: 200_000,
    expansion: 12e-6,
    rise: 30,
    stress: 72,
    digits: 1,
  },
  {
    // Gere, Mechanics of Materials, Prob. 2.5-1 (from memory): rails, 30e6 psi, 60 to 120 °F
    name: 'Gere 2.5-1 [ksi]',
    modulus: 30_000,
    expansion: 6.5e-6,
    rise: 60,
    stress: 11.7,
    digits: 3,
  },
  {
    // Brown University, ENGN0310 notes, thermal solved problems 1 to 3 (inputs read there, stress recomputed)
    name: 'Brown ENGN0310 [MPa]',
    modulus: 100_000,
    expansion: 12e-6,
    rise: 70,
    stress: 84,
    digits: 1,
  },
  {
    // OpenStax, University Physics vol. 2, 1.3 (module m58386; numbers from memory): concrete, 5 to 38 °C
    name: 'OpenStax thermal stress [MPa]',
    modulus: 20_000,
    expansion: 12e-6,
    rise: 33,
    stress: 7.9,
    digits: 1,
  },
] as const;

/** Hibbeler SI ed., Ex. 4.10 (from memory): 10 × 10 mm bar, force [N]. */
export const HIBBELER_FORCE = { area: 100, force: 7200 } as const;

/** Brown University, ENGN0310 notes, thermal solved problem 1: 2 m bar, 10 to 80 °C, free to move 1.68 mm. */
export const BROWN_FREE = { length: 2000, expansion: 12e-6, rise: 70, movement: 1.68 } as const;

/** OpenStax, University Physics vol. 2, 1.3 (numbers from memory): a bridge of 1275 m, −15 to 40 °C, 0.84 m. */
export const FREE_BRIDGE = {
  length: 1_275_000,
  expansion: 12e-6,
  rise: 55,
  movement: 840,
} as const;

/** Bhandari, Design of Machine Elements, Ex. 4.22 (Fig. 4.70): steel tube that closes a gap, 25 to 250 °C. Answer from memory. */
export const TUBE_WITH_GAP = {
  modulus: 207_000,
  expansion: 10.8e-6,
  length: 200,
  area: 300,
  gap: 0.15,
  rise: 225,
  stress: 347.76,
  force: 104_300,
} as const;

/** Beer & Johnston, Mechanics of Materials, 6th ed., Prob. 2.60 (from memory): aluminium and stainless, gap between, 20 to 140 °C. */
export const TWO_BARS_WITH_GAP = {
  aluminium: { length: 300, area: 2000, modulus: 75_000, expansion: 23e-6 },
  stainless: { length: 250, area: 800, modulus: 190_000, expansion: 17.3e-6 },
  gap: 0.5,
  rise: 120,
  force: 232_400,
  aluminiumStress: 116.2,
  aluminiumLengthChange: 0.363,
} as const;

/** Scilab textbook companion 3862, Ex. 8.29 (inputs read there, answers recomputed): steel between two coppers, +80 K. */
export const COMPOSITE_PLATE = {
  steel: { area: 500, modulus: 200_000, expansion: 12e-6 },
  copper: { areaEach: 200, modulus: 100_000, expansion: 17e-6 },
  length: 1000,
  rise: 80,
  copperForceEach: 5714,
  copperStress: -28.57,
  steelStress: 22.86,
  lengthChange: 1.07,
} as const;
