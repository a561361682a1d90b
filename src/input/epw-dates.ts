import type { EpwRows } from './epw-rows.ts';
import { type Findings, report } from './findings.ts';

export interface Dating {
  /** End of each hour [ms since 1970 on the place's standard clock], rising. */
  readonly times: Float64Array;
  /** First and last year that the rows name. */
  readonly years: readonly [number, number];
  /** The year on which a typical year, whose months come from several, was set; `null` where the rows' own stand. */
  readonly setOn: number | null;
}

const HOUR = 3_600_000;
const HOURS_OF_LEAP_YEAR = 8784;

/**
 * Times of the rows of a weather file: as dated, or, for a typical year whose months come from several years, all
 * on one: the first from the first row's on that has a 29 February just if the file has.
 *
 * @param file its name, for the places
 * @returns `null` where the times do not rise, which is reported
 */
export function dateRows(rows: EpwRows, file: string, findings: Findings): Dating | null {
  const count = rows.year.length;
  if (count < 2) return report(findings, { file }, { expected: 'at least two rows of data' });
  const first = rows.year.reduce((least, year) => Math.min(least, year));
  const last = rows.year.reduce((most, year) => Math.max(most, year));
  const asDated = timesOf(rows, (row) => rows.year[row]);
  const isTypical = first < last && count <= HOURS_OF_LEAP_YEAR && !isHourly(asDated);
  const setOn = isTypical ? commonYear(rows) : null;
  const times = setOn === null ? asDated : timesOf(rows, () => setOn);
  return rises(times, rows, file, findings) ? { times, years: [first, last], setOn } : null;
}

function timesOf({ month, day, hour }: EpwRows, yearOf: (row: number) => number): Float64Array {
  return new Float64Array(month.length).map((_, row) =>
    Date.UTC(yearOf(row), month[row] - 1, day[row], hour[row]),
  );
}

/** Whether the times follow each other by the hour, a 29 February left out aside. */
function isHourly(times: Float64Array): boolean {
  return times.every((time, i) => i === 0 || [1, 25].includes((time - times[i - 1]) / HOUR));
}

function commonYear({ year, month, day }: EpwRows): number {
  const hasLeapDay = month.some((value, row) => value === 2 && day[row] === 29);
  let common = year[0];
  while (isLeap(common) !== hasLeapDay) common++;
  return common;
}

function isLeap(year: number): boolean {
  return new Date(Date.UTC(year, 1, 29)).getUTCDate() === 29;
}

/** Whether the times rise; the first that does not is reported. */
function rises(times: Float64Array, rows: EpwRows, file: string, findings: Findings): boolean {
  const at = times.findIndex((time, i) => i > 0 && time <= times[i - 1]);
  if (at < 0) return true;
  const wording = (row: number) => new Date(times[row]).toISOString().slice(0, 16);
  report(
    findings,
    { file, line: rows.line[at], column: 1, key: 'date and hour' },
    {
      found: wording(at),
      expected: `a time after that of the row before, ${wording(at - 1)}`,
      hint: 'Put the rows in order of time and leave out doubles.',
    },
  );
  return false;
}
