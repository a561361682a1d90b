import type { FindingList } from './finding-list.ts';

/** Times and channels, row by row. */
export interface Columns {
  readonly times: Float64Array;
  readonly channels: ReadonlyMap<string, Float64Array>;
}

/**
 * Puts rows in order of time and leaves out all but one of those of the same time.
 *
 * @param columns the rows in the order of the file
 * @param repeats which row of the same time is kept, or `refuse`
 * @param list takes every row that was moved or left out
 * @returns the columns as they are where nothing has to be done; a time that stands twice where that is refused
 */
export function orderRows(
  columns: Columns,
  repeats: 'refuse' | 'first' | 'last',
  list: FindingList,
): Columns | { readonly repeated: number } {
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
  const twice = order.findIndex((row, i) => i > 0 && times[row] === times[order[i - 1]]);
  if (twice > 0 && repeats === 'refuse') return { repeated: times[order[twice]] };
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
