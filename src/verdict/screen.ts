import { createDamageTables, type DamageTables } from '../damage/damage-table.ts';
import type { Job, Result, RunResult } from '../model.ts';
import { assessRun } from './assess.ts';
import { searchFor, utilisationOf } from './candidate.ts';
import { firstLargest } from './first-largest.ts';
import { joinRemedies } from './join-remedies.ts';
import { withJointGaps } from './joint-gaps.ts';
import { remedyOf } from './remedy.ts';
import { warmedRuns } from './warmed.ts';
import { withVerdicts } from './with-verdicts.ts';

/**
 * Screens every run of a job: mechanics, counting, damage, checks, and a remedy for each run that fails. The library's
 * main call.
 *
 * @param job a job in base units, as `readJob` gives it or put together by hand
 * @param options.remedies whether to look for remedies (default true); without them a verdict is `ok` or `fails`
 */
export function screen(job: Job, options: { readonly remedies?: boolean } = {}): Result {
  const tables = createDamageTables();
  const assessed = withJointGaps(job.runs.map((run) => assessRun(run, job, tables)));
  const runs = options.remedies === false ? assessed : remedied(assessed, job, tables);
  return {
    job,
    runs,
    warmed: warmedRuns(job, tables),
    governing: firstLargest(runs.map(utilisationOf)),
  };
}

function remedied(runs: readonly RunResult[], job: Job, tables: DamageTables): RunResult[] {
  const alone = runs.map((run) =>
    failsByItself(run) ? { ...run, remedy: remedyOf(run, searchFor(run.run, job, tables)) } : run,
  );
  return joinRemedies(alone, job, tables).map(withVerdicts);
}

/** Whether anything but the joint to its neighbour fails, which is mended where runs are looked at beside each other. */
function failsByItself({ connections }: RunResult): boolean {
  return connections.some(({ checks }) =>
    checks.some(({ check, status }) => status === 'fail' && check !== 'joint gap'),
  );
}
