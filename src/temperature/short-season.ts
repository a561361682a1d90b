/** From this many covered days on a record is called a whole year. */
const WHOLE_YEAR = 350;

/** The days that a record covers where they are no whole year, so that damage a year is scaled from them; else `null`. */
export function shortSeason(coveredHours: number): number | null {
  const days = coveredHours / 24;
  return days < WHOLE_YEAR ? days : null;
}

/** What a record covers, and the years that it stands for. */
export interface Coverage {
  readonly coveredHours: number;
  readonly years: number;
}

/**
 * The fewest days that damage a year was scaled from, where any of the records is no whole year; `null` where each is,
 * or where the job itself says what they stand for.
 */
export function scaledFrom(...records: readonly Coverage[]): number | null {
  const days = records
    .filter(({ coveredHours, years }) => Math.abs(years * HOURS_A_YEAR - coveredHours) < 1)
    .map(({ coveredHours }) => shortSeason(coveredHours))
    .filter((short) => short !== null);
  return days.length === 0 ? null : Math.min(...days);
}

const HOURS_A_YEAR = 8766;
