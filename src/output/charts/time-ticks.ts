import type { FixedTicks } from './fixed-ticks.ts';

const DAY = 86_400_000;
const MOST_TICKS = 14;

/** Calendar steps from short to long, in hours, days, months or years. */
const STEPS: readonly (readonly ['hour' | 'day' | 'month' | 'year', number, number])[] = [
  ['hour', 1, DAY / 24],
  ['hour', 3, DAY / 8],
  ['hour', 6, DAY / 4],
  ['hour', 12, DAY / 2],
  ['day', 1, DAY],
  ['day', 2, 2 * DAY],
  ['day', 7, 7 * DAY],
  ['day', 14, 14 * DAY],
  ['month', 1, 30 * DAY],
  ['month', 3, 91 * DAY],
  ['month', 6, 182 * DAY],
  ['year', 1, 365 * DAY],
  ['year', 2, 730 * DAY],
  ['year', 5, 1826 * DAY],
  ['year', 10, 3652 * DAY],
  ['year', 50, 18262 * DAY],
];

/**
 * At most some fourteen ticks at whole hours, days, months or years between two times [ms since 1970,
 * on the record's own clock]. The first tick, and each that begins a year, names the year below.
 */
export function timeTicks(from: number, to: number): FixedTicks {
  const step = STEPS.find(([, , length]) => (to - from) / length <= MOST_TICKS) ?? STEPS.at(-1)!;
  const values: number[] = [];
  for (let i = 0; values.length <= 2 * MOST_TICKS; i++) {
    const value = tickAt(from, step, i);
    if (value > to) break;
    if (value >= from) values.push(value);
  }
  let year = '';
  return values.map((value) => {
    const own = String(new Date(value).getUTCFullYear());
    const label = nameOf(value, step[0]);
    const named = step[0] === 'year' || own === year ? label : [label, own];
    year = own;
    return { value, label: named };
  });
}

/** The i-th whole step from the start of the year (or, for hours and days, from the first whole day) on. */
function tickAt(from: number, [unit, count]: (typeof STEPS)[number], i: number): number {
  const start = new Date(from);
  const year = start.getUTCFullYear();
  if (unit === 'year') return Date.UTC(Math.floor(year / count) * count + i * count, 0, 1);
  if (unit === 'month')
    return Date.UTC(year, (Math.floor(start.getUTCMonth() / count) + i) * count, 1);
  const midnight = Date.UTC(year, start.getUTCMonth(), start.getUTCDate());
  return midnight + i * count * (unit === 'day' ? DAY : DAY / 24);
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

function nameOf(time: number, unit: (typeof STEPS)[number][0]): string {
  const date = new Date(time);
  const month = MONTHS[date.getUTCMonth()]!;
  if (unit === 'year') return String(date.getUTCFullYear());
  if (unit === 'month') return month;
  const day = `${date.getUTCDate()} ${month}`;
  const hour = date.getUTCHours();
  return unit === 'day' || hour === 0 ? day : `${String(hour).padStart(2, '0')}:00`;
}
