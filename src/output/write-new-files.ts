import { access, mkdir, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { InputError, type Issue } from '../issue.ts';
import type { OutputFile } from './write-files.ts';

/**
 * Writes files into a folder that must hold none of them yet, all or none.
 *
 * @param directory made where it does not exist
 * @param files plain names, the one that makes the others useful last
 * @throws InputError with every file that stands there already, or where the folder cannot be written
 */
export async function writeNewFiles(
  directory: string,
  files: readonly OutputFile[],
): Promise<void> {
  const paths = files.map(({ name }) => join(directory, name));
  const there = await Promise.all(
    paths.map((path) =>
      access(path).then(
        () => path,
        () => null,
      ),
    ),
  );
  const issues = there.filter((path) => path !== null).map(standsThere);
  if (issues.length > 0) throw new InputError(issues);
  const written: string[] = [];
  try {
    await mkdir(directory, { recursive: true });
    for (const [i, { content }] of files.entries()) {
      await writeFile(paths[i], content, { flag: 'wx' });
      written.push(paths[i]);
    }
  } catch (error) {
    const exists = error instanceof Error && 'code' in error && error.code === 'EEXIST';
    // A file that could only be written in part is ours too.
    const ours = exists ? written : paths.slice(0, written.length + 1);
    for (const path of ours) await rm(path, { force: true }).catch(() => undefined);
    const found = error instanceof Error ? error.message : String(error);
    const expected = 'a folder that files can be written to';
    throw new InputError([{ place: { file: directory }, found, expected }]);
  }
}

function standsThere(path: string): Issue {
  return {
    place: { file: path },
    found: 'a file of this name',
    expected: 'none',
    hint: 'Name another folder.',
  };
}
