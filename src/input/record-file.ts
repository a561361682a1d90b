import type { Place } from '../issue.ts';
import { cellName } from './cell-name.ts';
import type { FileBytes } from './files.ts';
import { type Findings, report } from './findings.ts';
import type { WrittenTime } from './iso-time.ts';
import type { NumberForm } from './number-form.ts';
import type { RecordColumn } from './record-columns.ts';
import type { RecordForm } from './record-form.ts';
import type { RecordLayout } from './record-layout.ts';
import type { RepeatedFaults } from './repeated-faults.ts';
import { cutRows, RowError, type TakeRow } from './row-blocks.ts';
import { type Encoding, EncodingError, textBlocks } from './text-blocks.ts';
import type { ValueBounds } from './value-bounds.ts';
import type { DateOrder } from './written-time.ts';

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
  readonly numbers: NumberForm;
  readonly toNumber: (text: string) => number;
  readonly order: DateOrder | null;
  /** The first time in the file that can be read. */
  readonly firstTime: WrittenTime | null;
}

/** A file of which all is known but how its dates are ordered. */
export type LaidOutFile = Omit<PreparedFile, 'order' | 'firstTime'>;

/** Hands the data rows of a file on; a fault of the text itself is reported. */
export async function throughRows(
  file: LaidOutFile,
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

/** Reports that a file cannot be cut into rows. */
export function reportFault(error: unknown, file: string, findings: Findings): null {
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
  if (!(error instanceof RowError)) throw error;
  return report(findings, { file, line: error.line }, ROW_FAULTS[error.kind]);
}

const ROW_FAULTS = {
  quote: {
    found: 'a double quote out of place',
    expected: 'a cell that begins and ends with a double quote, or has none',
    hint: 'Write a double quote inside a quoted cell twice.',
  },
  length: {
    found: 'a row of over a million characters',
    expected: 'the rows of a table',
    hint: 'A double quote may be missing at the end of a cell, or the file is of another kind.',
  },
} as const;

/** The place of a row's cell in a column. */
export function placeIn(
  file: string,
  cells: readonly string[],
  line: number,
  { index, header }: RecordColumn,
): Place {
  const before = cells.slice(0, index).reduce((length, cell) => length + cell.length + 1, 0);
  return { file, line, column: before + 1, cell: cellName(index, line), key: header };
}
