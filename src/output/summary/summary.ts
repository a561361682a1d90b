import type { Result, RunResult } from '../../model.ts';
import { scaledFrom } from '../../temperature/short-season.ts';
import { connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { unitOf } from '../quantity.ts';
import { runFails } from '../run-fails.ts';
import { exempt, failures, notGiven } from './check-groups.ts';
import { damageTable } from './damage-table.ts';
import { defaultLines } from './default-lines.ts';
import { derivedLines } from './derived-lines.ts';
import { foundLines } from './found-lines.ts';
import { CAUTION, notes, warnings } from './notes.ts';
import { recordLines } from './record-lines.ts';
import { remedyAssumptions, remedyLines } from './remedy-lines.ts';
import { runTable } from './run-table.ts';
import { sunLines } from './sun-lines.ts';
import { wrap } from './text-layout.ts';
import { warmingTable, warmingTitle } from './warming-table.ts';
import { yearTable } from './year-table.ts';

/**
 * The results for a person: the answer first, then each run, what failed, what was not given, damage,
 * and what was left out or assumed.
 *
 * @returns text of at most 100 columns in the units of the job, with LF line ends
 */
export function summary(result: Result): string {
  const { job } = result;
  const life = shortNumber(job.limits.designLife);
  const allowed = shortNumber(job.limits.damage);
  const sections = [
    [job.title, '', wrap(answer(result))].join('\n'),
    runTable(result),
    section('What to do', remedyLines(result)),
    section('What fails', failures(result)),
    section('Not given, so neither passed nor failed', notGiven(result)),
    section('Not owed, by the rule on the shear range', exempt(result)),
    section(`Damage in ${life} years (allowed ${allowed})${scaledText(result)}`, [
      damageTable(result),
    ]),
    section('Year by year', yearTable(result)),
    section(warmingTitle(job), warmingTable(result)),
    section('Zones reckoned from sun and air', sunLines(job)),
    section('What the remedies assume', remedyAssumptions(result)),
    section('To bear in mind', notes(result)),
    section('Found in the record', foundLines(result)),
    section('Warnings', warnings(result)),
    section('Worked out from other values', derivedLines(job)),
    section('Left at their defaults', defaultLines(job.defaults)),
    [...recordLines(result), unitsLine(result), CAUTION].join('\n'),
  ];
  return `${sections.filter((text) => text !== '').join('\n\n')}\n`;
}

function answer(result: Result): string {
  const { runs } = result;
  const failing = runs.filter(runFails).length;
  const verdict =
    failing === 0
      ? `No check fails in ${runs.length === 1 ? 'the run' : `the ${runs.length} runs`}.`
      : `${failing} of ${runs.length} ${runs.length === 1 ? 'run' : 'runs'} ${failing === 1 ? 'fails' : 'fail'}.`;
  return [verdict, remedied(runs), governs(result)].filter((text) => text !== '').join(' ');
}

/** How many failing runs have a remedy, what changes beside them, and which have none; blank where none was looked for. */
function remedied(runs: readonly RunResult[]): string {
  const changed = runs.filter(({ remedy }) => remedy !== null && remedy.kind !== 'rework');
  const found = changed.filter(runFails).length;
  const beside = changed.filter((run) => !runFails(run)).map(({ run }) => run.id);
  const open = runs.filter(({ remedy }) => remedy?.kind === 'rework').map(({ run }) => run.id);
  const which =
    found === runs.filter(runFails).length && found === 1 ? '' : ` for ${found} of them`;
  return [
    ...(found === 0 ? [] : [`A changed drawing passes${which}, see below.`]),
    ...(beside.length === 0
      ? []
      : [`Beside changed runs the gap must be wider at ${beside.join(', ')}.`]),
    ...(open.length === 0 ? [] : [`${open.join(', ')} must be reworked.`]),
  ].join(' ');
}

function governs({ runs, governing }: Result): string {
  const run = runs[governing];
  const connection = run.connections[run.governing];
  const check = connection.governing;
  if (check === null) return 'No limit was given for anything, so nothing was checked.';
  return `${connectionName(connection)} governs: ${check.check} is ${shortNumber(check.utilisation ?? 0)} times its limit.`;
}

/** The days that damage was scaled from where the record is no whole year. */
function scaledText({ runs }: Result): string {
  const days = scaledFrom(...runs);
  return days === null ? '' : `, scaled from ${shortNumber(days)} days`;
}

function unitsLine({ job: { units } }: Result): string {
  const names = (['force', 'length', 'stress'] as const).map((q) => unitOf(q, units)).join(', ');
  return `Units: ${units === 'SI' ? 'SI' : 'US customary'} (${names}).`;
}

function section(title: string, lines: readonly string[]): string {
  const body = lines.filter((line) => line !== '');
  return body.length === 0 ? '' : [title, ...body].join('\n');
}
