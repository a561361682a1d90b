/**
 * Bhandari, Design of Machine Elements, ch. 5, cumulative-damage example (from memory, recomputed): fully reversed
 * bending of a bar, stress amplitudes in N/mm², a straight S-N line from 0.9 × 660 at 1e3 to 280 at 1e6 cycles. The
 * book prints a combined life of about 62 720 cycles.
 */
export const BHANDARI = {
  cycles: [1e3, 1e6],
  amplitudes: [0.9 * 660, 280],
  blocks: [
    { share: 85, amplitude: 350, life: 128_797 },
    { share: 12, amplitude: 400, life: 37_780 },
    { share: 3, amplitude: 500, life: 4_866 },
  ],
  life: 62_730,
};

/** Worked out by hand from the rules of EN 1993-1-9:2005, 7.1 and 8, for detail category 71 (not published). */
export const CATEGORY_71 = {
  shape: 'EN 1993-1-9 direct 71',
  blocks: [
    { range: 100, cycles: 1e5, damage: 0.1397 },
    { range: 60, cycles: 1e6, damage: 0.301751 },
    { range: 40, cycles: 3e6, damage: 0.156817 },
    { range: 25, cycles: 1e7, damage: 0 },
  ],
  sum: 0.598267,
};
