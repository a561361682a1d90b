import type { UnitSystem } from '../../units.ts';
import type { SpacingRow } from '../../verdict/spacing-row.ts';
import type { SpacingCase } from '../../verdict/spacings.ts';
import { cellNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { FixedTicks } from './fixed-ticks.ts';
import { axis, TICKS } from './theme.ts';

/** More numbers of fasteners than these would run together along the top. */
const MOST_COUNTS = 14;

/** Where a row stands along the x axis, in the units of the job. */
export function spacingOf({ spacing }: SpacingRow, units: UnitSystem): number {
  return inUnits(spacing, 'length', units);
}

/** From the closest spacing to the widest, with a little room. */
export function spacingReach(rows: readonly SpacingRow[], units: UnitSystem) {
  const first = spacingOf(rows[0], units);
  const last = spacingOf(rows[rows.length - 1], units);
  const room = last > first ? (last - first) * 0.03 : first * 0.1;
  return { min: first - room, max: last + room };
}

/** Spacing along the foot, and the number of fasteners along the top. */
export function spacingScales(rows: readonly SpacingRow[], units: UnitSystem) {
  const reach = spacingReach(rows, units);
  return {
    x: axis(`Spacing [${unitOf('length', units)}]`, {
      ...reach,
      ticks: { ...TICKS, includeBounds: false },
    }),
    count: axis('Number of fasteners', {
      ...reach,
      axis: 'x',
      position: 'top',
      grid: { display: false },
    }),
  };
}

/** The number of fasteners at each spacing, thinned where there are many. */
export function countTicks(rows: readonly SpacingRow[], units: UnitSystem): FixedTicks {
  const { min, max } = spacingReach(rows, units);
  const apart = (max - min) / MOST_COUNTS;
  const ticks: { value: number; label: string }[] = [];
  // from the widest down, where the counts stand furthest apart
  for (const row of [...rows].reverse()) {
    const value = spacingOf(row, units);
    const last = ticks.at(-1)?.value ?? Number.POSITIVE_INFINITY;
    if (last - value >= apart) ticks.push({ value, label: String(row.count) });
  }
  return ticks;
}

/** Start of the name of a case's pictures, such as `R2-middle-2-pieces`. */
export function caseName({ run, arrangement, cut }: SpacingCase, units: UnitSystem): string {
  const start = `${run.id}-${arrangement}`;
  if ('longest' in cut) {
    const longest = cellNumber(inUnits(cut.longest, 'length', units));
    return `${start}-pieces-up-to-${longest}-${unitOf('length', units)}`;
  }
  return cut.pieces === 1 ? start : `${start}-${cut.pieces}-pieces`;
}
