import { type CountedSeries, createRainflow } from '../../src/counting/rainflow.ts';
import type { Residue, Spectrum } from '../../src/model.ts';
import type { LiteralCycle } from './literal-rainflow.ts';

/** A series counted in one push. */
export function counted(series: ArrayLike<number>, residue: Residue, floor = 0): CountedSeries {
  const counter = createRainflow();
  counter.push(Float64Array.from(series), 0, 1, series.length);
  return counter.finish(residue, floor);
}

/** Every half cycle's range, two to a whole cycle, smallest first. */
export function halvesOf({ ranges, halfRanges }: Spectrum): number[] {
  return [...ranges, ...ranges, ...halfRanges].sort((a, b) => a - b);
}

/** The same of the literal count, over any measure of a cycle. */
export function literalHalves(
  cycles: readonly LiteralCycle[],
  rangeOf = ({ from, to }: LiteralCycle) => Math.abs(to - from),
): number[] {
  return cycles
    .flatMap((cycle) => new Array<number>(2 * cycle.weight).fill(rangeOf(cycle)))
    .sort((a, b) => a - b);
}

/** Counts by range, a half cycle as 0.5. */
export function countsByRange(spectrum: Spectrum): Record<string, number> {
  const counts: Record<string, number> = {};
  for (const range of halvesOf(spectrum)) counts[range] = (counts[range] ?? 0) + 0.5;
  return counts;
}
