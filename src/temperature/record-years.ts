/** The samples of one year of a record. */
export interface RecordYear {
  /** Index of its first sample. */
  readonly from: number;
  /** Index behind its last sample. */
  readonly to: number;
}

/**
 * The years of a record, from its first sample to each anniversary of it. A record that begins with a calendar year
 * is cut into calendar years; one that runs from July to July keeps whole years too.
 *
 * @param times [ms since 1970 on the record's own clock], rising, at least one
 * @returns the years that hold a sample, in order; the last may be short
 */
export function recordYears(times: Float64Array): RecordYear[] {
  const start = new Date(times[0]);
  const years: RecordYear[] = [];
  let from = 0;
  for (let k = 1; from < times.length; k++) {
    const end = new Date(start).setUTCFullYear(start.getUTCFullYear() + k);
    let to = from;
    while (to < times.length && times[to] < end) to++;
    if (to > from) years.push({ from, to });
    from = to;
  }
  return years;
}
