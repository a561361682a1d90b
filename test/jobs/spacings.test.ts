import { execFile } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { build } from 'esbuild';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type SpacingsOptions, spacingsCommand } from '../../src/commands/spacings.ts';
import { InputError } from '../../src/issue.ts';

const JOB = fileURLToPath(new URL('spacings', import.meta.url));

let directory: string;
beforeAll(async () => {
  directory = await mkdtemp(join(tmpdir(), 'daystrain-'));
});
afterAll(() => rm(directory, { recursive: true }));

const written = (out: string) => readdir(join(directory, out)).catch(() => []);
const compare = (out: string, options: Partial<SpacingsOptions>) =>
  spacingsCommand(JOB, { charts: 'none', out: join(directory, out), ...options });

describe('comparing the spacings of a job', () => {
  it('writes a table, the answer, two charts a case and a manifest that lists them', async () => {
    const { lines } = await compare('all', {
      charts: 'all',
      from: '300 mm',
      to: '1.2 m',
      by: '300 mm',
      at: ['24 in'],
      runs: ['row', 'slide'],
      pieces: ['2'],
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
    const { asked_mm: asked, ...rest } = manifest.spacings;
    expect(rest).toEqual({
      runs: ['row', 'slide'],
      fixed: 'as in the job',
      cuts: [{ pieces: 2 }],
    });
    expect(asked.map((mm: number) => mm.toFixed(6))).toEqual(
      [300, 600, 609.6, 900, 1200].map((mm) => mm.toFixed(6)),
    );
    expect(manifest.files.map(({ name }: { name: string }) => name).sort()).toEqual(
      files.filter((name) => name !== 'manifest.json'),
    );
    expect(await readFile(join(directory, 'all', 'spacings.txt'), 'utf8')).toBe(lines[0]);
  });

  it('fails where a run passes at no spacing, or could not be compared', async () => {
    const fails = async (...runs: string[]) => (await compare('a', { at: ['600 mm'], runs })).fails;
    expect(await fails('row')).toBe(false);
    expect(await fails('row', 'clamp')).toBe(true);
    expect(await fails('row', 'lone')).toBe(true);
    expect(await fails('bare')).toBe(false);
  });

  it('warns of a run that cannot be respaced', async () => {
    const { warnings } = await compare('b', { at: ['600 mm'], runs: ['row', 'listed', 'lone'] });
    expect(warnings.join('\n')).toMatch(/listed: its fixed fasteners are given by their numbers/);
    expect(warnings).toContain('lone has one fastener, so it has no spacing.');
  });
});

describe('what is refused', () => {
  const message = async (options: Partial<SpacingsOptions>) => {
    const error = await compare('bad', options).catch((thrown: unknown) => thrown);
    expect(await written('bad')).toEqual([]);
    if (!(error instanceof InputError)) throw error;
    return error.message;
  };

  it.each<[string, Partial<SpacingsOptions>, string]>([
    ['no spacing', {}, 'expected spacings to try: --at "300 mm" "600 mm"'],
    ['no unit', { at: ['600'] }, '--at  found "600", expected a length over 0 with its unit'],
    ['a unit of its own', { at: ['600', 'mm'] }, 'together in quotes: --at "600 mm"'],
    ['a force', { at: ['6 kN'] }, '--at  found "6 kN", expected a length'],
    ['nothing', { at: ['0 mm'] }, '--at  found "0 mm", expected a length over 0'],
    ['a step alone', { by: '100 mm' }, '--from  nothing stands here'],
    ['backwards', { from: '2 m', to: '1 m', by: '1 m' }, '--to  found "1 m"'],
    ['tiny steps', { from: '1 m', to: '2 m', by: '1 mm' }, '--by  found "1 mm"'],
    ['too close', { at: ['10 mm'], runs: ['row'] }, 'has at most 500 fasteners'],
    ['an unknown run', { at: ['1 m'], runs: ['rows'] }, 'Did you mean "row"?'],
    ['no whole pieces', { at: ['1 m'], pieces: ['1.5'] }, '--pieces  found "1.5"'],
    ['no pieces', { at: ['1 m'], pieces: ['0'] }, '--pieces  found "0"'],
    ['an odd piece', { at: ['1 m'], piece: ['long'] }, '--piece  found "long"'],
    ['runs of no spacing', { at: ['1 m'], runs: ['listed', 'lone'] }, 'lone has one fastener'],
  ])('%s', async (_, options, expected) => {
    expect(await message(options)).toContain(expected);
  });

  it('is listed whole', async () => {
    const all = await message({ at: ['5'], pieces: ['x'], piece: ['7'] });
    expect(all.match(/^--\S+ {2}found/gm)).toEqual([
      '--at  found',
      '--pieces  found',
      '--piece  found',
    ]);
  });
});

describe('the command line', () => {
  it('exits with 0, with 1 under --strict, and with 2 on bad options', async () => {
    const require = "import { createRequire } from 'node:module';";
    await build({
      entryPoints: [fileURLToPath(new URL('../../src/cli.ts', import.meta.url))],
      bundle: true,
      splitting: true,
      platform: 'node',
      format: 'esm',
      external: ['canvas'],
      logLevel: 'silent',
      banner: { js: `${require} const require = createRequire(import.meta.url);` },
      outdir: join(directory, 'cli'),
      outExtension: { '.js': '.mjs' },
    });
    const exit = async (out: string, ...options: string[]) => {
      const cli = join(directory, 'cli', 'cli.mjs');
      const args = [cli, 'spacings', JOB, '--charts', 'none', '--out', join(directory, out)];
      const done = promisify(execFile)(process.execPath, [...args, ...options]);
      return done.then(
        () => 0,
        ({ code }) => code,
      );
    };
    const clamp = ['--at', '600 mm', '--runs', 'clamp'];
    expect(await exit('loose', ...clamp)).toBe(0);
    expect(await exit('strict', ...clamp, '--strict')).toBe(1);
    expect(await exit('unit', '--at', '600')).toBe(2);
    expect(await exit('word', '--at', '600 mm', '--fixed', 'last')).toBe(2);
    expect(await written('strict')).toEqual(['manifest.json', 'spacings.csv', 'spacings.txt']);
    expect([...(await written('unit')), ...(await written('word'))]).toEqual([]);
  });
});
