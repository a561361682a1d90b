import { filterSpectrum, gateSpectrum } from '../counting/gate.ts';
import type { RangeBin, Spectrum } from '../model.ts';
import { cyclesToFailure } from './cycles-to-failure.ts';
import type { DamageTable } from './damage-table.ts';
import { actingTable, cyclesOf, damageOf, type SeriesUse, unfactoredGate } from './miner.ts';

/** Most bins in a table; round widths make it this many or down to half as many. */
const MOST_BINS = 24;

/** Round widths within a decade. */
const ROUND = [1, 2, 2.5, 5, 10];

/**
 * The cycles table of one series: equal bins of a round width from 0 to over the largest range, each
 * with its cycles and their damage, so that the bins' damage adds up to the Miner sum.
 *
 * @param spectrum the series' ranges, unfactored, in the series' unit
 * @param use curve, factors and gate, as for `minerDamage`
 * @param shown turns the series' unit into the bins', such as MPa per N; default 1
 * @returns bins of unfactored range, from ≤ range < to, in the bins' unit, smallest first; none
 *   without a cycle
 */
export function rangeBins(spectrum: Spectrum, use: SeriesUse, shown = 1): RangeBin[] {
  const { kept } = gateSpectrum(spectrum, unfactoredGate(use));
  const { ranges, halfRanges, added } = kept;
  const lists = [ranges, halfRanges, ...(added === undefined ? [] : [added.ranges])];
  const largest = shown * Math.max(...lists.map(largestOf));
  if (largest === 0) return [];
  const width = roundWidth(largest / MOST_BINS);
  const table = actingTable(spectrum, use);
  return Array.from({ length: Math.floor(largest / width) + 1 }, (_, bin) => {
    const part = filterSpectrum(kept, (range) => Math.floor((shown * range) / width) === bin);
    const damage = damageOf(part, table, use).sum;
    return {
      from: bin * width,
      to: (bin + 1) * width,
      count: cyclesOf(part),
      cyclesToFailure: cyclesAt(((bin + 0.5) * width) / shown, table, use),
      damage: use.table === null ? null : damage,
    };
  });
}

/** Cycles to failure at an unfactored range in the series' unit. */
function cyclesAt(range: number, table: DamageTable | null, use: SeriesUse): number | null {
  if (use.table === null) return null;
  const factored = range * use.table.factor * use.scale;
  return cyclesToFailure(use.table.curve, factored, table !== null);
}

function largestOf(ranges: Float64Array): number {
  return ranges.reduce((largest, range) => Math.max(largest, range), 0);
}

/** The smallest round number that is no less than `least`. */
function roundWidth(least: number): number {
  const decade = 10 ** Math.floor(Math.log10(least));
  return decade * ROUND.find((round) => round * decade >= least)!;
}
