import { chainBench } from './chain.bench-part.ts';
import { countingBench } from './counting.bench-part.ts';
import type { BenchRow } from './in-turns.ts';
import { jobsBench } from './jobs.bench-part.ts';
import { recordsBench } from './records.bench-part.ts';
import { remediesBench } from './remedies.bench-part.ts';
import { spacingsBench } from './spacings.bench-part.ts';
import { sunBench } from './sun.bench-part.ts';

const parts: readonly (readonly [string, () => BenchRow[]])[] = [
  ['Counting and damage, against summing the same array', countingBench],
  ['Chain, against 8,760 bare tridiagonal solves', chainBench],
  ['Whole jobs, against node -e 0', jobsBench],
  ['Long records, against reading and hashing their bytes', recordsBench],
  ['Comparing spacings, against 2 s', spacingsBench],
  ['Thirty years of sun, against reading the weather file', sunBench],
  ['Remedies, against the 5 s that they may take', remediesBench],
];

for (const [title, part] of parts) {
  console.log(title);
  for (const { name, ratio, goal, milliseconds } of part()) {
    const aim = goal === null ? '' : `goal under ${goal}${ratio < goal ? '' : ', missed'}`;
    console.log(
      `  ${ratio.toFixed(2).padStart(7)} ×  ${milliseconds.toFixed(1).padStart(8)} ms  ${name}  ${aim}`,
    );
  }
}
