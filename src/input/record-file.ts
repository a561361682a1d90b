import type { Place } from '../issue.ts';
import { cellName } from './cell-name.ts';
import type { FileBytes } from './files.ts';
import { type Findings, report } from './findings.ts';
import type { WrittenTime } from './iso-time.ts';
import { numberForm, numberReader } from './number-form.ts';
import type { RecordClock } from './record-clock.ts';
import { type RecordColumn, recordColumns } from './record-columns.ts';
import type { RecordForm } from './record-form.ts';
import {
  cutLine,
  type RecordLayout,
  recordLayout,
  type WrittenRow,
  writtenRows,
} from './record-layout.ts';
import type { RecordRows } from './record-rows.ts';
import type { RepeatedFaults } from './repeated-faults.ts';
import { cutRows, OpenQuoteError, type TakeRow } from './row-blocks.ts';
import { type Encoding, EncodingError, encodingOf, textBlocks } from './text-blocks.ts';
import type { ValueBounds } from './value-bounds.ts';
import { type DateOrder, orderSaidBy, readTimeNumber, writtenTimeReader } from './written-time.ts';

/** A file of the record, opened. */
export interface RecordFile {
  readonly name: string;
  readonly bytes: FileBytes;
}

/** What reading a file needs to know beside the file. */
export interface RecordReading {
  readonly form: RecordForm;
  readonly bounds: ValueBounds;
  /** Whether times must rise from row to row. */
  readonly refuses: { readonly repeats: boolean; readonly disorder: boolean };
  readonly findings: Findings;
  readonly faults: RepeatedFaults;
}

/** A file whose layout is known. */
export interface PreparedFile extends RecordFile {
  readonly encoding: Encoding;
  readonly layout: RecordLayout;
  /** Date and time of a row, or one of them. */
  readonly time: readonly RecordColumn[];
  readonly channels: readonly RecordColumn[];
  readonly toNumber: (text: string) => number;
  readonly order: DateOrder | null;
  /** The first time in the file that can be read. */
  readonly firstTime: WrittenTime | null;
}

/** Rows and characters that the layout and the form of the numbers are found from. */
const ROWS_LOOKED_AT = 1000;
const LOOKED_AT = 1 << 16;

/**
 * Finds how a file of the record is written: its encoding, header and columns, numbers, and the order of its dates.
 *
 * @returns `null` with a fault or where the file leaves a question open, which is reported
 */
export async function prepareFile(
  file: RecordFile,
  { form, findings }: RecordReading,
): Promise<PreparedFile | null> {
  const encoding = form.encoding ?? (await encodingOf(file.bytes));
  const written = await firstRows(file, encoding, findings);
  if (written === null) return null;
  const wanted = form.mapping && [...form.mapping.entries.keys()];
  const layout = recordLayout(written, wanted, form.layout);
  const columns = recordColumns(layout, file.name, form.mapping, findings);
  if (columns === null) return null;
  const time = columns.filter(({ measure }) => measure === null);
  const channels = columns.filter(({ measure }) => measure !== null);
  const rows = written
    .filter(({ text, line }) => line >= layout.dataLine && text !== '')
    .map(({ text }) => cutLine(text, layout.separator));
  const toNumber = numbersOf(rows, channels, { file, layout, form, findings });
  if (toNumber === null) return null;
  const found = { ...file, encoding, layout, time, channels, toNumber };
  const order = form.order ?? (await orderOf(found, findings));
  if (order === undefined) return null;
  const read = timeReader({ time, order, toNumber }, form);
  const firstTime = rows.map((cells) => read(timeText(cells, time))).find((t) => t !== null);
  return { ...found, order, firstTime: firstTime ?? null };
}

