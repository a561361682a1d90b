import { createHash } from 'node:crypto';
import type { Stats } from 'node:fs';
import { open, readFile, stat } from 'node:fs/promises';
import { resolve } from 'node:path';
import type { Place } from '../issue.ts';
import type { InputFile } from '../model.ts';
import { decodeTable, isWorkbook } from './decode-table.ts';
import { type Findings, report } from './findings.ts';

/** The files of a job. This is the one place that opens any. */
export interface Files {
  /**
   * The text of a file, without a byte order mark; `null` where it cannot be read, which is reported.
   * @param name as the user wrote it, relative to the job's folder
   * @param place where the user wrote it
   */
  read(name: string, place: Place, findings: Findings): Promise<string | null>;
  /**
   * Opens a file that may be too long for one text; `null` where it cannot be, which is reported.
   * @param name as the user wrote it, relative to the job's folder
   * @param place where the user wrote it
   */
  open(name: string, place: Place, findings: Findings): Promise<FileBytes | null>;
  /** Every file read so far, in order, each once. */
  readonly inputs: InputFile[];
}

/** The bytes of one file. */
export interface FileBytes {
  /** Size of the file [bytes]. */
  readonly size: number;
  /** The bytes from the start, block after block. May be gone through more than once. */
  blocks(): AsyncIterable<Uint8Array>;
}

/** Bytes read at a time. */
const BLOCK = 1 << 20;

/** The files below, or named from, a folder. */
export function filesOf(folder: string): Files {
  const inputs: InputFile[] = [];
  return {
    inputs,
    async read(name, place, findings) {
      const path = resolve(folder, name);
      const bytes = await readWhole(path).catch((error: NodeJS.ErrnoException) =>
        reportUnread(error, name, place, findings),
      );
      if (bytes === null) return null;
      if (!inputs.some((input) => input.name === name)) {
        inputs.push({ name, sha256: createHash('sha256').update(bytes).digest('hex') });
      }
      return decodeTable(bytes, name, findings);
    },
    async open(name, place, findings) {
      const path = resolve(folder, name);
      const size = await sizeOf(path).catch((error: NodeJS.ErrnoException) =>
        reportUnread(error, name, place, findings),
      );
      if (size === null) return null;
      const input = { name, sha256: '' };
      if (!inputs.some((input) => input.name === name)) inputs.push(input);
      const tellHash = (sha256: string) => Object.assign(input, { sha256 });
      return { size, blocks: () => readBlocks(path, input.sha256 === '' ? tellHash : null) };
    },
  };
}

/** No job and no table is longer [bytes]; a record may be. */
const LONGEST_TABLE = 1e8;

async function readWhole(path: string): Promise<Buffer> {
  if ((await sizeOf(path)) > LONGEST_TABLE) throw codedError(path, 'over 100 MB, no job or table');
  return readFile(path);
}

async function sizeOf(path: string): Promise<number> {
  const found = await stat(path);
  // Reading from a pipe or a device may never end.
  if (!found.isFile()) throw codedError(path, codeOf(found));
  const file = await open(path);
  const { buffer } = await file.read(Buffer.alloc(8), 0, 8);
  await file.close();
  if (isWorkbook(buffer)) throw codedError(path, 'workbook');
  return found.size;
}

function codedError(path: string, code: string): NodeJS.ErrnoException {
  return Object.assign(new Error(path), { code });
}

function codeOf(found: Stats): string {
  return found.isDirectory() ? 'EISDIR' : 'no regular file';
}

/**
 * Reads a file to its end, and then tells its hash.
 * @param tellHash `null` where it is known
 */
async function* readBlocks(
  path: string,
  tellHash: ((sha256: string) => void) | null,
): AsyncGenerator<Uint8Array> {
  const hash = tellHash === null ? null : createHash('sha256');
  const file = await open(path);
  try {
    for (;;) {
      const { buffer, bytesRead } = await file.read(new Uint8Array(BLOCK), 0, BLOCK);
      if (bytesRead === 0) break;
      const bytes = buffer.subarray(0, bytesRead);
      hash?.update(bytes);
      yield bytes;
    }
    if (hash !== null) tellHash?.(hash.digest('hex'));
  } finally {
    await file.close();
  }
}

function reportUnread(
  error: NodeJS.ErrnoException,
  name: string,
  place: Place,
  findings: Findings,
): null {
  const why: Record<string, string> = {
    ENOENT: 'There is no file of this name. Names are relative to the job file.',
    EISDIR: 'This is a folder.',
    EACCES: 'You may not read this file.',
    workbook: 'This is a workbook of a spreadsheet: save the sheet as CSV and name that.',
  };
  const hint = why[error.code ?? ''] ?? `It could not be read (${error.code}).`;
  return report(findings, place, { found: name, expected: 'a file that can be read', hint });
}
