import { open, realpath, stat } from 'node:fs/promises';
import { basename, dirname, isAbsolute, join, relative, resolve, sep } from 'node:path';
import { InputError } from '../issue.ts';
import type { Job } from '../model.ts';
import { REMEDIED_MARK } from '../output/remedied-job/remedied-job-yaml.ts';

/** Where a job with its remedies in is to be written, and what it is made from. */
export interface RemediedTarget {
  readonly path: string;
  /** The job file that it is made from. */
  readonly jobFile: string;
  /** A file's name as the new job must have it, from the name in the old one. */
  readonly relocate: (name: string) => string;
}

/**
 * Looks whether a job with its remedies in may be written to a file: a job file of its own, that is none of the files
 * that the job was read from.
 *
 * @param path where it is to be written
 * @param jobPath the job file that was read, or a folder that holds job.yaml
 * @throws InputError where it may not be written there
 */
export async function remediedTarget(
  path: string,
  jobPath: string,
  job: Job,
): Promise<RemediedTarget> {
  const reject = (found: string, expected: string, hint?: string) =>
    new InputError([{ place: { file: path }, found, expected, ...(hint ? { hint } : {}) }]);
  if (!/\.ya?ml$/i.test(path)) {
    throw reject(basename(path), 'a name that ends in .yaml');
  }
  const jobFile = (await stat(jobPath)).isDirectory() ? join(jobPath, 'job.yaml') : jobPath;
  const folder = dirname(jobFile);
  const from = await realpath(folder);
  const to = await realpath(dirname(path)).catch(() => null);
  if (to === null) throw reject(dirname(path), 'a folder that is there');
  const inputs = [jobFile, ...job.inputs.map(({ name }) => resolve(folder, name))];
  for (const input of inputs) {
    if (await isSameFile(input, path)) {
      throw reject('a file of the job', 'another file', 'The job itself is never written over.');
    }
  }
  if (!(await isOurs(path))) {
    const expected = 'no file, or one that --write-remedied wrote';
    throw reject('a file of another origin', expected, 'Move it away, or name another file.');
  }
  const relocate = (name: string) =>
    isAbsolute(name) ? name : relative(to, join(from, name)).replaceAll(sep, '/');
  return { path, jobFile, relocate };
}

async function isSameFile(one: string, other: string): Promise<boolean> {
  const [a, b] = await Promise.all([one, other].map((path) => stat(path).catch(() => null)));
  return a !== null && b !== null && a.ino === b.ino && a.dev === b.dev;
}

/** True where nothing stands there, or a file that begins as ours do. */
async function isOurs(path: string): Promise<boolean> {
  const file = await open(path).catch((error: NodeJS.ErrnoException) => {
    if (error.code === 'ENOENT') return null;
    throw error;
  });
  if (file === null) return true;
  try {
    const mark = Buffer.from(REMEDIED_MARK);
    const { buffer, bytesRead } = await file.read(Buffer.alloc(mark.length), 0, mark.length, 0);
    return bytesRead === mark.length && mark.equals(buffer);
  } catch {
    return false;
  } finally {
    await file.close();
  }
}
