import { readJob } from '../input/job.ts';
import { wrap } from '../output/summary/text-layout.ts';
import { understood } from '../output/understood.ts';
import type { CommandOutcome } from './screen.ts';

/**
 * `daystrain check`: reads a job and says in words what was understood. It writes nothing.
 *
 * @param jobPath the job file, or a folder that holds job.yaml
 * @throws InputError with every issue of the job
 */
export async function checkCommand(jobPath: string): Promise<CommandOutcome> {
  const job = await readJob(jobPath);
  const connections = job.runs.reduce((sum, run) => sum + run.positions.length, 0);
  const runs = job.runs.length === 1 ? '1 run' : `${job.runs.length} runs`;
  const end = `The job can be screened: ${runs} with ${connections} connections.`;
  return { lines: [understood(job), '', wrap(end)], warnings: job.warnings, fails: false };
}
