/**
 * M. J. Wichura, Algorithm AS 241, Applied Statistics 37 (1988), test values printed with the routine (from memory),
 * to 15 digits.
 */
export const AS241_VALUES = [
  { p: 0.25, z: -0.67448975019608 },
  { p: 0.001, z: -3.09023230616781 },
  { p: 1e-20, z: -9.26234008979841 },
];

/** Percentage points of the normal distribution as any statistics table prints them (from memory). */
export const TABLE_VALUES = [
  { p: 0.5, z: 0 },
  { p: 0.9, z: 1.2816 },
  { p: 0.95, z: 1.6449 },
  { p: 0.975, z: 1.96 },
  { p: 0.977, z: 1.9954 },
  { p: 0.99, z: 2.3263 },
  { p: 0.999, z: 3.0902 },
];
