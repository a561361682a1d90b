/** From this many covered days on a record is called a whole year. */
const WHOLE_YEAR = 350;

/** The days that a record covers where they are no whole year, so that damage a year is scaled from them; else `null`. */
export function shortSeason(coveredHours: number): number | null {
  const days = coveredHours / 24;
  return days < WHOLE_YEAR ? days : null;
}
