import type { Connection, RunResult } from '../model.ts';

/** True where any check of any of the run's connections fails, as the run stands in the job. */
export function runFails(run: Pick<RunResult, 'connections'>): boolean {
  return run.connections.some(connectionFails);
}

/** True where any check of the connection fails, whatever its remedy. */
export function connectionFails({ checks }: Pick<Connection, 'checks'>): boolean {
  return checks.some(({ status }) => status === 'fail');
}
