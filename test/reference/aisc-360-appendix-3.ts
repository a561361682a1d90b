/**
 * ANSI/AISC 360-22, Appendix 3, 3.3: F_SR = 1000 (C_f/n)^0.333 ≥ F_TH [ksi] (A-3-1) and, for category F,
 * 100 (1.5/n)^0.167 ≥ 8 ksi (A-3-2). Allowable stress range in ksi at n cycles before the threshold, worked out by
 * hand from the equations; `meets` is the n at which it falls to F_TH. C_f and F_TH: Table A-3.1 (those of category G
 * from memory).
 */
export const AISC_RANGES = [
  {
    category: 'A',
    threshold: 24,
    ranges: { 2e4: 107.96, 1e5: 63.17, 5e5: 36.96, 2e6: 23.3, 1e7: 13.63 },
    meets: 1.829e6,
  },
  {
    category: 'B',
    threshold: 16,
    ranges: { 2e4: 84.55, 1e5: 49.47, 5e5: 28.95, 2e6: 18.24, 1e7: 10.67 },
    meets: 2.966e6,
  },
  {
    category: "B'",
    threshold: 12,
    ranges: { 2e4: 67.5, 1e5: 39.49, 5e5: 23.11, 2e6: 14.56, 1e7: 8.52 },
    meets: 3.577e6,
  },
  {
    category: 'C',
    threshold: 10,
    ranges: { 2e4: 60.54, 1e5: 35.42, 5e5: 20.73, 2e6: 13.06, 1e7: 7.64 },
    meets: 4.461e6,
  },
  {
    category: 'E',
    threshold: 4.5,
    ranges: { 2e4: 38.15, 1e5: 22.32, 5e5: 13.06, 2e6: 8.23, 1e7: 4.82 },
    meets: 1.227e7,
  },
  {
    category: 'F',
    threshold: 8,
    ranges: { 2e4: 20.47, 1e5: 15.65, 2e6: 9.49, 1e7: 7.25 },
    meets: null,
  },
] as const;

/**
 * ANSI/AISC 360-10 and before, Appendix 3: F_SR = (C_f/n)^0.333 ksi, and (C_f/n)^0.167 for F; C_f from its Table
 * A-3.1 (G from memory), thresholds in ksi. `larger`: its C_f over that of 360-22. The editions differ by 0.7 % (F:
 * 0.9 %) since the exponents are printed 0.333 and 0.167 and not 1/3 and 1/6.
 */
export const AISC_OLD_FORM = [
  { category: 'A', constant: 250e8, exponent: 0.333, larger: 1e9, threshold: 24 },
  { category: 'B', constant: 120e8, exponent: 0.333, larger: 1e9, threshold: 16 },
  { category: "B'", constant: 61e8, exponent: 0.333, larger: 1e9, threshold: 12 },
  { category: 'C', constant: 44e8, exponent: 0.333, larger: 1e9, threshold: 10 },
  { category: 'D', constant: 22e8, exponent: 0.333, larger: 1e9, threshold: 7 },
  { category: 'E', constant: 11e8, exponent: 0.333, larger: 1e9, threshold: 4.5 },
  { category: "E'", constant: 3.9e8, exponent: 0.333, larger: 1e9, threshold: 2.6 },
  { category: 'F', constant: 150e10, exponent: 0.167, larger: 1e12, threshold: 8 },
  { category: 'G', constant: 3.9e8, exponent: 0.333, larger: 1e9, threshold: 7 },
] as const;

/** The same for category C at 1e5 cycles, worked out by hand [ksi]. */
export const AISC_OLD_C = { cycles: 1e5, range: 35.18 };
