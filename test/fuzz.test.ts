import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { build } from 'esbuild';
import { afterAll, expect, it } from 'vitest';

const project = join(import.meta.dirname, '..');
const built = mkdtempSync(join(tmpdir(), 'fuzz-built-'));

afterAll(() => rmSync(built, { recursive: true }));

/** Far longer than it takes: what is not done by then hangs. */
const PATIENCE = 600_000;

it(
  '2,000 jobs changed at random end in results or in a message that names a place',
  async () => {
    await build({
      absWorkingDir: project,
      entryPoints: ['test/fuzz/fuzz.ts'],
      bundle: true,
      splitting: true,
      format: 'esm',
      platform: 'node',
      target: 'node20',
      outdir: built,
      outExtension: { '.js': '.mjs' },
      external: ['canvas'],
      banner: {
        js: "import { createRequire } from 'node:module'; const require = createRequire(import.meta.url);",
      },
    });
    const fuzz = [join(built, 'fuzz.mjs'), '--seed', '1', '--count', '2000'];
    const options = { cwd: project, timeout: PATIENCE, maxBuffer: 1e8 };
    const { stdout } = await promisify(execFile)('node', fuzz, options).catch((error) => error);
    expect(stdout).toMatch(/^\d+ screened, \d+ refused, 0 faults\.\n$/);
    const [screened, refused] = stdout.match(/\d+/g).map(Number);
    expect(screened + refused).toBe(2000);
    // Changes that nothing takes notice of, or that nothing survives, test nothing.
    expect(screened).toBeGreaterThan(200);
    expect(refused).toBeGreaterThan(500);
  },
  PATIENCE,
);
