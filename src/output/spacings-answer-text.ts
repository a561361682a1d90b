import type { UnitSystem } from '../units.ts';
import type { FastenerHelp } from '../verdict/fastener-help.ts';
import type { CheckAt, SpacingRow } from '../verdict/spacing-row.ts';
import type { SpacingCase } from '../verdict/spacings.ts';
import { connectionName } from './names.ts';
import { shortNumber } from './number-text.ts';
import { reasonText } from './spacings-reason-text.ts';
import { lengthText, rowText, useText } from './spacings-words.ts';

/** The answer for one run in words: what passes, what stops it beyond, and what more fasteners do. */
export function answerText({ rows, answer }: SpacingCase, units: UnitSystem): string {
  const { widest, nearest } = answer;
  const verdict =
    widest !== null
      ? passing(widest, answer, units)
      : nearest !== null
        ? failing(nearest, answer.others, units)
        : 'No limit was given for anything, so nothing was checked.';
  const helps = answer.helps.map((help) => helpText(help, units));
  return [verdict, ...helps, alone(rows)].filter((part) => part !== '').join(' ');
}

function passing(
  widest: SpacingRow,
  { stop, failingBelow }: SpacingCase['answer'],
  units: UnitSystem,
): string {
  const most = used(widest.governing);
  const passes = `The widest that passes is ${rowText(widest, units)}, ${most}.`;
  const closer =
    failingBelow.length === 0
      ? ''
      : ` Closer, ${failingBelow.map((row) => failure(row, units)).join(', ')}.`;
  if (stop === null) return `${passes}${closer} That is the widest tried: nothing stops it there.`;
  return `${passes}${closer} Beyond it, ${failure(stop, units)}.`;
}

function failing(nearest: SpacingRow, others: readonly SpacingRow[], units: UnitSystem): string {
  const also = others.map((row) => ` Where another check governs: ${failure(row, units)}.`);
  return `No spacing tried passes. The nearest to it: ${failure(nearest, units)}.${also.join('')}`;
}

function used(at: CheckAt | null): string {
  if (at === null) return 'with nothing to check';
  return `where ${at.check.check} is used most, ${useText(at.check.utilisation ?? 0)}`;
}

function failure(row: SpacingRow, units: UnitSystem): string {
  const where = `at ${rowText(row, units)}`;
  const { governing } = row;
  if (governing === null) return `${where} nothing is checked`;
  const { check, connection } = governing;
  return `${where} ${check.check} fails, ${useText(check.utilisation ?? 0)}, at ${connectionName(connection)}`;
}

function alone(rows: readonly SpacingRow[]): string {
  const one = rows.every(({ count }) => count === rows[0].count);
  return one ? 'One number of fasteners was tried, so none can be compared.' : '';
}

const HELP: Record<FastenerHelp['effect'], string> = {
  worse: 'make it worse',
  none: 'do not help',
  little: 'help little',
  much: 'help',
};

function helpText(help: FastenerHelp, units: UnitSystem): string {
  const { check, few, fewUse, many, manyUse } = help;
  const closer = `from ${few.count} to ${many.count} of them (${lengthText(few.spacing, units)} to ${lengthText(many.spacing, units)})`;
  const change = `${check} goes from ${shortNumber(fewUse)} to ${useText(manyUse)}`;
  return `More fasteners ${HELP[help.effect]}: ${closer} ${change}. ${reasonText(help, units)}`.trimEnd();
}
