import type { KeyTable } from './keys.ts';

/** How the file of a record is written, where it is not found by itself. */
export const RECORD_FORM_KEYS = {
  encoding: {
    kind: 'choice',
    choices: ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'],
    needs: 'found where not given',
    example: 'windows-1252',
    meaning: 'How the text of the file is written as bytes.',
  },
  separator: {
    kind: 'choice',
    choices: ['comma', 'semicolon', 'tab', 'bar'],
    needs: 'found where not given',
    example: 'semicolon',
    meaning: 'What stands between the cells of a row.',
  },
  header_line: {
    kind: 'text',
    needs: 'the first line that holds every header that is read, where not given',
    example: '12',
    meaning:
      'Line of the header, whatever the logger writes above it, or `none`: `columns` then names columns by their numbers from the left.',
  },
  data_line: {
    kind: 'whole number',
    from: 1,
    to: 1e6,
    needs: 'the line below the header where not given',
    example: '15',
    meaning: 'First line of the data, where more lines stand between it and the header.',
  },
  decimal: {
    kind: 'choice',
    choices: ['point', 'comma'],
    needs: 'found where not given; asked for where it could be either',
    example: 'comma',
    meaning: 'The decimal mark of the numbers.',
  },
  thousands: {
    kind: 'choice',
    choices: ['none', 'comma', 'point', 'space', 'apostrophe'],
    needs: 'found where not given',
    example: 'point',
    meaning: 'What groups the thousands of the numbers.',
  },
  missing: {
    kind: 'texts',
    example: '[-999, NA]',
    meaning: 'Numbers or words that stand for a missing value. A blank always does.',
  },
  time: {
    kind: 'map',
    example: '{ order: day-first, zone: Europe/London }',
    meaning: 'How times are written, and on which clock.',
  },
} as const satisfies KeyTable;

export const TIME_KEYS = {
  order: {
    kind: 'choice',
    choices: ['day-first', 'month-first', 'year-first'],
    needs: 'found where a day over 12 shows it; asked for where none does',
    example: 'day-first',
    meaning: 'Order of day, month and year in dates such as 02/01/2031.',
  },
  zone: {
    kind: 'text',
    needs: 'where not given, the clock is taken to keep one time all year',
    example: 'Europe/London',
    meaning:
      'Time zone whose clock, with its summer time, the record was written by. Results are on its standard time all year.',
  },
  numbers: {
    kind: 'choice',
    choices: ['spreadsheet days', 'unix seconds', 'unix milliseconds'],
    example: 'spreadsheet days',
    meaning: 'What a time is that is written as a number.',
  },
} as const satisfies KeyTable;

/** What is done about doubtful rows and values. */
export const JUDGING_KEYS = {
  repeats: {
    kind: 'choice',
    choices: ['refuse', 'first', 'last'],
    default: 'refuse',
    example: 'first',
    meaning: 'Rows with the same time: refused, or the first or the last of them is kept.',
  },
  disorder: {
    kind: 'choice',
    choices: ['refuse', 'sort'],
    default: 'refuse',
    example: 'sort',
    meaning: 'A row earlier than the one above it: refused, or put in its place.',
  },
  band: {
    kind: 'map',
    example: '{ from: -40 degC, to: 90 degC, rule: leave out }',
    meaning: 'Temperatures that are plausible.',
  },
  stuck: {
    kind: 'map',
    example: '{ longer_than: 24 h, rule: leave out }',
    meaning: 'A temperature that does not change at all.',
  },
  spikes: {
    kind: 'map',
    example: '{ over: 15 K, over_per_hour: 30 K, rule: leave out }',
    meaning: 'Temperatures that leave their neighbours faster than a member can, and come back.',
  },
  jumps: {
    kind: 'map',
    example: '{ over: 15 K, over_per_hour: 30 K }',
    meaning:
      'Changes faster than a member can, within a channel or from file to file, that do not come back; and channels that lie far apart.',
  },
} as const satisfies KeyTable;

/** A temperature outside is no building member's under the sky (common practice, no source). */
export const BAND_KEYS = {
  from: {
    kind: 'temperature',
    from: -150,
    to: 500,
    default: '-60 degC',
    example: '-40 degC',
    meaning: 'The coldest plausible temperature.',
  },
  to: {
    kind: 'temperature',
    from: -150,
    to: 500,
    default: '120 degC',
    example: '90 degC',
    meaning: 'The hottest plausible temperature.',
  },
  rule: {
    kind: 'choice',
    choices: ['refuse', 'leave out'],
    default: 'refuse',
    example: 'leave out',
    meaning: 'What is done with a value outside: refused, or taken as missing.',
  },
} as const satisfies KeyTable;

export const STUCK_KEYS = {
  longer_than: {
    kind: 'hours',
    over: 0,
    to: 1e6,
    default: '24 h',
    example: '24 h',
    meaning:
      'A value is stuck that stands unchanged for longer than this, and for longer than five times what nine in ten of the unchanged stretches of its channel last.',
  },
  rule: {
    kind: 'choice',
    choices: ['leave out', 'keep'],
    default: 'leave out',
    example: 'keep',
    meaning:
      'What is done with the rest of the stretch: taken as missing, so that it does not count as covered, or kept.',
  },
} as const satisfies KeyTable;

/** Sunlit thin metal may change by some 30 K in an hour and not by 15 K at once (common practice, no source). */
const FAST = {
  over: {
    kind: 'temperature difference',
    over: 0,
    to: 1000,
    default: '15 K',
    example: '15 K',
    meaning: 'The change from row to row is over this, however short the step.',
  },
  over_per_hour: {
    kind: 'temperature difference',
    over: 0,
    to: 1e5,
    default: '30 K',
    example: '30 K',
    meaning: 'And it is over this, times the hours of the step.',
  },
} as const satisfies KeyTable;

export const SPIKES_KEYS = {
  ...FAST,
  rule: {
    kind: 'choice',
    choices: ['keep', 'leave out'],
    default: 'keep',
    example: 'leave out',
    meaning: 'What is done with a spike: kept, which is on the safe side, or taken as missing.',
  },
} as const satisfies KeyTable;

export const JUMPS_KEYS = {
  ...FAST,
  apart: {
    kind: 'temperature difference',
    over: 0,
    to: 1000,
    default: '40 K',
    example: '40 K',
    meaning: 'Channels whose medians differ by more than this are named: is one in another unit?',
  },
} as const satisfies KeyTable;
