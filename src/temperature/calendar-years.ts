/** The samples of one calendar year of a record. */
export interface CalendarYear {
  readonly year: number;
  /** Index of its first sample. */
  readonly from: number;
  /** Index behind its last sample. */
  readonly to: number;
}

/**
 * Where a record's calendar years begin and end.
 *
 * @param times [ms since 1970 on the record's own clock], rising
 * @returns the years that hold a sample, in order
 */
export function calendarYears(times: Float64Array): CalendarYear[] {
  const years: CalendarYear[] = [];
  let from = 0;
  while (from < times.length) {
    const year = new Date(times[from]).getUTCFullYear();
    const end = Date.UTC(year + 1, 0, 1);
    let to = from + 1;
    while (to < times.length && times[to] < end) to++;
    years.push({ year, from, to });
    from = to;
  }
  return years;
}
