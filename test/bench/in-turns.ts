/** One line of the benchmark: how many times the baseline's time something takes. */
export interface BenchRow {
  readonly name: string;
  /** Median time over median time of the baseline, both measured in turns. */
  readonly ratio: number;
  /** The ratio that it should stay under; `null` where it is only reported. */
  readonly goal: number | null;
  /** Median time of the thing itself [ms]. */
  readonly milliseconds: number;
}

/** Something to time, by name, with its goal as a multiple of the baseline. */
export interface Contender {
  readonly name: string;
  readonly goal: number | null;
  readonly run: () => void;
}

/**
 * Times the contenders and their baseline in turns (A B C, A B C, …), so that a machine that slows down slows all, and
 * gives the ratios of the medians.
 *
 * @param baseline what the others are measured against
 * @param contenders what is measured
 * @param rounds rounds that count, after two that warm up
 */
export function inTurns(
  baseline: () => void,
  contenders: readonly Contender[],
  rounds = 9,
): BenchRow[] {
  const all = [baseline, ...contenders.map(({ run }) => run)];
  const times: number[][] = all.map(() => []);
  for (let round = -2; round < rounds; round++) {
    for (const [i, run] of all.entries()) {
      const start = performance.now();
      run();
      if (round >= 0) times[i].push(performance.now() - start);
    }
  }
  const [base, ...medians] = times.map(median);
  return contenders.map(({ name, goal }, i) => ({
    name,
    goal,
    ratio: medians[i] / base,
    milliseconds: medians[i],
  }));
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[sorted.length >> 1];
}
