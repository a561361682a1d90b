/**
 * A heated bar on a rigid base, held by n equal fasteners of stiffness k at equal spacing s. With K = EA/s and the free
 * expansion of a span e = α·ΔT·s: shear of each fastener of one half, from the end, and the largest bar force, over K·e.
 * Worked by hand from the equations of compatibility of a uniform fastener row (NACA TN 1051 and TN 1458, cited from
 * memory); exact fractions where short, otherwise four decimals.
 */
export const HEATED_ROW = [
  { count: 2, ratio: 0.1, shears: [1 / 21], largest: 1 / 21 },
  { count: 2, ratio: 1, shears: [1 / 3], largest: 1 / 3 },
  { count: 2, ratio: 10, shears: [5 / 6], largest: 5 / 6 },
  { count: 3, ratio: 0.1, shears: [1 / 11, 0], largest: 1 / 11 },
  { count: 3, ratio: 1, shears: [1 / 2, 0], largest: 1 / 2 },
  { count: 3, ratio: 10, shears: [10 / 11, 0], largest: 10 / 11 },
  { count: 4, ratio: 0.1, shears: [0.1286, 0.0415], largest: 0.1701 },
  { count: 4, ratio: 1, shears: [4 / 7, 1 / 7], largest: 5 / 7 },
  { count: 4, ratio: 10, shears: [0.9155, 0.0704], largest: 0.9859 },
] as const;
