/** A time on a zone's clock, put on the zone's standard time all year. */
export interface ZonedTime {
  /** [ms since 1970 on standard time]; where the clock shows the time twice, the first. */
  readonly first: number;
  /** The second time that the clock shows it; the same as `first` where it does so once. */
  readonly second: number;
  /** False where the clock never shows the time: it was put forward over it. */
  readonly exists: boolean;
}

/** The clock of a named time zone, with its changes to summer time and back. */
export interface ZoneClock {
  readonly zone: string;
  /** Offset of its standard time from UTC [ms]: the smaller of January's and July's. */
  readonly standard: number;
  /** Reads what the clock shows [ms since 1970 as if in UTC]. */
  read(shown: number): ZonedTime;
}

/** No zone changes its clock by more. */
const MOST_CHANGE = 3 * 3_600_000;

/**
 * The clock of a time zone of the IANA database. The calendar library is loaded here only: records with ISO times
 * need none.
 *
 * @param zone such as `Europe/London`
 * @param around a time in the year that the record begins in [ms]; the standard offset is that year's
 * @returns `null` where there is no such zone
 */
export async function zoneClock(zone: string, around: number): Promise<ZoneClock | null> {
  const { Temporal } = await import('temporal-polyfill');
  const at = (time: number) =>
    Temporal.Instant.fromEpochMilliseconds(time).toZonedDateTimeISO(zone);
  const offsetAt = (time: number) => at(time).offsetNanoseconds / 1e6;
  const year = new Date(around).getUTCFullYear();
  let standard: number;
  try {
    standard = Math.min(offsetAt(Date.UTC(year, 0, 1)), offsetAt(Date.UTC(year, 6, 1)));
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
  /** While the clock shows times within these, its offset is one and clear. */
  let steady = { from: 0, to: 0, offset: 0 };
  const near = (shown: number): ZonedTime => {
    const plain = Temporal.Instant.fromEpochMilliseconds(shown)
      .toZonedDateTimeISO('UTC')
      .toPlainDateTime();
    const first = plain.toZonedDateTime(zone, { disambiguation: 'earlier' });
    const second = plain.toZonedDateTime(zone, { disambiguation: 'later' });
    const [begin, end] = [
      // Of a time at the change itself the change counts as the previous one.
      second.add({ milliseconds: 1 }).getTimeZoneTransition('previous'),
      second.getTimeZoneTransition('next'),
    ];
    const offset = second.offsetNanoseconds / 1e6;
    const onClock = (time: { epochMilliseconds: number } | null, other: number) =>
      time === null ? other : time.epochMilliseconds + offset;
    steady = {
      from: onClock(begin, Number.NEGATIVE_INFINITY) + MOST_CHANGE,
      to: onClock(end, Number.POSITIVE_INFINITY) - MOST_CHANGE,
      offset,
    };
    return {
      first: first.epochMilliseconds + standard,
      second: second.epochMilliseconds + standard,
      exists: first.toPlainDateTime().equals(plain),
    };
  };
  return {
    zone,
    standard,
    read(shown) {
      if (shown < steady.from || shown > steady.to) return near(shown);
      const time = shown - steady.offset + standard;
      return { first: time, second: time, exists: true };
    },
  };
}
