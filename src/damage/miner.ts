import { gateSpectrum } from '../counting/gate.ts';
import type { Damage, Spectrum } from '../model.ts';
import { slopeAt } from './cycles-to-failure.ts';
import { type DamageSum, sumDamage } from './damage-cells.ts';
import type { DamageTable } from './damage-table.ts';
import { rangeAtCycles } from './range-at-cycles.ts';

/** How one series' ranges meet a curve. */
export interface SeriesUse {
  /** The curve with its factors γ; `null` without a curve, so that cycles are counted only. */
  readonly table: DamageTable | null;
  /** Turns the series' unit into the curve's: 1, or MPa per N. */
  readonly scale: number;
  /**
   * Cycles whose factored range γS is under this are dropped [series' unit]; 0 drops none. Without a
   * curve no factor applies.
   */
  readonly gate: number;
}

/**
 * Miner sum of one series, D = Σ n/N(γS), and the range that does the same damage.
 *
 * A half cycle is n = 0.5. M. A. Miner, Cumulative damage in fatigue, Journal of Applied Mechanics 12
 * (1945), A159–A164.
 *
 * @param spectrum the series' ranges, unfactored, in the series' unit
 * @param use curve, factors and gate
 * @returns damage and cycles; the equivalent range S, N(γS) = n_d/D, in the series' unit
 */
export function minerDamage(spectrum: Spectrum, use: SeriesUse): Damage {
  const { kept, dropped } = gateSpectrum(spectrum, unfactoredGate(use));
  const table = actingTable(spectrum, use);
  const done = damageOf(kept, table, use);
  return {
    sum: use.table === null ? null : done.sum,
    cycles: cyclesOf(kept),
    damagingCycles: done.damaging,
    ...equivalentOf(done, table, use),
    gatedCycles: cyclesOf(dropped),
    gatedDamage: damageOf(dropped, table, use).sum,
  };
}

/**
 * The table that a series is summed by: `null` without a curve, and where every factored range of the
 * series, gated ones too, stays under a curve's threshold.
 *
 * @param spectrum the series' ranges, unfactored
 * @param use curve and factors
 */
export function actingTable(spectrum: Spectrum, use: SeriesUse): DamageTable | null {
  const { table } = use;
  if (table === null || table.curve.below !== 'threshold') return table;
  const factor = table.factor * use.scale;
  const reaches = (range: number) => factor * range >= table.curve.limitRange;
  const { ranges, halfRanges, added } = spectrum;
  const acts = ranges.some(reaches) || halfRanges.some(reaches) || added?.ranges.some(reaches);
  return acts ? table : null;
}

/** The gate on unfactored ranges [series' unit]. */
export function unfactoredGate({ table, gate }: SeriesUse): number {
  return table === null ? gate : gate / table.factor;
}

/** Whole cycles, half cycles as 0.5, and those that were added. */
export function cyclesOf({ ranges, halfRanges, added }: Spectrum): number {
  const more = added === undefined ? 0 : added.count * added.ranges.length;
  return ranges.length + 0.5 * halfRanges.length + more;
}

/**
 * Miner sum of part of a series.
 *
 * @param spectrum the part's ranges, unfactored
 * @param table the series' acting table; `null` sums to 0
 * @param use curve and factors
 */
export function damageOf(spectrum: Spectrum, table: DamageTable | null, use: SeriesUse): DamageSum {
  if (table === null) return { sum: 0, damaging: 0 };
  const sumOf = (ranges: Float64Array) => sumDamage(table.cells, ranges, table.factor * use.scale);
  const { ranges, halfRanges, added } = spectrum;
  const parts = [
    { count: 1, ...sumOf(ranges) },
    { count: 0.5, ...sumOf(halfRanges) },
    ...(added === undefined ? [] : [{ count: added.count, ...sumOf(added.ranges) }]),
  ];
  return {
    sum: parts.reduce((total, { count, sum }) => total + count * sum, 0),
    damaging: parts.reduce((total, { count, damaging }) => total + count * damaging, 0),
  };
}

function equivalentOf(
  done: DamageSum,
  table: DamageTable | null,
  use: SeriesUse,
): Pick<Damage, 'equivalentRange' | 'slope'> {
  const cycles = done.damaging / done.sum;
  if (table === null || !Number.isFinite(cycles)) return { equivalentRange: null, slope: null };
  const factored = rangeAtCycles(table.curve, cycles);
  return {
    equivalentRange: factored / (table.factor * use.scale),
    slope: slopeAt(table.curve, factored),
  };
}
