import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BenchRow, inTurns } from './in-turns.ts';
import { runProgram } from './run-node.ts';

const JOB = 'examples/skerry-landing';

/** What a comparison may take beyond starting and reading the job [ms]. */
const ALLOWED = 2000;

/** Twelve runs at ten spacings each over a year, beyond what starting and reading the same job takes, over 2 s. */
export function spacingsBench(): BenchRow[] {
  const out = mkdtempSync(join(tmpdir(), 'daystrain-bench-'));
  const steps = ['--from', '300 mm', '--to', '1200 mm', '--by', '100 mm'];
  const [{ milliseconds, ratio }] = inTurns(
    () => runProgram('check', JOB),
    [
      {
        name: '',
        goal: null,
        run: () =>
          runProgram('spacings', JOB, ...steps, '--charts', 'none', '--out', join(out, 'results')),
      },
    ],
    5,
  );
  rmSync(out, { recursive: true });
  const beyond = milliseconds - milliseconds / ratio;
  const name = 'twelve runs at ten spacings over a year, without charts';
  return [{ name, goal: 1, ratio: beyond / ALLOWED, milliseconds: beyond }];
}
