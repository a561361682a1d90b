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
 * @returns the time, or `null` where the text is none or names a day or hour that does not exist
 */
export function readIsoTime(text: string): WrittenTime | null {
  const match = PATTERN.exec(text);
  if (match === null) return null;
  const [, year, month, day, hour, minute, second = '0', zone] = match;
  const local = Date.UTC(+year, +month - 1, +day, +hour, +minute, +second);
  const wrong = +month < 1 || +month > 12 || +day < 1 || +day > daysIn(+year, +month);
  if (wrong || +hour > 23 || +minute > 59 || +second > 59) return null;
  return zone === undefined ? { local, offset: null } : withOffset(local, zone);
}

const PATTERN = /^(\d{4})-(\d\d)-(\d\d)T(\d\d):(\d\d)(?::(\d\d)(?:\.0+)?)?(Z|[+-]\d\d:?\d\d)?$/;

function daysIn(year: number, month: number): number {
  return new Date(Date.UTC(year, month, 0)).getUTCDate();
}

function withOffset(local: number, zone: string): WrittenTime | null {
  if (zone === 'Z') return { local, offset: 0 };
  const hours = Number(zone.slice(1, 3));
  const minutes = Number(zone.slice(-2));
  if (hours > 14 || minutes > 59) return null;
  const size = (hours * 60 + minutes) * 60_000;
  return { local, offset: zone[0] === '-' ? -size : size };
}
