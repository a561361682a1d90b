import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BenchRow, inTurns } from './in-turns.ts';
import { runProgram } from './run-node.ts';

const JOB = 'examples/skerry-landing';

/** What the search for remedies may take beyond screening the job without it [ms]. */
const ALLOWED = 5000;

/** The remedies of the example's twelve runs, of which eight fail, beyond screening them as they stand, over 5 s. */
export function remediesBench(): BenchRow[] {
  const out = mkdtempSync(join(tmpdir(), 'daystrain-bench-'));
  const screen = (...options: string[]) =>
    runProgram('screen', JOB, '--charts', 'none', '--out', join(out, 'results'), ...options);
  const [{ milliseconds, ratio }] = inTurns(
    () => screen('--no-remedies'),
    [{ name: '', goal: null, run: () => screen() }],
    3,
  );
  rmSync(out, { recursive: true });
  const beyond = milliseconds - milliseconds / ratio;
  const name = 'remedies of the whole example, of a year';
  return [{ name, goal: 1, ratio: beyond / ALLOWED, milliseconds: beyond }];
}