async function firstRows(
  { name, bytes }: RecordFile,
  encoding: Encoding,
  findings: Findings,
): Promise<WrittenRow[] | null> {
  let start = '';
  try {
    for await (const text of textBlocks(bytes, encoding)) {
      start += text;
      if (start.length >= LOOKED_AT) break;
    }
  } catch (error) {
    return reportFault(error, name, findings);
  }
  // The last line may have been cut short, which turns numbers into others.
  const whole = start.length < LOOKED_AT ? start : start.slice(0, start.lastIndexOf('\n') + 1);
  const rows = writtenRows(whole || start).slice(0, ROWS_LOOKED_AT);
  if (rows.some(({ text }) => text.trim() !== '')) return rows;
  return report(findings, { file: name, line: 1 }, { expected: 'a header row' });
}

interface Numbers {
  readonly file: RecordFile;
  readonly layout: RecordLayout;
  readonly form: RecordForm;
  readonly findings: Findings;
}

function numbersOf(
  rows: readonly (readonly string[])[],
  channels: readonly RecordColumn[],
  { file, layout, form, findings }: Numbers,
): ((text: string) => number) | null {
  const samples = rows.flatMap((cells) => channels.map(({ index }) => cells[index] ?? ''));
  const numbers = numberForm(samples, form.numbers);
  if (!('unclear' in numbers)) return numberReader(numbers);
  const place = { file: file.name, line: layout.dataLine };
  return report(findings, place, {
    found: numbers.unclear,
    expected: 'numbers whose decimal mark is clear',
    hint: 'Say in the job whether the comma marks decimals or thousands: record.decimal: comma, or record.thousands: comma.',
  });
}

type Found = Omit<PreparedFile, 'order' | 'firstTime'>;

/**
 * The order of day and month, found from the first date with a day over 12.
 * @returns `null` where the dates need none; `undefined` where they leave it open, which is reported
 */
async function orderOf(file: Found, findings: Findings): Promise<DateOrder | null | undefined> {
  let order: DateOrder | null = null;
  let open: { found: string; place: Place } | null = null;
  await throughRows(file, findings, (cells, line) => {
    const text = timeText(cells, file.time);
    const said = orderSaidBy(text);
    if (said === 'none') return open !== null;
    if (said === 'either' || said === 'open') {
      open ??= { found: text, place: placeIn(file.name, cells, line, file.time[0]) };
      return said === 'either';
    }
    order = said;
    return false;
  });
  if (order !== null || open === null) return order;
  const { found, place } = open as { found: string; place: Place };
  const why =
    orderSaidBy(found) === 'open' ? 'the year has two figures' : 'no day of the file is over 12';
  report(findings, place, {
    found,
    expected: `dates whose order of day, month and year is clear: ${why}`,
    hint: 'Say it in the job, such as record.time.order: day-first.',
  });
  return undefined;
}

/** Reads all rows of a file and adds them to the record's. Every fault is reported. */
export async function readFileRows(
  file: PreparedFile,
  rows: RecordRows,
  clock: RecordClock,
  reading: RecordReading,
): Promise<void> {
  const { layout, name, time } = file;
  const { faults, refuses } = reading;
  const width = layout.headers.length;
  const toTime = timeReader(file, reading.form);
  const channels = file.channels.map((column) => channelReader(column, file, rows, reading));
  rows.fileStarts.push(rows.times.length);
  let previous = Number.NEGATIVE_INFINITY;
  if (rows.times.length > 0) previous = rows.times.taken()[rows.times.length - 1];
  await throughRows(file, reading.findings, (cells, line) => {
    if (cells.length < width || cells.slice(width).some((cell) => cell !== '')) {
      const found = `${cells.length} cells`;
      const expected = `${width} cells, as in the header`;
      faults.add('cells', { file: name, line }, { found, expected, ...widthHint(line, layout) });
      return true;
    }
    const text = timeText(cells, time);
    const fault = (kind: keyof typeof TIME_FAULTS) =>
      faults.add(kind, placeIn(name, cells, line, time[0]), {
        found: text,
        ...TIME_FAULTS[kind],
        ...(kind === 'none' ? timeHint(line, file) : {}),
      });
    const written = toTime(text);
    const own = written === null ? 'none' : clock.read(written);
    if (typeof own !== 'number') {
      fault(own);
      return true;
    }
    if (own === previous && refuses.repeats) fault('twice');
    if (own < previous && refuses.disorder) fault('earlier');
    previous = own;
    rows.times.push(own);
    for (const take of channels) take(cells, line);
    return true;
  });
}

