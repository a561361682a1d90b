import { daysIn, readIsoTime, type WrittenTime } from './iso-time.ts';

/** In which order a date's day, month and year are written. */
export type DateOrder = 'day-first' | 'month-first' | 'year-first';

/** What a number stands for where times are written as numbers. */
export type TimeNumbers = 'spreadsheet days' | 'unix seconds' | 'unix milliseconds';

const DATE =
  /^(\d{1,4}|[a-z]{3,9})[-/. ]+(\d{1,2}|[a-z]{3,9})\.?[-/., ]+(\d{1,4})(?=$|[t ,])[t ,]*/;
const COMPACT = /^(\d{4})(\d\d)(\d\d)(?=$|[t ])[t ]*/;
const CLOCK =
  /^(\d{1,2})(?:[:.h](\d\d)(?:[:.](\d\d)(?:[.,](\d{1,9}))?)?)?\s*(?:([ap])\.?\s?m\.?)?\s*(z|utc|gmt|[+-](?:0\d|1[0-4]):?[0-5]\d)?$/;
const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const MONTH_NAMES =
  /^(?:jan(?:uary)?|feb(?:ruary)?|mar(?:ch)?|apr(?:il)?|may|june?|july?|aug(?:ust)?|sept?(?:ember)?|oct(?:ober)?|nov(?:ember)?|dec(?:ember)?)$/;

/**
 * A reader of dates and times as loggers and spreadsheets write them: the date in figures or with an English month,
 * the time by a clock of 24 or of 12 hours, with an offset if wished. A date alone is its midnight. The reader gives
 * `null` where the text is none, leaves its order open, or names a day or hour that there is not.
 *
 * @param order of day, month and year where the text leaves it open
 */
export function writtenTimeReader(order: DateOrder | null): (text: string) => WrittenTime | null {
  let day = { text: '', midnight: 0 };
  return (text) => {
    const iso = text[10] === ' ' ? `${text.slice(0, 10)}T${text.slice(11)}` : text;
    const plain = readIsoTime(iso);
    if (plain !== null) return plain;
    // Neighbouring rows are of the same day mostly, and a clock alone is read far faster.
    const space = text.indexOf(' ');
    if (space === day.text.length && space > 0 && text.startsWith(day.text)) {
      return withClock(day.midnight, text.slice(space).trim().toLowerCase());
    }
    const time = readParts(text.trim().toLowerCase(), order);
    const date = space > 0 ? readParts(text.slice(0, space).toLowerCase(), order) : null;
    if (date !== null) day = { text: text.slice(0, space), midnight: date.local };
    return time;
  };
}

/**
 * What a date says of the order of its day and month: `13/02/2031` is day-first, `01/02/2031` is either,
 * `2031-02-01` and `1 Feb 2031` need none, and `01/02/31` leaves even the year open.
 */
export function orderSaidBy(text: string): DateOrder | 'either' | 'open' | 'none' {
  const match = DATE.exec(text.trim().toLowerCase());
  if (match === null) return 'none';
  const [, a, b, c] = match;
  if (a.length === 4 && /^\d/.test(a)) return 'none';
  if (c.length < 4) return 'open';
  if (!/^\d+$/.test(a + b)) return 'none';
  if (Number(a) > 12) return 'day-first';
  return Number(b) > 12 ? 'month-first' : 'either';
}

/**
 * Reads a time written as a number.
 *
 * @param value days since 30 December 1899, as spreadsheets count them, or seconds or ms since 1970 in UTC
 */
export function readTimeNumber(value: number, numbers: TimeNumbers): WrittenTime | null {
  if (!Number.isFinite(value)) return null;
  if (numbers === 'unix milliseconds') return { local: value, offset: 0 };
  if (numbers === 'unix seconds') return { local: Math.round(value * 1000), offset: 0 };
  // A day number of an hour or a minute is rounded in the file: whole seconds are meant.
  return { local: Math.round(value * 86_400) * 1000 + Date.UTC(1899, 11, 30), offset: null };
}

function readParts(text: string, order: DateOrder | null): WrittenTime | null {
  const date = COMPACT.exec(text) ?? DATE.exec(text);
  if (date === null) return null;
  const midnight = midnightOf(date.slice(1, 4), order);
  return midnight === null ? null : withClock(midnight, text.slice(date[0].length).trim());
}

/** The time at a clock's reading on a day that begins at midnight [ms]. */
function withClock(midnight: number, clock: string): WrittenTime | null {
  if (clock === '') return { local: midnight, offset: null };
  const match = CLOCK.exec(clock);
  if (match === null) return null;
  const [, hours, minutes = '0', seconds = '0', fraction = '0', half, zone] = match;
  const hour = half === undefined ? Number(hours) : hourOf(Number(hours), half);
  if (hour === null || Number(minutes) > 59 || Number(seconds) > 59) return null;
  const within = (hour * 60 + Number(minutes)) * 60 + Number(seconds);
  if (within > 86_400) return null;
  const local = midnight + within * 1000 + Math.round(Number(`0.${fraction}`) * 1000);
  return { local, offset: zone === undefined ? null : offsetOf(zone) };
}

/** An hour of a 12-hour clock as one of 24: 12 am is 0, 12 pm is 12. */
function hourOf(hour: number, half: string): number | null {
  if (hour < 1 || hour > 12) return null;
  return (hour % 12) + (half === 'p' ? 12 : 0);
}

function offsetOf(zone: string): number {
  const match = /^([+-])(\d\d):?(\d\d)$/.exec(zone);
  if (match === null) return 0;
  const size = (Number(match[2]) * 60 + Number(match[3])) * 60_000;
  return match[1] === '-' ? -size : size;
}

/** Midnight of a date [ms], or `null` where there is no such day or its order is open. */
function midnightOf(parts: readonly string[], order: DateOrder | null): number | null {
  const fields = fieldsOf(parts, order);
  if (fields === null) return null;
  const [year, month, day] = [yearOf(fields[0]), monthOf(fields[1]), Number(fields[2])];
  if (!(month >= 1 && month <= 12 && day >= 1 && day <= daysIn(year, month))) return null;
  return Date.UTC(year, month - 1, day);
}

/** Year, month and day as they are written. */
function fieldsOf(parts: readonly string[], order: DateOrder | null): string[] | null {
  const [a, b, c] = parts;
  if (/^\d{4}$/.test(a)) return [a, b, c];
  const first = order === 'year-first' ? (c.length < 4 ? order : null) : order;
  if (c.length !== 4 && (c.length !== 2 || first === null)) return null;
  if (first === 'year-first') return a.length === 2 ? [a, b, c] : null;
  if (/^[a-z]/.test(a)) return [c, a, b];
  if (/^[a-z]/.test(b)) return [c, b, a];
  if (first === null) return null;
  return first === 'day-first' ? [c, b, a] : [c, a, b];
}

/** A year of two figures is one of this century. */
function yearOf(text: string): number {
  return text.length === 2 ? 2000 + Number(text) : Number(text);
}

function monthOf(text: string): number {
  if (/^\d/.test(text)) return Number(text);
  return MONTH_NAMES.test(text) ? MONTHS.indexOf(text.slice(0, 3)) + 1 : 0;
}
