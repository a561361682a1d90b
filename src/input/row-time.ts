import type { WrittenTime } from './iso-time.ts';
import type { RecordColumn } from './record-columns.ts';
import type { PreparedFile } from './record-file.ts';
import type { RecordForm } from './record-form.ts';
import { readTimeNumber, writtenTimeReader } from './written-time.ts';

/** A reader of a row's date and time; it gives `null` for what is none. */
export function timeReader(
  { order, toNumber }: Pick<PreparedFile, 'order' | 'toNumber'>,
  { timeNumbers }: RecordForm,
): (text: string) => WrittenTime | null {
  if (timeNumbers !== null) return (text) => readTimeNumber(toNumber(text), timeNumbers);
  return writtenTimeReader(order);
}

/** A row's date and time, with a space between where they stand in two columns. */
export function timeText(cells: readonly string[], time: readonly RecordColumn[]): string {
  const first = (cells[time[0].index] ?? '').trim();
  return time.length === 1 ? first : `${first} ${(cells[time[1].index] ?? '').trim()}`;
}
