import { randomBytes } from 'node:crypto';
import { rename, rm, writeFile } from 'node:fs/promises';
import { InputError } from '../../issue.ts';

/** A file that is written and not yet in its place. */
export interface StagedFile {
  /** Puts it in its place, over what stood there. */
  place(): Promise<void>;
  /** Takes it away again. */
  discard(): Promise<void>;
}

/**
 * Writes a file under a temporary name beside its place, so that it can be put there or not as one step.
 *
 * @throws InputError where its folder cannot be written to
 */
export async function stageFile(path: string, text: string): Promise<StagedFile> {
  const staged = `${path}.${randomBytes(4).toString('hex')}.tmp`;
  try {
    await writeFile(staged, text, { flag: 'wx' });
  } catch (error) {
    throw new InputError([
      {
        place: { file: path },
        found: error instanceof Error ? error.message : String(error),
        expected: 'a file in a folder that is there and can be written to',
      },
    ]);
  }
  return {
    place: () => rename(staged, path),
    discard: () => rm(staged, { force: true }),
  };
}
