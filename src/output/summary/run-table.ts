import type { Connection, Result, RunResult } from '../../model.ts';
import { scaledFrom } from '../../temperature/short-season.ts';
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
    verdict(run),
    governing?.utilisation == null ? '' : governing.utilisation.toFixed(2),
    governing?.check ?? 'nothing to check',
    governing === null
      ? ''
      : `${connectionName(connection)}, ${amount(connection.position, 'length', units)}`,
    life(run),
  ];
}

/** Whether the run passes as it stands in the job, and what its remedy is. */
function verdict(run: RunResult): string {
  const { remedy } = run;
  if (remedy === null) return runFails(run) ? 'fails' : 'ok';
  const word = REMEDY_WORDS[remedy.kind];
  return runFails(run) ? `fails: ${word}` : word;
}

const REMEDY_WORDS = {
  slots: 'slot',
  joints: 'joint',
  spacing: 'closer',
  rework: 'rework',
} as const;

/** The shortest life, and the days that it was scaled from where the record is no whole year. */
function life(run: RunResult): string {
  const { connections } = run;
  const days = scaledFrom(run);
  const scaled = days === null ? '' : `, from ${shortNumber(days)} days`;
  return `${shortestLife(connections)}${connections.some(isLimited) ? scaled : ''}`;
}

function isLimited({ life }: Connection): boolean {
  return life !== null && Number.isFinite(life);
}
