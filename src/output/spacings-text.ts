import { CHECKS, type CheckName } from '../model.ts';
import type { FastenerHelp } from '../verdict/fastener-help.ts';
import type { SpacingRow } from '../verdict/spacing-row.ts';
import type { NotCompared, SpacingCase, SpacingComparison } from '../verdict/spacings.ts';
import { runNames } from './names.ts';
import { answerText } from './spacings-answer-text.ts';
import { spacingsNotes } from './spacings-notes.ts';
import { caseText, cutText, lengthText, useNumber } from './spacings-words.ts';
import { CAUTION } from './summary/notes.ts';
import { bullet, table, wrap } from './summary/text-layout.ts';

/**
 * A comparison with at least one case, for a person: the answer first, a line a run, then each run in words, what was not compared, what
 * was not given, and what was left out.
 *
 * @returns text of at most 100 columns in the units of the job, with LF line ends
 */
export function spacingsText(comparison: SpacingComparison): string {
  const { job, cases, notCompared } = comparison;
  const { units } = job;
  const sections = [
    [job.title, '', wrap(tried(comparison)), wrap(headline(cases))].join('\n'),
    answerTable(comparison),
    section(
      'In words',
      cases.map((one) => wrap(`${caseText(one, units)}: ${answerText(one, units)}`, '  ', 4)),
    ),
    section(
      'Not compared',
      notCompared.map((one) => bullet(notComparedText(one, comparison))),
    ),
    section(
      'Not given, so neither passed nor failed',
      byCheck(cases, ({ notGiven }) => notGiven),
    ),
    section(
      'Not owed, by the rule on the shear range',
      byCheck(cases, ({ exempt }) => exempt),
    ),
    section('To bear in mind', spacingsNotes(comparison).map(bullet)),
    section('Warnings', job.warnings.map(bullet)),
    CAUTION,
  ];
  return `${sections.filter((text) => text !== '').join('\n\n')}\n`;
}

/** Why a run, or a part of what was asked about it, was not screened, as a sentence. */
export function notComparedText(one: NotCompared, { job: { units } }: SpacingComparison): string {
  const { id } = one.run;
  switch (one.why) {
    case 'one fastener':
      return `${id} has one fastener, so it has no spacing.`;
    case 'fixed by numbers':
      return `${id}: its fixed fasteners are given by their numbers, which another spacing cannot keep. Name arrangements with --fixed.`;
    case 'no slotted fastener':
      return `${id}, ${one.arrangement} fixed: the job names no slotted fastener for it.`;
    case 'too few fasteners for the pieces': {
      const spacings = one.spacings.map((spacing) => lengthText(spacing, units)).join(', ');
      return `${id} ${cutText(one.cut, units)} at ${spacings}: a piece would have fewer than two fasteners.`;
    }
  }
}

function tried({ question: { spacings, runs }, job: { units } }: SpacingComparison): string {
  const one = spacings.length === 1;
  const last = spacings[spacings.length - 1];
  const range = `${lengthText(spacings[0], units)}${one ? '' : ` to ${lengthText(last, units)}`}`;
  const number = one ? '1 spacing' : `${spacings.length} spacings`;
  return `${number} of fasteners tried, ${range}, in ${runs.length === 1 ? '1 run' : `${runs.length} runs`}.`;
}

function headline(cases: readonly SpacingCase[]): string {
  const passing = cases.filter(({ answer }) => answer.widest !== null).length;
  if (cases.length === 1) return `It passes at ${passing === 1 ? 'some' : 'none'} of them.`;
  const runs = new Set(cases.map(({ run }) => run.id)).size;
  const what = runs === cases.length ? 'runs' : 'lines of the table';
  return `${passing} of ${cases.length} ${what} pass at some of them.`;
}

function answerTable({ cases, job: { units } }: SpacingComparison): string {
  const header = [
    'run',
    'fixed',
    'pieces',
    'widest passing',
    'stopped by',
    'utilisation',
    'at',
    'closer helps',
  ];
  const rows = cases.map(({ run, arrangement, cut, answer }) => {
    const { widest, stop, nearest } = answer;
    const failing = stop ?? nearest;
    const check = failing?.governing?.check;
    return [
      run.id,
      arrangement,
      'longest' in cut ? `≤ ${lengthText(cut.longest, units)}` : String(cut.pieces),
      widest !== null ? lengthText(widest.spacing, units) : nearest !== null ? 'none' : '',
      check?.check ?? (widest === null ? 'nothing to check' : 'nothing tried'),
      check === undefined ? '' : useNumber(check.utilisation ?? 0),
      failing === null ? '' : lengthText(failing.spacing, units),
      answer.helps.length === 0 ? '' : CLOSER_HELPS[answer.helps[0].effect],
    ];
  });
  return table([header, ...rows], [2, 3, 5, 6]);
}

const CLOSER_HELPS: Record<FastenerHelp['effect'], string> = {
  worse: 'no, worse',
  none: 'no',
  little: 'little',
  much: 'yes',
};

/** For each check, the runs that it stands open in at some spacing. */
function byCheck(
  cases: readonly SpacingCase[],
  names: (row: SpacingRow) => readonly CheckName[],
): string[] {
  const width = Math.max(...CHECKS.map((name) => name.length));
  const all = new Set(cases.map(({ run }) => run.id)).size;
  return CHECKS.flatMap((name) => {
    const open = cases.filter(({ rows }) => rows.some((row) => names(row).includes(name)));
    const ids = [...new Set(open.map(({ run }) => run.id))];
    return ids.length === 0 ? [] : [wrap(runNames(ids, all), `  ${name.padEnd(width)}  `)];
  });
}

function section(title: string, lines: readonly string[]): string {
  return lines.length === 0 ? '' : [title, ...lines].join('\n');
}
