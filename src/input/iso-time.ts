/** A date and time as written, without regard to any clock. */
export interface WrittenTime {
  /** The date and time as they stand, as ms since 1970 if they were in UTC. */
  readonly local: number;
  /** Offset from UTC [ms]; `null` where none is written. */
  readonly offset: number | null;
}

/**
 * Reads an ISO 8601 date and time, `2031-01-01T00:00`, with seconds and an offset (`Z`, `+02:00`) if wished.
 *
 * Digit by digit: `Date` takes 30 February for 2 March and a time without an offset for one of the
 * machine's own clock, and a record has many thousands of times.
 *
 * @returns the time, or `null` where the text is none or names a day or hour that does not exist
 */
export function readIsoTime(text: string): WrittenTime | null {
  if (text[4] !== '-' || text[7] !== '-' || text[10] !== 'T' || text[13] !== ':') return null;
  const year = digits(text, 0, 4);
  const month = digits(text, 5, 7);
  const day = digits(text, 8, 10);
  const hour = digits(text, 11, 13);
  const minute = digits(text, 14, 16);
  if (!(month >= 1 && month <= 12 && day >= 1 && day <= daysIn(year, month))) return null;
  // Years under 100 are not those of a four-digit form: `Date` would take 31 for 1931.
  if (!(year >= 100 && hour <= 23 && minute <= 59)) return null;
  const local = Date.UTC(year, month - 1, day, hour, minute);
  return text.length === 16 ? { local, offset: null } : withRest(local, text.slice(16));
}

/** The number that digits make from one place up to another; `NaN` where others stand there. */
function digits(text: string, from: number, to: number): number {
  let value = 0;
  for (let i = from; i < to; i++) {
    const digit = text.charCodeAt(i) - 48;
    if (!(digit >= 0 && digit <= 9)) return Number.NaN;
    value = value * 10 + digit;
  }
  return value;
}

/** Days in a month (1 … 12) of the Gregorian calendar. */
export function daysIn(year: number, month: number): number {
  if (month === 2) return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0) ? 29 : 28;
  return month === 4 || month === 6 || month === 9 || month === 11 ? 30 : 31;
}

const REST = /^(?::([0-5]\d)(?:\.0+)?)?(?:(Z)|([+-])(\d\d):?([0-5]\d))?$/;

/** Seconds and offset, behind hours and minutes. */
function withRest(minute: number, text: string): WrittenTime | null {
  const match = REST.exec(text);
  if (match === null) return null;
  const [, second = '0', utc, sign, hours = '0', minutes = '0'] = match;
  const local = minute + Number(second) * 1000;
  if (sign === undefined) return { local, offset: utc === undefined ? null : 0 };
  if (Number(hours) > 14) return null;
  const size = (Number(hours) * 60 + Number(minutes)) * 60_000;
  return { local, offset: sign === '-' ? -size : size };
}
