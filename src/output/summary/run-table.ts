import type { Result, RunResult } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { amount, connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { runFails } from '../run-fails.ts';
import { table } from './text-layout.ts';

/** One line a run: verdict, what governs, where, and the shortest life of its connections. */
export function runTable({ job, runs }: Result): string {
  const header = [
    'run',
    'connections',
    'verdict',
    'utilisation',
    'governing check',
    'at',
    'shortest life',
  ];
  return table([header, ...runs.map((run) => row(run, job.units))], [1, 3]);
}

function row(run: RunResult, units: UnitSystem): string[] {
  const connection = run.connections[run.governing];
  const { governing } = connection;
  return [
    run.run.id,
    String(run.connections.length),
    runFails(run) ? 'fails' : 'ok',
    governing?.utilisation == null ? '' : governing.utilisation.toFixed(2),
    governing?.check ?? 'nothing to check',
    governing === null
      ? ''
      : `${connectionName(connection)}, ${amount(connection.position, 'length', units)}`,
    life(run),
  ];
}

/** More years than these say no more [years]. */
const LONGEST_LIFE = 10_000;

function life(run: RunResult): string {
  const lives = run.connections.map((c) => c.life).filter((years) => years !== null);
  if (lives.length === 0) return 'no curve';
  const shortest = Math.min(...lives);
  if (!Number.isFinite(shortest)) return 'unlimited';
  if (shortest > LONGEST_LIFE) return `over ${shortNumber(LONGEST_LIFE)} years`;
  return `${shortNumber(shortest)} years`;
}
