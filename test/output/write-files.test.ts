import { mkdir, mkdtemp, readdir, readFile, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { InputError } from '../../src/issue.ts';
import { type OutputFile, writeFiles } from '../../src/output/write-files.ts';

/** The rename to fail at, counted down; 0 lets all pass. */
const failing = vi.hoisted(() => ({ at: 0 }));

vi.mock('node:fs/promises', async (importOriginal) => {
  const fs = await importOriginal<typeof import('node:fs/promises')>();
  const rename: typeof fs.rename = (from, to) => {
    if (failing.at > 0 && --failing.at === 0) {
      return Promise.reject(Object.assign(new Error('EIO: broken disk'), { code: 'EIO' }));
    }
    return fs.rename(from, to);
  };
  return { ...fs, rename };
});

let root: string;
let directory: string;

beforeEach(async () => {
  root = await mkdtemp(join(tmpdir(), 'daystrain-'));
  directory = join(root, 'results');
});

afterEach(() => rm(root, { recursive: true }));

const file = (name: string, content = name): OutputFile => ({ name, content });
const manifestOf = (files: readonly OutputFile[]) =>
  JSON.stringify({ program: 'daystrain', files: files.map(({ name }) => ({ name })) });
const write = (...files: OutputFile[]) => writeFiles(directory, files, manifestOf(files));
const read = (name: string) => readFile(join(directory, name), 'utf8');
const listed = async () => (await readdir(directory)).sort();

test('files and manifest are written, and nothing temporary stays', async () => {
  await write(file('a.csv', '1'), file('b.png', '2'));
  expect(await listed()).toEqual(['a.csv', 'b.png', 'manifest.json']);
  expect(await read('a.csv')).toBe('1');
});

test('files of the old manifest are replaced or removed', async () => {
  await write(file('a.csv', 'old'), file('R1-along.png'));
  await write(file('a.csv', 'new'), file('R2-along.png'));
  expect(await listed()).toEqual(['R2-along.png', 'a.csv', 'manifest.json']);
  expect(await read('a.csv')).toBe('new');
});

test("a stranger's file beside the results is left alone", async () => {
  await write(file('a.csv'));
  await writeFile(join(directory, 'notes.txt'), 'mine');
  await write(file('b.csv'));
  expect(await listed()).toEqual(['b.csv', 'manifest.json', 'notes.txt']);
  expect(await read('notes.txt')).toBe('mine');
});

test("a stranger's file of the same name stops the writing, and all are named", async () => {
  await mkdir(directory);
  await writeFile(join(directory, 'a.csv'), 'mine');
  await writeFile(join(directory, 'b.csv'), 'mine too');
  const error = await write(file('a.csv'), file('b.csv'), file('c.csv')).catch((e) => e);
  expect(error).toBeInstanceOf(InputError);
  expect(error.issues.map(({ place }: { place: { file: string } }) => place.file)).toEqual([
    join(directory, 'a.csv'),
    join(directory, 'b.csv'),
  ]);
  expect(error.message).toContain('a file that daystrain did not write');
  expect(await listed()).toEqual(['a.csv', 'b.csv']);
  expect(await read('a.csv')).toBe('mine');
});

test.each([
  ['another program', '{"name": "an app", "icons": []}'],
  ['nothing readable', 'not JSON'],
])('a manifest.json of %s is not overwritten', async (_, content) => {
  await mkdir(directory);
  await writeFile(join(directory, 'manifest.json'), content);
  await expect(write(file('a.csv'))).rejects.toThrow(InputError);
  expect(await listed()).toEqual(['manifest.json']);
  expect(await read('manifest.json')).toBe(content);
});

test('a manifest that lists a path outside the folder removes nothing there', async () => {
  await mkdir(directory);
  await writeFile(join(root, 'outside.txt'), 'keep');
  const forged = [file('../outside.txt'), file(join(root, 'outside.txt')), file('..')];
  await writeFile(join(directory, 'manifest.json'), manifestOf(forged));
  await write(file('a.csv'));
  expect(await readFile(join(root, 'outside.txt'), 'utf8')).toBe('keep');
});

test.each(['../a.csv', 'sub/a.csv', '/a.csv', '..', '', '.hidden', 'manifest.json', 'a\\b'])(
  'the name "%s" is refused',
  async (name) => {
    await expect(write(file(name))).rejects.toThrow('no name for a result file');
    expect(await readdir(root)).toEqual([]);
  },
);

test('the same name twice is refused', async () => {
  await expect(write(file('a.csv'), file('a.csv'))).rejects.toThrow('no name for a result file');
});

test('a file that cannot be written leaves the old result as it was', async () => {
  await write(file('a.csv', 'old a'), file('b.csv', 'old b'));
  const before = await listed();
  await expect(write(file('a.csv', 'new a'), file('z'.repeat(300)))).rejects.toThrow(InputError);
  expect(await listed()).toEqual(before);
  expect(await read('a.csv')).toBe('old a');
});

test.each([1, 2, 3, 4, 5, 6, 7])(
  'failing at rename %i leaves the old result as it was',
  async (n) => {
    const old = [file('a.csv', 'old a'), file('gone.csv', 'old gone')];
    await write(...old);
    const before = await listed();
    failing.at = n;
    await expect(write(file('a.csv', 'new a'), file('new.csv'))).rejects.toThrow(InputError);
    expect(failing.at).toBe(0);
    expect(await listed()).toEqual(before);
    expect([await read('a.csv'), await read('gone.csv')]).toEqual(['old a', 'old gone']);
    expect(await read('manifest.json')).toBe(manifestOf(old));
  },
);

test('a folder that cannot be made is an input error with its reason', async () => {
  await writeFile(directory, 'a file');
  await expect(write(file('a.csv'))).rejects.toThrow(/results.*found ".*".*expected a folder/s);
  expect(await readFile(directory, 'utf8')).toBe('a file');
});

test('a failed first writing leaves no folder behind', async () => {
  await expect(write(file('z'.repeat(300)))).rejects.toThrow(InputError);
  expect(await readdir(root)).toEqual([]);
});

test('a link of the same name that no manifest lists is not followed', async () => {
  await mkdir(directory);
  await writeFile(join(root, 'target.csv'), 'keep');
  await symlink(join(root, 'target.csv'), join(directory, 'a.csv'));
  await expect(write(file('a.csv'))).rejects.toThrow(InputError);
  expect(await readFile(join(root, 'target.csv'), 'utf8')).toBe('keep');
});
