import type { Result, ZonesJob } from '../../model.ts';
import { runNames, stamp } from '../names.ts';
import { grouped, shortNumber } from '../number-text.ts';
import { wrap } from './text-layout.ts';

/** The record's span and step, the days that it covers, the years that it stands for, and the passes. */
export function recordLines({ job, runs }: Result): string[] {
  const covered = groupedRuns(
    runs.map((run) => [run.run.id, `${shortNumber(run.coveredHours / 24)} days`]),
  );
  const years = groupedRuns(runs.map((run) => [run.run.id, yearsText(run.years)]));
  const passes = groupedRuns(runs.map((run) => [run.run.id, String(run.passes)]));
  return [
    ...sourceLines(job),
    wrap(`${spanText(job)} It covers ${covered} and stands for ${years}.`),
    wrap(`Passes through it until no slip changed: ${passes}.`),
  ];
}

/** The record's samples, span and step. */
export function spanText({ axis: { times, stepHours } }: ZonesJob): string {
  const first = stamp(times[0]);
  const last = stamp(times[times.length - 1]);
  return `Record: ${grouped(times.length)} samples, ${first} to ${last}, every ${shortNumber(stepHours)} h.`;
}

/** The weather file that the record was read from, or how a CSV was read that is not in the plain form. */
export function sourceLines({ weather, recordReadAs }: ZonesJob): string[] {
  if (weather === null) return recordReadAs.map((text) => wrap(text));
  const { place, years, setOn } = weather;
  const [first, last] = years;
  const from = first === last ? `${first}` : `${first} to ${last}`;
  const set =
    setOn === null ? '' : ` It is a typical year of months from ${from}, set on ${setOn}.`;
  return [wrap(`Weather file of ${place || 'a place without a name'}, ${from}.${set}`)];
}

function yearsText(years: number): string {
  return years === 1 ? '1 year' : `${shortNumber(years)} years`;
}

/** What the runs have, once where all have the same: `2 (R1, R2), 3 (R3)`. */
function groupedRuns(pairs: readonly [id: string, text: string][]): string {
  const groups = new Map<string, string[]>();
  for (const [id, text] of pairs) groups.set(text, [...(groups.get(text) ?? []), id]);
  if (groups.size === 1) return pairs[0][1];
  return [...groups].map(([text, ids]) => `${text} (${runNames(ids, pairs.length)})`).join(', ');
}
