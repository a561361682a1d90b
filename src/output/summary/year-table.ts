import type { Result, RunResult, YearDamage } from '../../model.ts';
import { shortSeason } from '../../temperature/short-season.ts';
import { firstLargest } from '../../verdict/first-largest.ts';
import { lifeText } from '../life-text.ts';
import { stamp } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { bullet, table } from './text-layout.ts';

/**
 * For a record of several years, one line a run at the connection that the whole record damages most: its damage a
 * year in the mean and the worst year, and how long it would last if each year were the worst or the mildest.
 */
export function yearTable({ runs }: Result): string[] {
  const header = [
    'run',
    'at',
    'years',
    'mean a year',
    'worst',
    'worst from',
    'life, all worst',
    'all mildest',
  ];
  const rows = runs.flatMap((run) => row(run));
  if (rows.length === 0) return [];
  const parts = new Set(
    runs.flatMap((run) =>
      run
        .yearByYear()
        .filter(isShort)
        .map(
          ({ from, coveredHours }) =>
            `The year from ${dateOf(from)} covers ${shortNumber(coveredHours / 24)} days and is left out here.`,
        ),
    ),
  );
  const alone = `Damage a year, each year as if it stood alone, with a large swing between winter and summer of its own, so that the years need not add up to the whole record.`;
  return [table([header, ...rows], [2, 3, 4, 6, 7]), bullet(alone), ...[...parts].map(bullet)];
}

function isShort({ coveredHours }: YearDamage): boolean {
  return shortSeason(coveredHours) !== null;
}

function row(run: RunResult): string[][] {
  const whole = run.yearByYear().filter((year) => !isShort(year));
  const at = mostDamaged(run);
  if (whole.length === 0 || at < 0) return [];
  const damages = whole.map((year) => damageAt(year, at));
  const worst = damages.indexOf(Math.max(...damages));
  const lives = whole.map(({ connections }) => connections[at].life ?? Number.POSITIVE_INFINITY);
  return [
    [
      run.run.id,
      `${run.run.id}/${at + 1}`,
      String(whole.length),
      shortNumber(damages.reduce((sum, one) => sum + one, 0) / damages.length),
      shortNumber(damages[worst]),
      dateOf(whole[worst].from),
      lifeText(Math.min(...lives)),
      lifeText(Math.max(...lives)),
    ],
  ];
}

/** Index of the connection with the shortest life over the whole record; −1 where no curve was given. */
function mostDamaged({ connections }: RunResult): number {
  if (connections.every(({ life }) => life === null)) return -1;
  return firstLargest(connections.map(({ life }) => (life === null ? 0 : 1 / life)));
}

function damageAt({ connections }: YearDamage, at: number): number {
  const { memberDamagePerYear, fastenerDamagePerYear } = connections[at];
  return Math.max(memberDamagePerYear ?? 0, fastenerDamagePerYear ?? 0);
}

function dateOf(time: number): string {
  return stamp(time).slice(0, 10);
}