const TIME_FAULTS = {
  none: { expected: 'a date and time that there is, such as 2031-01-01T00:00' },
  offset: { expected: 'an offset from UTC in every time or in none' },
  skipped: {
    expected: "a time that the zone's clock shows: it was put forward over this one",
    hint: 'For a clock without summer time leave record.time.zone out.',
  },
  twice: {
    expected: 'each time once',
    hint: 'The row above has the same time. A clock with summer time needs record.time.zone; else say record.repeats: first or last.',
  },
  earlier: {
    expected: 'a time after the row above',
    hint: 'A clock with summer time needs record.time.zone; else say record.disorder: sort.',
  },
} as const;

/** Below the header a logger may write further lines before the data. */
function widthHint(line: number, { headerLine, dataLine }: RecordLayout): { hint?: string } {
  if (line !== dataLine) return {};
  const above =
    headerLine === 0 ? 'above the data' : `between the header in line ${headerLine} and the data`;
  return { hint: `If this line stands ${above}, say where the data begin: record.data_line.` };
}

function timeHint(line: number, { layout, order }: PreparedFile): { hint?: string } {
  if (line === layout.dataLine || order === null) return widthHint(line, layout);
  return { hint: `Dates of this file are read ${order}.` };
}

type TimeParts = Pick<PreparedFile, 'time' | 'order' | 'toNumber'>;

function timeReader(
  { order, toNumber }: TimeParts,
  { timeNumbers }: RecordForm,
): (text: string) => WrittenTime | null {
  if (timeNumbers !== null) return (text) => readTimeNumber(toNumber(text), timeNumbers);
  return writtenTimeReader(order);
}

function timeText(cells: readonly string[], time: readonly RecordColumn[]): string {
  const first = (cells[time[0].index] ?? '').trim();
  return time.length === 1 ? first : `${first} ${(cells[time[1].index] ?? '').trim()}`;
}

/** A reader of one channel's cells; each adds a value to the channel. */
function channelReader(
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
        leaveOut({ row: values.length - 1, channel: name, value });
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
  const missing = `If this stands for a missing value, say so: record.missing: [${text}].`;
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
    marks.flatMap((mark) => [toNumber(mark), Number(mark)]).filter((n) => !Number.isNaN(n)),
  );
  const some = numbers.size > 0;
  return (text, number) =>
    Number.isNaN(number) ? words.has(text.trim().toLowerCase()) : some && numbers.has(number);
}

/** Hands the data rows of a file on; a fault of the text itself is reported. */
async function throughRows(
  file: Pick<Found, 'name' | 'bytes' | 'encoding' | 'layout'>,
  findings: Findings,
  take: TakeRow,
): Promise<void> {
  const { dataLine, separator } = file.layout;
  try {
    await cutRows(textBlocks(file.bytes, file.encoding), separator, (cells, line) =>
      line < dataLine ? true : take(cells, line),
    );
  } catch (error) {
    reportFault(error, file.name, findings);
  }
}

function reportFault(error: unknown, file: string, findings: Findings): null {
  if (error instanceof EncodingError) {
    return report(
      findings,
      { file },
      {
        found: 'bytes of another encoding',
        expected: 'text in the encoding that record.encoding names',
        hint: 'Leave record.encoding out to have it found.',
      },
    );
  }
  if (!(error instanceof OpenQuoteError)) throw error;
  return report(
    findings,
    { file, line: error.line },
    {
      found: 'a double quote out of place',
      expected: 'a cell that begins and ends with a double quote, or has none',
      hint: 'Write a double quote inside a quoted cell twice.',
    },
  );
}

/** The place of a row's cell in a column. */
function placeIn(
  file: string,
  cells: readonly string[],
  line: number,
  { index, header }: RecordColumn,
): Place {
  const before = cells.slice(0, index).reduce((length, cell) => length + cell.length + 1, 0);
  return { file, line, column: before + 1, cell: cellName(index, line), key: header };
}
