import type { Connection, Result, RunResult } from '../../model.ts';
import { shortSeason } from '../../temperature/short-season.ts';
import type { UnitSystem } from '../../units.ts';
import { shortestLife } from '../life-text.ts';
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

/** The shortest life, and the days that it was scaled from where the record is no whole year. */
function life({ connections, coveredHours }: RunResult): string {
  const days = shortSeason(coveredHours);
  const scaled = days === null ? '' : `, from ${shortNumber(days)} days`;
  return `${shortestLife(connections)}${connections.some(isLimited) ? scaled : ''}`;
}

function isLimited({ life }: Connection): boolean {
  return life !== null && Number.isFinite(life);
}
