import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BenchRow, inTurns } from './in-turns.ts';
import { runNode, runProgram } from './run-node.ts';

/** Whole commands, each in a process of its own, against a Node that does nothing. */
export function jobsBench(): BenchRow[] {
  const out = mkdtempSync(join(tmpdir(), 'daystrain-bench-'));
  const screen = (job: string, ...options: string[]) => {
    return () => runProgram('screen', job, '--out', join(out, options.join('')), ...options);
  };
  const one = 'test/jobs/one-run';
  const example = 'examples/skerry-landing';
  const rows = inTurns(
    () => runNode('-e', '0'),
    [
      {
        name: 'a one-run job of a year, without charts',
        goal: 4,
        run: screen(one, '--charts', 'none'),
      },
      {
        name: 'the example without charts and remedies',
        goal: 6,
        run: screen(example, '--charts', 'none', '--no-remedies'),
      },
      { name: 'the example without charts', goal: null, run: screen(example, '--charts', 'none') },
      { name: 'the one-run job with its four charts', goal: null, run: screen(one) },
    ],
  );
  rmSync(out, { recursive: true });
  const [plain, , , charts] = rows;
  const each = { name: 'each PNG more', goal: 1.5, ratio: (charts.ratio - plain.ratio) / CHARTS };
  return [...rows, { ...each, milliseconds: (charts.milliseconds - plain.milliseconds) / CHARTS }];
}

/** Charts of a job by default. */
const CHARTS = 4;
