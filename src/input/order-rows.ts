import type { FindingList } from './finding-list.ts';

/** What is done about rows of the same time. Rows that are out of order are put in order. */
export interface OrderRules {
  readonly repeats: 'refuse' | 'first' | 'last';
}

/** Times and channels, row by row. */
export interface Columns {
  readonly times: Float64Array;
  readonly channels: ReadonlyMap<string, Float64Array>;
}

/**
 * Puts rows in order of time and leaves out all but one of those of the same time.
 *
 * @param columns the rows in the order of the file
 * @param list takes every row that was moved or left out
 * @returns the columns as they are where nothing has to be done
 */
export function orderRows(columns: Columns, { repeats }: OrderRules, list: FindingList): Columns {
  const { times } = columns;
  if (rises(times)) return columns;
  const order = Uint32Array.from(times, (_, i) => i);
  let latest = Number.NEGATIVE_INFINITY;
  for (const time of times) {
    if (time < latest) {
      const done = 'put in order of time';
      list.add({ kind: 'disorder', time, channel: '', value: null, hours: null, done });
    } else latest = time;
  }
  order.sort((a, b) => times[a] - times[b] || a - b);
  const kept = order.filter((row, i) => {
    const other = repeats === 'last' ? order[i + 1] : order[i - 1];
    if (other === undefined || times[other] !== times[row]) return true;
    const done = `left out; the ${repeats} row of this time is kept`;
    list.add({ kind: 'repeat', time: times[row], channel: '', value: null, hours: null, done });
    return false;
  });
  const pick = (values: Float64Array) => Float64Array.from(kept, (row) => values[row]);
  const channels = [...columns.channels].map(([name, values]) => [name, pick(values)] as const);
  return { times: pick(times), channels: new Map(channels) };
}

function rises(times: Float64Array): boolean {
  for (let i = 1; i < times.length; i++) if (times[i] <= times[i - 1]) return false;
  return true;
}
