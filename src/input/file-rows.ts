import { channelReader } from './channel-reader.ts';
import type { RecordClock } from './record-clock.ts';
import { type PreparedFile, placeIn, type RecordReading, throughRows } from './record-file.ts';
import type { RecordLayout } from './record-layout.ts';
import type { RecordRows } from './record-rows.ts';
import { timeReader, timeText } from './row-time.ts';

/** Reads all rows of a file and adds them to the record's. Every fault is reported. */
export async function readFileRows(
  file: PreparedFile,
  rows: RecordRows,
  clock: RecordClock,
  reading: RecordReading,
): Promise<void> {
  const { layout, name, time } = file;
  const { faults, refuses } = reading;
  // Headers that are blank at the end of the line stand for no cells.
  const width = layout.headers.findLastIndex((header) => header !== '') + 1;
  const toTime = timeReader(file, reading.form);
  const channels = file.channels.map((column) => channelReader(column, file, rows, reading));
  rows.fileStarts.push(rows.times.length);
  let previous = rows.times.length === 0 ? Number.NEGATIVE_INFINITY : rows.times.last;
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
