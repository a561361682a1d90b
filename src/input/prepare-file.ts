import { dateOrder } from './date-order.ts';
import { type Findings, report } from './findings.ts';
import { type NumberForm, numberForm, numberReader } from './number-form.ts';
import { type RecordColumn, recordColumns } from './record-columns.ts';
import {
  type LaidOutFile,
  type PreparedFile,
  type RecordFile,
  type RecordReading,
  reportFault,
} from './record-file.ts';
import type { RecordForm } from './record-form.ts';
import {
  cutLine,
  type RecordLayout,
  recordLayout,
  type WrittenRow,
  writtenRows,
} from './record-layout.ts';
import { timeReader, timeText } from './row-time.ts';
import { type Encoding, encodingOf, textBlocks } from './text-blocks.ts';

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
  const isSure = headerIsSure(layout, form, findings);
  const columns = recordColumns(layout, file.name, form.mapping, findings);
  if (columns === null || !isSure) return null;
  const time = columns.filter(({ measure }) => measure === null);
  const channels = columns.filter(({ measure }) => measure !== null);
  const rows = written
    .filter(({ text, line }) => line >= layout.dataLine && text !== '')
    .map(({ text }) => cutLine(text, layout.separator));
  const numbers = numbersOf(rows, channels, { file, layout, form, findings });
  if (numbers === null) return null;
  const toNumber = numberReader(numbers);
  const found: LaidOutFile = { ...file, encoding, layout, time, channels, numbers, toNumber };
  const order = form.order ?? (await dateOrder(found, findings));
  if (order === undefined) return null;
  const read = timeReader({ order, toNumber }, form);
  const firstTime = rows.map((cells) => read(timeText(cells, time))).find((t) => t !== null);
  return { ...found, order, firstTime: firstTime ?? null };
}

/** Columns that are all named by number tell nothing of a header, and a first row of data must not pass for one. */
function headerIsSure(layout: RecordLayout, { mapping, ...form }: RecordForm, findings: Findings) {
  if (mapping === null || form.layout.headerLine !== null) return true;
  const names = [...mapping.entries.keys()];
  if (!names.every((name) => /^\d+$/.test(name) && !layout.headers.includes(name))) return true;
  report(findings, mapping.place, {
    found: 'columns named by number alone',
    expected: 'record.header_line beside them: the line of the header, or none',
  });
  return false;
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
): NumberForm | null {
  const samples = rows.flatMap((cells) => channels.map(({ index }) => cells[index] ?? ''));
  const numbers = numberForm(samples, form.numbers);
  if (!('unclear' in numbers)) return numbers;
  const place = { file: file.name, line: layout.dataLine };
  return report(findings, place, {
    found: numbers.unclear,
    expected: 'numbers whose decimal mark is clear',
    hint: 'Say in the job what marks the decimals, record.decimal: point or comma, and what groups the thousands, record.thousands.',
  });
}
