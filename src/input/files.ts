import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { resolve } from 'node:path';
import type { Place } from '../issue.ts';
import type { InputFile } from '../model.ts';
import { type Findings, report } from './findings.ts';

/** The files of a job. This is the one place that opens any. */
export interface Files {
  /**
   * The text of a file, without a byte order mark; `null` where it cannot be read, which is reported.
   * @param name as the user wrote it, relative to the job's folder
   * @param place where the user wrote it
   */
  read(name: string, place: Place, findings: Findings): Promise<string | null>;
  /** Every file read so far, in order, each once. */
  readonly inputs: InputFile[];
}

/** The files below, or named from, a folder. */
export function filesOf(folder: string): Files {
  const inputs: InputFile[] = [];
  return {
    inputs,
    async read(name, place, findings) {
      const bytes = await readFile(resolve(folder, name)).catch((error: NodeJS.ErrnoException) =>
        reportUnread(error, name, place, findings),
      );
      if (bytes === null) return null;
      if (!inputs.some((input) => input.name === name)) {
        inputs.push({ name, sha256: createHash('sha256').update(bytes).digest('hex') });
      }
      return decode(bytes, name, findings);
    },
  };
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
  };
  const hint = why[error.code ?? ''] ?? `It could not be read (${error.code}).`;
  return report(findings, place, { found: name, expected: 'a file that can be read', hint });
}

function decode(bytes: Buffer, name: string, findings: Findings): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    const hint = 'Save the file again as UTF-8.';
    const found = 'bytes of another encoding';
    return report(findings, { file: name }, { found, expected: 'text in UTF-8', hint });
  }
}
