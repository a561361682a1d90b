import { execFile, execFileSync, spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
  chmodSync,
  closeSync,
  cpSync,
  existsSync,
  ftruncateSync,
  mkdirSync,
  mkdtempSync,
  openSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { build } from 'esbuild';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const JOB = join(import.meta.dirname, '../input/jobs/si');
const BAD = join(import.meta.dirname, '../bad-jobs');
const root = mkdtempSync(join(tmpdir(), 'cli-'));
const cli = join(root, 'built', 'cli.js');

beforeAll(async () => {
  await build({
    absWorkingDir: join(import.meta.dirname, '../..'),
    entryPoints: ['src/cli.ts'],
    bundle: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    outdir: join(root, 'built'),
    external: ['canvas'],
    banner: {
      js: "import { createRequire } from 'node:module'; const require = createRequire(import.meta.url);",
    },
  });
  writeFileSync(join(root, 'built', 'package.json'), '{"type":"module","version":"0.0.0"}');
});

afterAll(() => {
  if (disk !== null) execFileSync('umount', [disk]);
  rmSync(root, { recursive: true });
});

interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** Runs the command line to its end. */
async function daystrain(...args: string[]): Promise<Outcome> {
  return runAs({}, args);
}

/** The same as another user of the machine. */
async function runAs(user: { uid?: number }, args: readonly string[]): Promise<Outcome> {
  try {
    const options = { cwd: root, ...user };
    const { stdout, stderr } = await promisify(execFile)('node', [cli, ...args], options);
    return { code: 0, out: stdout, err: stderr };
  } catch (error) {
    const { code, stdout, stderr } = error as { code: number; stdout: string; stderr: string };
    return { code, out: stdout, err: stderr };
  }
}

const screen = (job: string, out: string) =>
  daystrain('screen', job, '--out', out, '--charts', 'none');

/** A copy of the job in a new folder. */
function copy(name: string): string {
  const folder = join(root, name);
  cpSync(JOB, folder, { recursive: true });
  return folder;
}

/** True where the folder holds a manifest and every file that it lists, whole. */
function isWhole(folder: string): boolean {
  const { files } = JSON.parse(readFileSync(join(folder, 'manifest.json'), 'utf8'));
  return files.every(
    ({ name, sha256 }: { name: string; sha256: string }) =>
      createHash('sha256')
        .update(readFileSync(join(folder, name)))
        .digest('hex') === sha256,
  );
}

describe('the command line', () => {
  it('screens, with results on stdout and exit code 0', async () => {
    const { code, out } = await screen(JOB, join(root, 'plain'));
    expect(code).toBe(0);
    expect(out).toContain('Results in');
    expect(isWhole(join(root, 'plain'))).toBe(true);
  });

  it('tells ten errors in full and counts the rest, or all of them', async () => {
    const folder = copy('many');
    const rows = Array.from({ length: 14 }, (_, i) => `x${i},70 kg,23e-6 / K,450 mm^2`);
    writeFileSync(join(folder, 'members.csv'), `id,modulus,expansion,area\n${rows.join('\n')}\n`);
    const out = join(root, 'many-out');
    const short = await screen(folder, out);
    const members = (text: string) => text.match(/^members\.csv/gm)?.length;
    expect(short.code).toBe(2);
    expect(members(short.err)).toBeLessThanOrEqual(10);
    expect(short.err).toMatch(/… and \d+ more errors: --all-errors shows all\./);
    const all = await daystrain('screen', folder, '--out', out, '--all-errors');
    expect(members(all.err)).toBe(14);
    expect(all.err).not.toContain('more errors');
    expect(existsSync(out)).toBe(false);
  });

  it.each(['screen', 'check'])('%s ends with 2 where the input is wrong', async (command) => {
    const { code, out, err } = await daystrain(command, join(BAD, 'unknown-key'));
    expect(code).toBe(2);
    expect(out).toBe('');
    expect(err).toContain('2 errors. Nothing was written.');
  });

  it('ends with 2 where a folder stands in place of a file, or nothing does', async () => {
    const folder = copy('folder-for-file');
    rmSync(join(folder, 'members.csv'));
    mkdirSync(join(folder, 'members.csv'));
    expect(await daystrain('check', folder)).toMatchObject({
      code: 2,
      err: expect.stringContaining('This is a folder.'),
    });
    expect(await daystrain('check', join(root, 'nowhere'))).toMatchObject({ code: 2 });
  });

  it('ends with 2 where a file may not be read or a folder not be written', async () => {
    // Whoever may do everything runs this as a user who may not.
    const user = process.getuid?.() === 0 ? { uid: 65534 } : {};
    const folder = copy('locked');
    for (const path of [root, join(root, 'built'), folder]) chmodSync(path, 0o755);
    const locked = join(root, 'locked-out');
    mkdirSync(locked, { mode: 0o555 });
    const unwritten = await runAs(user, ['screen', folder, '--out', locked, '--charts', 'none']);
    expect(unwritten).toMatchObject({ code: 2, err: expect.stringContaining('EACCES') });
    expect(readdirSync(locked)).toEqual([]);
    chmodSync(join(folder, 'members.csv'), 0);
    const unread = await runAs(user, ['check', folder]);
    expect(unread.code).toBe(2);
    expect(unread.err).toContain('You may not read this file.');
  });

  it('starts a job, checks it and screens it', async () => {
    const folder = join(root, 'fresh');
    expect((await daystrain('start', folder)).code).toBe(0);
    expect((await daystrain('check', folder)).out).toContain('can be screened');
    expect((await screen(folder, join(root, 'fresh-out'))).code).toBe(0);
    expect((await daystrain('start', folder)).code).toBe(2);
  });
});

describe('ids, titles and cells that mean harm', () => {
  it('write nothing outside their folder', async () => {
    const folder = copy('harm');
    const job = readFileSync(join(folder, 'job.yaml'), 'utf8');
    writeFileSync(join(folder, 'job.yaml'), job.replace(/^title:.*$/m, 'title: ../../escape'));
    const before = readdirSync(root);
    expect((await screen(folder, join(root, 'harm-out'))).code).toBe(0);
    expect(readdirSync(root).filter((name) => !before.includes(name))).toEqual(['harm-out']);
    const runs = readFileSync(join(folder, 'runs.csv'), 'utf8');
    for (const id of ['../R1', '..', '/tmp/R1', 'R1\\x', 'con', 'R1\u0000']) {
      writeFileSync(join(folder, 'runs.csv'), runs.replace(/^R1,/m, `${id},`));
      expect((await screen(folder, join(root, 'harm-out-2'))).code).toBe(2);
    }
    expect(existsSync(join(root, 'harm-out-2'))).toBe(false);
  });

  it('of ten megabytes are named and not repeated', async () => {
    const folder = copy('large');
    const runs = readFileSync(join(folder, 'runs.csv'), 'utf8');
    for (const cell of ['9'.repeat(1e7), `"${'x,'.repeat(5e6)}"`]) {
      writeFileSync(join(folder, 'runs.csv'), runs.replace(/^R1,/m, `${cell},`));
      const { code, err } = await daystrain('check', folder);
      expect(code).toBe(2);
      expect(err).toMatch(/1000000[01] characters/);
      expect(err.length).toBeLessThan(5000);
    }
    const job = readFileSync(join(folder, 'job.yaml'), 'utf8');
    writeFileSync(join(folder, 'runs.csv'), runs);
    writeFileSync(
      join(folder, 'job.yaml'),
      job.replace(/^title:.*$/m, `title: ${'9'.repeat(1e7)}`),
    );
    const { code, err } = await daystrain('check', folder);
    expect(code).toBe(2);
    expect(err.length).toBeLessThan(5000);
  });
});

describe('a run that is ended from outside', () => {
  /** Ends the screening with a signal after a while, and waits for it. */
  async function endedAfter(ms: number, signal: 'SIGINT' | 'SIGKILL', job: string, out: string) {
    const child = spawn('node', [cli, 'screen', job, '--out', out, '--charts', 'none']);
    const ended = new Promise((resolve) => child.on('exit', resolve));
    const timer = setTimeout(() => child.kill(signal), ms);
    await ended;
    clearTimeout(timer);
  }

  it.each(['SIGINT', 'SIGKILL'] as const)(
    'by %s leaves a whole result, the old or the new one',
    async (signal) => {
      const first = copy(`first-${signal}`);
      const second = copy(`second-${signal}`);
      const job = readFileSync(join(second, 'job.yaml'), 'utf8');
      writeFileSync(join(second, 'job.yaml'), job.replace(/^title:.*$/m, 'title: another'));
      const out = join(root, `out-${signal}`);
      const started = Date.now();
      await screen(first, out);
      const whole = Date.now() - started;
      const title = () => JSON.parse(readFileSync(join(out, 'manifest.json'), 'utf8')).title;
      // Spread over the last part of a run, where the files are written.
      for (let i = 0; i < 5; i++) {
        await endedAfter(whole * (0.6 + 0.1 * i), signal, second, out);
        if (existsSync(join(out, 'manifest.json'))) expect(isWhole(out)).toBe(true);
        await screen(first, out);
        expect(title()).not.toBe('another');
        expect(isWhole(out)).toBe(true);
        expect(readdirSync(out).filter((name) => name.endsWith('.tmp'))).toEqual([]);
      }
    },
  );
});

const DISK = 256 * 1024;

/** A small disk; `null` where this machine lets nobody mount one. */
function smallDisk(): string | null {
  const folder = join(root, 'disk');
  mkdirSync(folder);
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', `size=${DISK}`, 'tmpfs', folder], {
      stdio: 'ignore',
    });
    return folder;
  } catch {
    return null;
  }
}

const disk = smallDisk();

/** Takes all the room there is but for 8 kB, which some of the results fit in and not all. */
function fill(path: string): void {
  const file = openSync(path, 'w');
  let size = 0;
  try {
    for (;;) size += writeSync(file, Buffer.alloc(4096));
  } catch {
    ftruncateSync(file, size - 8192);
  }
  closeSync(file);
}

describe.skipIf(disk === null)('a full disk', () => {
  it('loses no old result and leaves no half of a new one', async () => {
    const out = join(String(disk), 'out');
    expect(await screen(JOB, out)).toMatchObject({ code: 0 });
    const before = readdirSync(out);
    fill(join(String(disk), 'filler'));
    const full = await screen(JOB, out);
    expect(full).toMatchObject({ code: 2, err: expect.stringContaining('ENOSPC') });
    expect(readdirSync(out)).toEqual(before);
    expect(isWhole(out)).toBe(true);
    const none = await screen(JOB, join(String(disk), 'other'));
    expect(none).toMatchObject({ code: 2, err: expect.stringContaining('ENOSPC') });
    expect(readdirSync(String(disk)).sort()).toEqual(['filler', 'out']);
  });
});
