import { createHash } from 'node:crypto';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { type OutputFile, writeFiles } from '../../src/output/write-files.ts';

/** Changes of the disk that still succeed; then the run is dead and every further one fails. */
const alive = vi.hoisted(() => ({ steps: Number.POSITIVE_INFINITY }));

vi.mock('node:fs/promises', async (importOriginal) => {
  const fs = await importOriginal<typeof import('node:fs/promises')>();
  const mortal = (name: 'rename' | 'rm' | 'rmdir' | 'writeFile' | 'mkdir') =>
    ((...args: unknown[]) => {
      alive.steps--;
      if (alive.steps < 0) return Promise.reject(new Error('killed'));
      return (fs[name] as (...all: unknown[]) => Promise<unknown>)(...args);
    }) as never;
  const names = ['rename', 'rm', 'rmdir', 'writeFile', 'mkdir'] as const;
  return { ...fs, ...Object.fromEntries(names.map((name) => [name, mortal(name)])) };
});

let directory: string;

beforeEach(() => {
  directory = mkdtempSync(join(tmpdir(), 'daystrain-'));
  alive.steps = Number.POSITIVE_INFINITY;
});

afterEach(() => rmSync(directory, { recursive: true }));

type Contents = Readonly<Record<string, string>>;

const OLD: Contents = { 'a.csv': 'old a', 'same.csv': 'same', 'gone.csv': 'old gone' };
const NEW: Contents = { 'a.csv': 'new a', 'same.csv': 'same', 'more.csv': 'new more' };

function write(contents: Contents): Promise<void> {
  const files: OutputFile[] = Object.entries(contents).map(([name, content]) => ({
    name,
    content,
  }));
  const hashed = files.map(({ name, content }) => ({
    name,
    sha256: createHash('sha256').update(content).digest('hex'),
  }));
  const manifest = JSON.stringify({ program: 'daystrain', files: hashed });
  return writeFiles(directory, files, manifest);
}

/** Writes until so many changes of the disk are done; true where it was killed. */
async function killedAfter(steps: number, contents: Contents): Promise<boolean> {
  alive.steps = steps;
  const killed = await write(contents).then(
    () => alive.steps < 0,
    () => true,
  );
  alive.steps = Number.POSITIVE_INFINITY;
  return killed;
}

/** What the folder's manifest lists, as it stands there; `null` without a manifest. */
function result(): Contents | null {
  if (!existsSync(join(directory, 'manifest.json'))) return null;
  const { files } = JSON.parse(readFileSync(join(directory, 'manifest.json'), 'utf8'));
  return Object.fromEntries(
    files.map(({ name }: { name: string }) => [name, readFileSync(join(directory, name), 'utf8')]),
  );
}

const listed = () => readdirSync(directory).sort();

describe('a run killed after any change of the disk', () => {
  it('leaves a whole result or none that looks like one, and the old one can be had back', async () => {
    let steps = 0;
    let half = 0;
    for (; ; steps++) {
      rmSync(directory, { recursive: true });
      await write(OLD);
      if (!(await killedAfter(steps, NEW))) break;
      const found = result();
      if (found === null) half++;
      else expect([OLD, NEW]).toContainEqual(found);
      await write(found === null ? OLD : NEW);
      expect(result()).toEqual(found === null ? OLD : NEW);
      expect(listed()).toEqual(
        [...Object.keys(found === null ? OLD : NEW), 'manifest.json'].sort(),
      );
    }
    expect(steps).toBeGreaterThan(12);
    expect(half).toBeGreaterThan(4);
  });

  it('leaves the old files where the next run is killed too', async () => {
    const first = 9;
    for (let second = 0; ; second++) {
      rmSync(directory, { recursive: true });
      await write(OLD);
      expect(await killedAfter(first, NEW)).toBe(true);
      expect(result()).toBeNull();
      const killed = await killedAfter(second, NEW);
      const texts = listed().map((name) => readFileSync(join(directory, name), 'utf8'));
      if (!killed) break;
      if (JSON.stringify(result()) !== JSON.stringify(NEW)) {
        for (const text of Object.values(OLD)) expect(texts).toContain(text);
      }
      await write(NEW);
      expect(result()).toEqual(NEW);
      expect(listed()).toEqual([...Object.keys(NEW), 'manifest.json'].sort());
    }
    expect(result()).toEqual(NEW);
  });

  it('leaves nothing in the way where it was the first', async () => {
    for (let steps = 0; ; steps++) {
      rmSync(directory, { recursive: true });
      if (!(await killedAfter(steps, NEW))) break;
      await write(OLD);
      expect(result()).toEqual(OLD);
      expect(listed()).toEqual([...Object.keys(OLD), 'manifest.json'].sort());
    }
    expect(result()).toEqual(NEW);
  });
});

describe('a run that is interrupted', () => {
  it('leaves the old result as it was', async () => {
    await write(OLD);
    const files = Object.entries(NEW).map(([name, content]) => ({ name, content }));
    const stopped = AbortSignal.abort(new Error('interrupted'));
    await expect(writeFiles(directory, files, '{}', stopped)).rejects.toThrow('interrupted');
    expect(result()).toEqual(OLD);
    expect(listed()).toEqual([...Object.keys(OLD), 'manifest.json'].sort());
  });
});
