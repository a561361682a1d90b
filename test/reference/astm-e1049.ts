/**
 * Rainflow sequences with known answers. Counts by range, a half cycle as 0.5.
 *
 * ASTM E1049-85: the history of Fig. 6 (5.4.4) and the same as one block of a repeating history, Fig. 7 (5.4.5;
 * its counts from memory). The sequence with zeros at its ends is test data of the PyPI library `rainflow`.
 */
export const E1049 = [
  {
    name: 'Fig. 6, open',
    series: [-2, 1, -3, 5, -1, 3, -4, 4, -2],
    residue: 'half',
    counts: { 3: 0.5, 4: 1.5, 6: 0.5, 8: 1, 9: 0.5 },
  },
  {
    // That library drops the two end points before it counts and gives the counts of Fig. 6; 5.4.4 keeps
    // them, so each end adds half a cycle of 2.
    name: 'Fig. 6 with zeros at both ends, open',
    series: [0, -2, 1, -3, 5, -1, 3, -4, 4, -2, 0],
    residue: 'half',
    counts: { 2: 1, 3: 0.5, 4: 1.5, 6: 0.5, 8: 1, 9: 0.5 },
  },
  {
    name: 'Fig. 7, restarted at its largest peak',
    series: [5, -1, 3, -4, 4, -2, 1, -3, 5],
    residue: 'repeat',
    counts: { 3: 1, 4: 1, 7: 1, 9: 1 },
  },
  {
    name: 'Fig. 7, as one block of a repeating history',
    series: [-2, 1, -3, 5, -1, 3, -4, 4],
    residue: 'repeat',
    counts: { 3: 1, 4: 1, 7: 1, 9: 1 },
  },
  // Self-evident.
  { name: 'one closed rise', series: [0, 10, 0], residue: 'repeat', counts: { 10: 1 } },
  { name: 'two samples', series: [1, 5], residue: 'half', counts: { 4: 0.5 } },
] as const;

/**
 * Four-point method: cycles that close and what stays open. Test data of the open-source C library a-ma72/rainflow
 * ("small sample" and the shortest case); the library cites the FVA counting guideline (2010) and Köhler, Jenne,
 * Pötter and Zenner (2012).
 */
export const FOUR_POINT = [
  {
    series: [2, 5, 3, 6, 2, 4, 1, 6, 1, 4, 1, 5, 3, 6, 3, 6, 1, 5, 2],
    counts: { 2: 3, 3: 2, 5: 2 },
    open: [2, 6, 1, 5, 2],
  },
  { series: [1, 3, 2, 4], counts: { 1: 1 }, open: [1, 4] },
] as const;
