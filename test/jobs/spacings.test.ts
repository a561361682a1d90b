import { execFile } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { build } from 'esbuild';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const JOB = fileURLToPath(new URL('spacings', import.meta.url));

let directory: string;
let cli: string;

beforeAll(async () => {
  directory = await mkdtemp(join(tmpdir(), 'daystrain-'));
  cli = fileURLToPath(new URL('../../node_modules/.cache/spacings-cli/cli.mjs', import.meta.url));
  const require = "import { createRequire } from 'node:module';";
  await build({
    entryPoints: [fileURLToPath(new URL('../../src/cli.ts', import.meta.url))],
    bundle: true,
    platform: 'node',
    format: 'esm',
    external: ['canvas'],
    logLevel: 'silent',
    banner: { js: `${require} const require = createRequire(import.meta.url);` },
    outfile: cli,
  });
});
afterAll(() => rm(directory, { recursive: true }));

interface Outcome {
  readonly code: number;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs the command with its results in a folder of its own. */
async function spacings(out: string, ...options: string[]): Promise<Outcome> {
  const args = [cli, 'spacings', JOB, '--out', join(directory, out), ...options];
  const done = await promisify(execFile)(process.execPath, args).catch((error) => error);
  return { code: done.code ?? 0, stdout: done.stdout, stderr: done.stderr };
}

const written = (out: string) => readdir(join(directory, out)).catch(() => []);

describe('daystrain spacings', () => {
  it('writes a table, the answer, two charts a case and a manifest that lists them', async () => {
    const step = ['--from', '300 mm', '--to', '1.2 m', '--by', '300 mm'];
    const options = ['--runs', 'row', 'slide', '--at', '24 in', '--pieces', '2'];
    const { code, stdout, stderr } = await spacings('all', ...step, ...options);
    expect({ code, stderr: stderr.match(/^(?!Warning: record)/m)?.[0] ?? '' }).toEqual({
      code: 0,
      stderr: '',
    });
    const files = await written('all');
    expect(files).toEqual([
      'manifest.json',
      'row-all-2-pieces-forces.png',
      'row-all-2-pieces-utilisation.png',
      'slide-middle-2-pieces-forces.png',
      'slide-middle-2-pieces-utilisation.png',
      'spacings.csv',
      'spacings.txt',
    ]);
    const manifest = JSON.parse(await readFile(join(directory, 'all', 'manifest.json'), 'utf8'));
    expect(manifest.spacings).toMatchObject({
      runs: ['row', 'slide'],
      fixed: 'as in the job',
      cuts: [{ pieces: 2 }],
    });
    const asked = [300, 600, 609.6, 900, 1200];
    manifest.spacings.asked_mm.forEach((mm: number, i: number) =>
      expect(mm).toBeCloseTo(asked[i], 9),
    );
    expect(manifest.files.map(({ name }: { name: string }) => name).sort()).toEqual(
      files.filter((name) => name !== 'manifest.json'),
    );
    const text = await readFile(join(directory, 'all', 'spacings.txt'), 'utf8');
    expect(stdout.startsWith(text)).toBe(true);
  });

  it('exits with 1 under --strict where a run passes at no spacing, else with 0', async () => {
    const at = ['--charts', 'none', '--strict', '--at', '600 mm', '--runs'];
    expect((await spacings('a', ...at, 'row')).code).toBe(0);
    expect((await spacings('b', ...at, 'clamp')).code).toBe(1);
    // a run that could not be compared passes nowhere either
    expect((await spacings('c', ...at, 'row', 'lone')).code).toBe(1);
    expect(await written('b')).toEqual(['manifest.json', 'spacings.csv', 'spacings.txt']);
  });

  it('warns of a run that cannot be respaced, and refuses where there is no other', async () => {
    const at = ['--charts', 'none', '--at', '600 mm', '--runs'];
    const { stderr, code } = await spacings('d', ...at, 'row', 'listed', 'lone');
    expect(code).toBe(0);
    expect(stderr).toContain('Warning: listed: its fixed fasteners are given by their numbers');
    expect(stderr).toContain('Warning: lone has one fastener, so it has no spacing.');
    const refused = await spacings('e', ...at, 'listed', 'lone');
    expect(refused.code).toBe(2);
    expect(refused.stderr).toContain('lone has one fastener');
    expect(await written('e')).toEqual([]);
  });

  it.each([
    ['no spacing', [], 'expected spacings to try: --at "300 mm" "600 mm"'],
    ['no unit', ['--at', '600'], '--at  found "600", expected a length over 0 with its unit'],
    ['a unit of its own', ['--at', '600', 'mm'], 'together in quotes: --at "600 mm"'],
    ['a force', ['--at', '6 kN'], '--at  found "6 kN", expected a length'],
    ['nothing', ['--at', '0 mm'], '--at  found "0 mm", expected a length over 0'],
    ['a step alone', ['--by', '100 mm'], '--from  nothing stands here'],
    ['backwards', ['--from', '2 m', '--to', '1 m', '--by', '1 m'], '--to  found "1 m"'],
    ['tiny steps', ['--from', '1 m', '--to', '2 m', '--by', '1 mm'], '--by  found "1 mm"'],
    ['too close', ['--at', '10 mm', '--runs', 'row'], 'has at most 500 fasteners'],
    ['an unknown run', ['--at', '1 m', '--runs', 'rows'], '--runs  found "rows"'],
    ['no whole pieces', ['--at', '1 m', '--pieces', '1.5'], '--pieces  found "1.5"'],
    ['no pieces', ['--at', '1 m', '--pieces', '0'], '--pieces  found "0"'],
    ['an odd piece', ['--at', '1 m', '--piece', 'long'], '--piece  found "long"'],
    ['an odd arrangement', ['--at', '1 m', '--fixed', 'last'], 'all, first, middle, none'],
  ])('refuses %s and writes nothing', async (_, options, message) => {
    const { code, stderr } = await spacings('bad', ...options);
    expect(stderr).toContain(message);
    expect(code).toBe(2);
    expect(await written('bad')).toEqual([]);
  });

  it('lists every fault of the options at once', async () => {
    const { stderr } = await spacings('bad', '--at', '5', '--piece', '7', '--pieces', 'x');
    expect(stderr.match(/^--\S+ {2}found/gm)).toEqual([
      '--at  found',
      '--pieces  found',
      '--piece  found',
    ]);
    expect(stderr).toContain('3 errors. Nothing was written.');
  });
});
