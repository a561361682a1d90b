/**
 * Aluminum Design Manual, Part I, Appendix 3 (2010 and later), from memory: S_rd = C_f·N^(−1/m) to N = 5e6, where it
 * meets the constant-amplitude fatigue limit. Ranges in ksi; those at 1e5 and 1e6 worked out by hand.
 */
export const ADM_DETAILS = [
  { detail: 'A', factor: 96.5, slope: 6.85, limit: 10.2, ranges: { 1e5: 17.97, 1e6: 12.84 } },
  { detail: 'B', factor: 130, slope: 4.84, limit: 5.4, ranges: { 1e5: 12.05, 1e6: 7.49 } },
  { detail: 'C', factor: 278, slope: 3.64, limit: 4, ranges: { 1e5: 11.76, 1e6: 6.25 } },
  { detail: 'D', factor: 157, slope: 3.73, limit: 2.5, ranges: { 1e5: 7.17, 1e6: 3.87 } },
  { detail: 'E', factor: 160, slope: 3.45, limit: 1.8, ranges: { 1e5: 5.69, 1e6: 2.92 } },
  { detail: 'F', factor: 174, slope: 3.42, limit: 1.9, ranges: { 1e5: 6.01, 1e6: 3.06 } },
] as const;
