/**
 * EN 1993-1-1:2005, 6.3.1.2: reduction factor χ over the slenderness λ̄, buckling curves a0 … d (plateau 0.2).
 * The imperfection factors (Table 6.1) and the rows 0.5, 1.0 and 2.0 stand in the published ECCS/Eurocode
 * table of buckling curves: from memory. The other rows are worked from equations (6.49) and (6.50).
 */
export const PLATEAU = 0.2;
export const IMPERFECTION = { a0: 0.13, a: 0.21, b: 0.34, c: 0.49, d: 0.76 } as const;
export type BucklingCurve = keyof typeof IMPERFECTION;

/** λ̄ and χ of each curve, four decimals. */
export const REDUCTION_FACTORS = [
  { slenderness: 0.2, a0: 1, a: 1, b: 1, c: 1, d: 1 },
  { slenderness: 0.3, a0: 0.9859, a: 0.9775, b: 0.9641, c: 0.9491, d: 0.9235 },
  { slenderness: 0.5, a0: 0.9513, a: 0.9243, b: 0.8842, c: 0.843, d: 0.7793 },
  { slenderness: 1.0, a0: 0.7253, a: 0.6656, b: 0.597, c: 0.5399, d: 0.4671 },
  { slenderness: 1.5, a0: 0.3953, a: 0.3724, b: 0.3422, c: 0.3145, d: 0.2766 },
  { slenderness: 2.0, a0: 0.2323, a: 0.2229, b: 0.2095, c: 0.1962, d: 0.1766 },
] as const;

/** λ₁ = 93.9 √(235/f_y), 6.3.1.3: the L/i at which λ̄ = 1, E = 210 000 MPa. f_y [MPa]. */
export const LAMBDA_1 = [
  { yield: 235, lambda1: 93.9 },
  { yield: 275, lambda1: 86.8 },
  { yield: 355, lambda1: 76.4 },
] as const;
