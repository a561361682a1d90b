/**
 * ANSI/AISC 360, section E3, E = 29 000 ksi: AISC Manual Table 4-14 (4-22 in older editions), available
 * critical stress of compression members. From memory; the rows agree with equations (E3-2) to (E3-4).
 */
export const MODULUS_KSI = 29_000;

/** L_c/r [1], F_e, F_cr at F_y = 50 and at 36 ksi [ksi, two decimals], φF_cr [ksi, three figures]. */
export const CRITICAL_STRESS = [
  { slenderness: 40, fe: 178.89, fcr50: 44.48, phi50: 40.0, fcr36: 33.09, phi36: 29.8 },
  { slenderness: 60, fe: 79.51, fcr50: 38.43, phi50: 34.6, fcr36: 29.78, phi36: 26.8 },
  { slenderness: 80, fe: 44.72, fcr50: 31.31, phi50: 28.2, fcr36: 25.7, phi36: 23.1 },
  { slenderness: 100, fe: 28.62, fcr50: 24.07, phi50: 21.7, fcr36: 21.27, phi36: 19.1 },
  { slenderness: 120, fe: 19.88, fcr50: 17.43, phi50: 15.7, fcr36: 16.87, phi36: 15.2 },
  { slenderness: 160, fe: 11.18, fcr50: 9.81, phi50: 8.82, fcr36: 9.81, phi36: 8.82 },
  { slenderness: 200, fe: 7.16, fcr50: 6.28, phi50: 5.65, fcr36: 6.28, phi36: 5.65 },
] as const;

/** W14×90 of 50 ksi, AISC Design Examples, E.1 series: P_n and φP_n, three figures [kip]. From memory. */
export const W14X90 = { slenderness: 58.6, area: 26.5, yield: 50, pn: 1030, phiPn: 928 } as const;

/** φ of compression, E1. From memory. */
export const PHI = 0.9;

/** L_c/r at which the inelastic range ends, 4.71 √(E/F_y), E3. From memory. F_y [ksi]. */
export const LIMIT_SLENDERNESS = [
  { yield: 50, slenderness: 113.4 },
  { yield: 36, slenderness: 133.7 },
] as const;
