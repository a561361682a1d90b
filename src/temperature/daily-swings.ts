import type { RecordAxis } from '../model.ts';

/** Coldest and warmest temperature of each whole day, one value a day. */
export interface DailySwings {
  /** Midnight at which the day begins [ms since 1970 on the record's own clock]. */
  readonly days: Float64Array;
  /** [°C] */
  readonly coldest: Float64Array;
  /** [°C] */
  readonly warmest: Float64Array;
}

const DAY = 86_400_000;
/** Share of a day's samples that it must have to tell its swing (common practice, no source). */
const WHOLE = 0.9;

/** The swing of each day of which the record has at least nine tenths of the samples. */
export function dailySwings(axis: RecordAxis, temperature: Float64Array): DailySwings {
  const { times, stepHours } = axis;
  const needed = (WHOLE * 24) / stepHours;
  const days: number[] = [];
  const coldest: number[] = [];
  const warmest: number[] = [];
  let from = 0;
  while (from < times.length) {
    const day = Math.floor(times[from] / DAY);
    let low = temperature[from];
    let high = low;
    let to = from + 1;
    for (; to < times.length && times[to] < (day + 1) * DAY; to++) {
      low = Math.min(low, temperature[to]);
      high = Math.max(high, temperature[to]);
    }
    if (to - from >= needed) {
      days.push(day * DAY);
      coldest.push(low);
      warmest.push(high);
    }
    from = to;
  }
  return {
    days: Float64Array.from(days),
    coldest: Float64Array.from(coldest),
    warmest: Float64Array.from(warmest),
  };
}
