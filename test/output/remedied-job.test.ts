import { readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { readJob } from '../../src/input/job.ts';
import type { Result } from '../../src/model.ts';
import { REMEDIED_MARK, remediedJobYaml } from '../../src/output/remedied-job/remedied-job-yaml.ts';
import { screen } from '../../src/verdict/screen.ts';
import { keptPromises } from '../support/promises.ts';
import { randomJobFiles } from '../support/random-job.ts';
import { jobOf } from '../support/temporary-job.ts';

const EXAMPLE = fileURLToPath(new URL('../../examples/skerry-landing/', import.meta.url));

const kindsOf = ({ runs }: Result) => runs.map(({ remedy }) => remedy?.kind ?? 'none');

/** Expects every utilisation to be the promised one to a billionth, and none to be over its limit. */
async function expectKept(result: Result, files: Readonly<Record<string, string>>): Promise<void> {
  const promises = await keptPromises(result, files);
  const broken = promises.filter(({ promised, kept }) =>
    promised === null || kept === null || kept === undefined
      ? promised !== kept
      : Math.abs(kept - promised) > 1e-9 * Math.max(1, promised),
  );
  expect(broken).toEqual([]);
  expect(promises.filter(({ name }) => name.endsWith(' fail'))).toEqual([]);
  const uses = promises.map(({ kept }) => kept ?? 0);
  const utilisations = result.runs.flatMap(({ remedy }) =>
    remedy === null || remedy.kind === 'rework' ? [] : [remedy.utilisation],
  );
  expect(Math.max(0, ...utilisations)).toBeCloseTo(Math.max(0, ...uses), 9);
}

describe('a job with its remedies in', () => {
  it('keeps what the remedies of the shipped example promise', { timeout: 200_000 }, async () => {
    const result = screen(await readJob(EXAMPLE));
    expect(kindsOf(result)).toEqual(
      [
        ['none', 'slots', 'joints', 'slots'],
        ['none', 'none', 'spacing', 'slots'],
        ['slots', 'none', 'rework', 'slots'],
      ].flat(),
    );
    const files: Record<string, string> = {};
    // fasteners and runs stand in the new job itself
    for (const name of ['job.yaml', 'record.csv', 'members.csv', 'aluminium.csv', 'screws.csv']) {
      files[name] = await readFile(`${EXAMPLE}${name}`, 'utf8');
    }
    await expectKept(result, files);
  });

  it('keeps what those of random jobs promise', { timeout: 200_000 }, async () => {
    const kinds = new Set<string>();
    for (let seed = 101; seed <= 106; seed++) {
      const units = seed % 2 === 0 ? 'SI' : 'US';
      const recipe = { most: 9, runs: 2, shortestPiece: 1000, units, lined: true } as const;
      const files = randomJobFiles(seed, recipe);
      const result = screen(await jobOf(files));
      for (const kind of kindsOf(result)) kinds.add(kind);
      await expectKept(result, files);
    }
    expect([...kinds]).toEqual(expect.arrayContaining(['slots', 'joints', 'spacing']));
  });

  it('names the files of the old one as its own folder must, and leaves the rest as it was typed', async () => {
    const files = randomJobFiles(1, { most: 6, runs: 1, shortestPiece: 1e6 });
    const text = remediedJobYaml(
      screen(await jobOf(files)),
      files['job.yaml'].replace('title: ', '# kept\ntitle: 01 '),
      (name) => `../old/${name}`,
    );
    expect(text.split('\n')[0]).toBe(REMEDIED_MARK);
    expect(text).toContain('# kept');
    expect(text).toContain('title: 01 an invented job');
    expect(parse(text).record.file).toBe('../old/record.csv');
    expect(parse(text).members).toEqual(parse(files['job.yaml']).members);
  });

  it('gives types of one name and different make names of their own', async () => {
    const files = randomJobFiles(2, { most: 6, runs: 2, shortestPiece: 1e6 });
    const result = screen(await jobOf(files));
    const [one, other] = result.runs;
    const firm = { ...other.run.fixedType, stiffness: 9876 };
    const run = {
      ...other.run,
      fixedType: firm,
      fasteners: other.run.roles.map(() => firm),
      roles: other.run.roles.map(() => 'fixed' as const),
    };
    const two = { ...result, runs: [one, { ...other, run, remedy: null }] };
    const again = await jobOf({
      ...files,
      'job.yaml': remediedJobYaml(two, files['job.yaml'], (n) => n),
    });
    expect(again.runs.at(-1)!.fixedType).toMatchObject({ id: 'pin, 2', stiffness: 9876 });
    expect(again.runs[0].fixedType.stiffness).toBeCloseTo(one.run.fixedType.stiffness!, 6);
  });
});
