import { randomBytes } from 'node:crypto';
import { lstat, mkdir, readFile, rename, rm, rmdir, writeFile } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { InputError, type Issue } from '../issue.ts';
import { leftoverName, mendFolder } from './leftovers.ts';

/** A file to write: a plain name without a folder, and its whole content. */
export interface OutputFile {
  readonly name: string;
  readonly content: string | Uint8Array;
}

export const MANIFEST = 'manifest.json';

/**
 * Writes all files and the manifest into a folder, or none. Everything is written under temporary names first. Then
 * the old manifest is set aside, the files are renamed, and the new manifest is renamed last: a folder with a
 * manifest holds a whole result at every moment, and what a killed run left behind is put right by the next one.
 * Files that the folder's old manifest lists are replaced, and removed where they are not written again; any
 * other file is left as it is.
 *
 * @param directory made where it does not exist
 * @param files plain names, none twice
 * @param manifest JSON text with `program` `daystrain` and `files` as a list of `{ name, sha256 }`
 * @param interrupted stops the writing where it is aborted before the end
 * @throws InputError where a file stands in the way that no manifest lists, or the folder cannot be
 *   written; the folder is then as it was
 * @throws the signal's reason where interrupted; the folder is then as it was
 */
export async function writeFiles(
  directory: string,
  files: readonly OutputFile[],
  manifest: string,
  interrupted?: AbortSignal,
): Promise<void> {
  rejectBadNames(files);
  await mend(directory);
  const ours = await readOldManifest(directory);
  await rejectStrangers(directory, files, ours);
  const all = [...files, { name: MANIFEST, content: manifest }];
  const stale = ours.filter((name) => !all.some((file) => file.name === name));
  try {
    await replaceAll(directory, all, { stale, interrupted });
  } catch (error) {
    throw isFileError(error) ? cannotWrite(directory, error) : error;
  }
}

/** A wrong name here is a fault of the program, not of the user. */
function rejectBadNames(files: readonly OutputFile[]): void {
  const names = files.map((file) => file.name);
  const bad = names.find((name, i) => !isPlainName(name) || names.indexOf(name) !== i);
  if (bad !== undefined) throw new Error(`"${bad}" is no name for a result file`);
}

function isPlainName(name: string): boolean {
  return /^[^/\\\0]+$/.test(name) && basename(name) === name && !/^\.|^manifest\.json$/.test(name);
}

/** Names that the old manifest lists; none where there is no manifest. */
async function readOldManifest(directory: string): Promise<string[]> {
  const path = join(directory, MANIFEST);
  const text = await readFile(path, 'utf8').catch((error: unknown) => {
    if (isFileError(error) && (error.code === 'ENOENT' || error.code === 'ENOTDIR')) return null;
    throw isFileError(error) ? cannotWrite(directory, error) : error;
  });
  if (text === null) return [];
  const names = listedNames(text);
  if (names === null) throw new InputError([inTheWay(path)]);
  return [...names.filter(isPlainName), MANIFEST];
}

/** The files that a manifest of this program lists, or `null` where the text is no such manifest. */
function listedNames(text: string): string[] | null {
  try {
    const { program, files } = JSON.parse(text);
    if (program !== 'daystrain') return null;
    return files.map((file: { name: unknown }) => String(file.name));
  } catch {
    return null;
  }
}

async function rejectStrangers(
  directory: string,
  files: readonly OutputFile[],
  ours: readonly string[],
): Promise<void> {
  const issues: Issue[] = [];
  for (const { name } of files) {
    const path = join(directory, name);
    const found = await lstat(path).catch(() => null);
    if (found !== null && (found.isDirectory() || !ours.includes(name)))
      issues.push(inTheWay(path));
  }
  if (issues.length > 0) throw new InputError(issues);
}

interface Replacing {
  /** Old files that are not written again. */
  readonly stale: readonly string[];
  readonly interrupted: AbortSignal | undefined;
}

/** Puts new files in place of old ones; undoes all of it where one step fails. */
async function replaceAll(
  directory: string,
  files: readonly OutputFile[],
  { stale, interrupted }: Replacing,
): Promise<void> {
  const tag = randomBytes(4).toString('hex');
  const at = (name: string) => join(directory, name);
  const fresh = (name: string) => at(leftoverName({ name, tag, kind: 'new' }));
  const kept = (name: string) => at(leftoverName({ name, tag, kind: 'old' }));
  const made = await mkdir(directory, { recursive: true });
  const undo: (() => Promise<unknown>)[] = [
    () => (made === undefined ? Promise.resolve() : rmdir(directory)),
  ];
  const step = (action: () => Promise<unknown>, back: () => Promise<unknown>) => {
    interrupted?.throwIfAborted();
    undo.push(back);
    return action();
  };
  try {
    for (const { name, content } of files) {
      await step(
        () => writeFile(fresh(name), content, { flag: 'wx' }),
        () => rm(fresh(name), { force: true }),
      );
    }
    const old: string[] = [];
    const names = files.map(({ name }) => name);
    // Without its manifest the folder holds no result, until the new one is whole.
    for (const name of [MANIFEST, ...stale, ...names.filter((one) => one !== MANIFEST)]) {
      interrupted?.throwIfAborted();
      if (await moveIfThere(at(name), kept(name))) {
        old.push(name);
        undo.push(() => rename(kept(name), at(name)));
      }
      if (stale.includes(name) || name === MANIFEST) continue;
      await rename(fresh(name), at(name));
      undo.push(() => rename(at(name), fresh(name)));
    }
    interrupted?.throwIfAborted();
    await rename(fresh(MANIFEST), at(MANIFEST));
    // The new result stands: a leftover of the old one is no reason to report a failure.
    await Promise.allSettled(old.map((name) => rm(kept(name), { force: true })));
  } catch (error) {
    for (const back of undo.reverse()) await back().catch(() => undefined);
    throw error;
  }
}

async function moveIfThere(from: string, to: string): Promise<boolean> {
  try {
    await rename(from, to);
    return true;
  } catch (error) {
    if (isFileError(error) && error.code === 'ENOENT') return false;
    throw error;
  }
}

/** Puts right what a killed run left behind. */
async function mend(directory: string): Promise<void> {
  try {
    await mendFolder(directory, MANIFEST);
  } catch (error) {
    throw isFileError(error) ? cannotWrite(directory, error) : error;
  }
}

function inTheWay(path: string): Issue {
  return {
    place: { file: path },
    found: 'a file that daystrain did not write',
    expected: 'no such file, or one that a manifest.json of daystrain lists',
    hint: 'Nothing was written. Move it away, or name another folder with --out.',
  };
}

function cannotWrite(directory: string, error: NodeJS.ErrnoException): InputError {
  return new InputError([
    {
      place: { file: directory },
      found: error.message,
      expected: 'a folder that files can be written to',
      hint: 'The results that stood there are as they were. Name another folder with --out.',
    },
  ]);
}

function isFileError(error: unknown): error is NodeJS.ErrnoException {
  return error instanceof Error && 'code' in error;
}
