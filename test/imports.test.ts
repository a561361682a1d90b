import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { beforeAll, describe, expect, it } from 'vitest';

/** One way through the house: a file may import from its own stage and from those before it. */
const STAGES = [
  'input',
  'temperature',
  'mechanics',
  'counting',
  'damage',
  'verdict',
  'output',
  'commands',
];
/** What every stage may use. */
const COMMON = ['model.ts', 'issue.ts', 'units.ts', 'package.json'];
/** The numeric core: no files, no clock, no process, no packages. */
const CORE = ['temperature', 'mechanics', 'counting', 'damage', 'verdict'];
/** Reading asks the next stages for their data: zones from channels, curves from what the user entered. */
const INPUT_MAY_CALL = ['temperature', 'damage'];
/** Packages that a core file may use, and why: formulas and sun positions are a library's. */
const CORE_PACKAGES: Readonly<Record<string, RegExp>> = {
  'damage/formula-evaluator.ts': /^mathjs\/number$/,
  'temperature/sun-path.ts': /^suncalc$/,
};

const root = fileURLToPath(new URL('..', import.meta.url));
const imports = new Map<string, string[]>();

beforeAll(async () => {
  const { metafile } = await build({
    absWorkingDir: root,
    entryPoints: ['src/cli.ts', 'src/index.ts'],
    bundle: true,
    write: false,
    metafile: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    outdir: 'unused',
    packages: 'external',
  });
  for (const [file, { imports: found }] of Object.entries(metafile.inputs)) {
    imports.set(
      file.replace(/^src\//, ''),
      found.map(({ path }) => path.replace(/^src\//, '')),
    );
  }
});

const stageOf = (file: string) => STAGES.indexOf(file.split('/')[0]);

describe('imports', () => {
  it('reach every stage', () => {
    const reached = new Set([...imports.keys()].map((file) => file.split('/')[0]));
    expect([...reached]).toEqual(expect.arrayContaining(STAGES));
  });

  it('run one way', () => {
    const against: string[] = [];
    for (const [file, targets] of imports) {
      const from = stageOf(file);
      if (from < 0) continue;
      for (const target of targets) {
        const to = stageOf(target);
        const allowed =
          to < 0
            ? !imports.has(target) || COMMON.includes(target)
            : to <= from || (from === 0 && INPUT_MAY_CALL.includes(STAGES[to]));
        if (!allowed) against.push(`${file} -> ${target}`);
      }
    }
    expect(against).toEqual([]);
  });

  it('have no cycle', () => {
    const done = new Set<string>();
    const walk = (file: string, way: readonly string[]): void => {
      expect(way, `cycle through ${file}`).not.toContain(file);
      if (done.has(file)) return;
      for (const target of imports.get(file) ?? []) walk(target, [...way, file]);
      done.add(file);
    };
    for (const file of imports.keys()) walk(file, []);
    expect([...done]).toEqual(expect.arrayContaining([...imports.keys()]));
  });

  it('keep files, clock, process and packages out of the core', () => {
    const found: string[] = [];
    for (const [file, targets] of imports) {
      if (!CORE.includes(file.split('/')[0])) continue;
      for (const target of targets) {
        if (!imports.has(target) && !CORE_PACKAGES[file]?.test(target)) {
          found.push(`${file} -> ${target}`);
        }
      }
    }
    expect(found).toEqual([]);
  });
});
