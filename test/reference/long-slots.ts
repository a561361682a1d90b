/** AISC 360-22, Table J3.3M, long-slotted holes: bolt diameter and length of the slot [mm] [from memory]. */
export const LONG_SLOTS_AISC: readonly (readonly [diameter: number, length: number])[] = [
  [12, 30],
  [16, 40],
  [20, 50],
  [22, 55],
  [24, 60],
  [27, 67],
  [30, 75],
];

/** EN 1090-2:2018, Table 11: a long slot is longer than its bolt by 1.5 d [mm] [from memory]. */
export function longSlotEn(diameter: number): number {
  return 2.5 * diameter;
}
