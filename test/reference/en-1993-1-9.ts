/**
 * EN 1993-1-9:2005. Rules: 7.1(2), (3), Fig. 7.1 and 7.2 (shear from memory): category at 2e6 cycles; direct stress
 * m = 3 to 5e6 and 5 to 1e8; shear stress m = 5 to 1e8; below 1e8 no damage.
 */

/** Ratios of 7.1(2), (3) and Fig. 7.2 as the standard rounds them; the exact ones are (2/5)^(1/3) and so on. */
export const EN_RATIOS = { constantAmplitude: 0.737, cutoffToConstant: 0.549, shearCutoff: 0.457 };

/** Endurance worked out by hand from those rules with the exact ratios; `null` is below the cut-off. */
export const EN_ENDURANCE = [
  {
    shape: 'EN 1993-1-9 direct 36',
    cutoff: 14.57,
    cycles: {
      200: 11_664,
      150: 27_648,
      100: 93_312,
      71: 260_713,
      60: 432_000,
      50: 746_496,
      40: 1_458_000,
      30: 3_456_000,
      20: 20_516_307,
    },
  },
  {
    shape: 'EN 1993-1-9 direct 71',
    cutoff: 28.735,
    cycles: {
      200: 89_478,
      150: 212_095,
      100: 715_822,
      71: 2_000_000,
      60: 3_313_991,
      50: 6_268_713,
      40: 19_130_593,
      30: 80_616_164,
      20: null,
    },
  },
  {
    shape: 'EN 1993-1-9 direct 100',
    cutoff: 40.471,
    cycles: {
      200: 250_000,
      150: 592_593,
      100: 2_000_000,
      71: 6_017_899,
      60: 13_963_054,
      50: 34_744_545,
      40: null,
    },
  },
  {
    shape: 'EN 1993-1-9 shear 100',
    cutoff: 45.731,
    cycles: { 200: 62_500, 100: 2_000_000, 60: 25_720_165, 45: null },
  },
] as const;
