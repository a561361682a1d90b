import type { RunResult } from '../model.ts';

/** True where any check of any of the run's connections fails. */
export function runFails(run: RunResult): boolean {
  return run.connections.some(({ verdict }) => verdict === 'fails');
}
