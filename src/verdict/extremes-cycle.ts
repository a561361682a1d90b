import type { RainflowCounter } from '../counting/rainflow.ts';
import { followRecord } from '../mechanics/history.ts';
import { strainPath } from '../mechanics/strain-path.ts';
import type { Run, Spectrum } from '../model.ts';
import { createPassCounters, type PassCounters } from './pass-counters.ts';
import { type RunExtreme, runChain } from './run-chain.ts';
import type { RunScene } from './run-scene.ts';

/** What one way from the hottest extreme to the coldest and back does to a run. */
export interface ExtremesCycle {
  /** Names of the extremes with the largest and the smallest mismatch strain. */
  readonly hot: string;
  readonly cold: string;
  /** The forces' cycles once the way has settled. */
  readonly counters: PassCounters;
}

/**
 * Follows a run to and fro between its hottest and its coldest extreme until it has settled, as a record of these two
 * samples that repeats.
 *
 * @param extremes that the run feels
 * @returns `null` where they are not two different ones
 */
export function extremesCycle(run: Run, extremes: readonly RunExtreme[]): ExtremesCycle | null {
  if (extremes.length < 2) return null;
  const hot = extremes.reduce((a, b) => (b.strain > a.strain ? b : a));
  const cold = extremes.reduce((a, b) => (b.strain < a.strain ? b : a));
  if (hot.strain === cold.strain) return null;
  const counters = createPassCounters(run.roles.length, run.member.curve?.compressionShare ?? 1);
  const path = strainPath(Float64Array.of(hot.strain, cold.strain));
  followRecord(runChain(run), path, { extremes: [], residue: 'repeat' }, counters);
  return { hot: hot.name, cold: cold.name, counters };
}

/** A counted spectrum with one cycle between the extremes a year added, where the job wants that. */
export function withExtremesCycle(
  counted: Spectrum,
  { extremesCycle: cycle, years, noise }: RunScene,
  of: (counters: PassCounters) => RainflowCounter,
): Spectrum {
  const { ranges, halfRanges } = counted;
  if (cycle === null) return { ranges, halfRanges };
  const added = { ranges: of(cycle.counters).finish('repeat', noise).ranges, count: years };
  return { ranges, halfRanges, added };
}
