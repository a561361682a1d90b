import type { RecordColumn } from './record-columns.ts';
import { type PreparedFile, placeIn, type RecordReading } from './record-file.ts';
import type { RecordRows } from './record-rows.ts';

/** A reader of one channel's cells; each adds a value to the channel. */
export function channelReader(
  column: RecordColumn,
  { name: file, toNumber }: PreparedFile,
  rows: RecordRows,
  { bounds, faults, form }: RecordReading,
): (cells: readonly string[], line: number) => void {
  const { index, name } = column;
  const { quantity, convert } = column.measure!;
  const { from, to, words, leaveOut } = bounds[quantity];
  const values = rows.channels.get(name)!;
  const isMissing = missingMark(form.missing, toNumber);
  return (cells, line) => {
    const text = cells[index];
    const number = text === '' ? Number.NaN : toNumber(text);
    if (text === '' || isMissing(text, number)) {
      values.push(Number.NaN);
      return;
    }
    const value = convert(number);
    if (value >= from && value <= to) values.push(value);
    else {
      values.push(Number.NaN);
      const isNumber = !Number.isNaN(value);
      if (isNumber && leaveOut !== null) {
        leaveOut({ time: rows.times.last, channel: name, value });
        return;
      }
      faults.add(`value ${name}`, placeIn(file, cells, line, column), {
        found: text,
        expected: `${isNumber ? words : 'a number'}, or a blank where there is none`,
        hint: valueHint(text.trim(), isNumber && quantity === 'temperature'),
      });
    }
  };
}

function valueHint(text: string, isTemperature: boolean): string {
  if (/^[+-]?\d[\d.,' ]*[.,' ][\d]+$/.test(text) && !isTemperature) {
    return 'Say how numbers are written, such as record.decimal: comma and record.thousands: point.';
  }
  const missing = `If this stands for a missing value, say so: record.missing: [${quoted(text)}].`;
  if (!isTemperature) return missing;
  return `${missing} If it is right, widen record.band; its rule may leave such values out.`;
}

/** Tells a mark for a missing value, by its word or its number, or a blank of spaces. */
function missingMark(
  marks: readonly string[],
  toNumber: (text: string) => number,
): (text: string, number: number) => boolean {
  const words = new Set(['', ...marks.map((mark) => mark.trim().toLowerCase())]);
  const numbers = new Set(
    marks
      .filter((mark) => mark.trim() !== '')
      .flatMap((mark) => [toNumber(mark), Number(mark)])
      .filter((number) => !Number.isNaN(number)),
  );
  const some = numbers.size > 0;
  return (text, number) =>
    Number.isNaN(number) ? words.has(text.trim().toLowerCase()) : some && numbers.has(number);
}

/** The text as YAML takes for one value: a decimal comma would part it into two. */
function quoted(text: string): string {
  return /^[\w.-]+$/.test(text) ? text : `'${text.replaceAll("'", "''")}'`;
}
