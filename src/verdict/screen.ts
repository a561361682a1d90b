import { createDamageTables } from '../damage/damage-table.ts';
import type { Job, Result } from '../model.ts';
import { assessRun } from './assess.ts';
import { firstLargest } from './first-largest.ts';
import { withJointGaps } from './joint-gaps.ts';

/**
 * Screens every run of a job: mechanics, counting, damage, checks and verdicts. The library's main call.
 *
 * @param job a job in base units, as `readJob` gives it or put together by hand
 */
export function screen(job: Job): Result {
  const tables = createDamageTables();
  const runs = withJointGaps(job.runs.map((run) => assessRun(run, job, tables)));
  const uses = runs.map((run) => run.connections[run.governing].governing?.utilisation ?? 0);
  return { job, runs, governing: firstLargest(uses) };
}
