import { createHash } from 'node:crypto';
import { expect, test } from 'vitest';
import packageFile from '../../package.json' with { type: 'json' };
import { manifestJson } from '../../src/output/manifest-json.ts';
import { makeResult } from './make-result.ts';

const files = [
  { name: 'results.csv', content: 'run\nR1\n' },
  { name: 'overview.png', content: Uint8Array.of(1, 2, 3) },
];

test('the manifest says what made the results and from what', () => {
  const result = makeResult();
  const manifest = JSON.parse(manifestJson(result, files));
  expect(manifest.program).toBe('daystrain');
  expect(manifest.version).toBe(packageFile.version);
  expect(manifest.inputs).toEqual([{ name: 'job.yaml', sha256: 'a'.repeat(64) }]);
  expect(manifest.settings).toMatchObject({ design_life_years: 50, member_factor: 1.35 });
  expect(manifest.settings.defaults).toContainEqual({ key: 'limits.damage', value: '1' });
  expect(manifest.runs).toContainEqual({
    run: 'R3',
    passes: 50,
    settled: false,
    covered_hours: 8760,
    years: 1,
  });
});

test('the manifest lists every file with its hash', () => {
  const manifest = JSON.parse(manifestJson(makeResult(), files));
  expect(manifest.files).toEqual(
    files.map(({ name, content }) => ({
      name,
      sha256: createHash('sha256').update(content).digest('hex'),
    })),
  );
});

test('the same result gives the same manifest', () => {
  expect(manifestJson(makeResult(), files)).toBe(manifestJson(makeResult(), files));
});

test('extremes stand in the manifest by zone', () => {
  const result = makeResult();
  const extremes = [{ name: 'hot', temperatures: new Map([['south', 77]]) }];
  const manifest = JSON.parse(manifestJson({ ...result, job: { ...result.job, extremes } }, files));
  expect(manifest.settings.extremes).toEqual([{ name: 'hot', degC: { south: 77 } }]);
});
