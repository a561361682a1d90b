import { expect, test } from 'vitest';
import type { Result } from '../../src/model.ts';
import { summary } from '../../src/output/summary/summary.ts';
import { makeResult } from './make-result.ts';

/** The text without its line breaks. */
const words = (text: string) => text.replace(/\s+/g, ' ');

test('the summary of a made-up result, whole', () => {
  // A frozen own output, to show any change of wording; the numbers are tested elsewhere.
  expect(summary(makeResult())).toMatchSnapshot();
});

test('twelve runs in US units stay within 100 columns', () => {
  const runs = Array.from({ length: 12 }, (_, i) => ({
    id: `R${i + 1}`,
    count: 3 + 4 * i,
    shearRangeLimit: i % 3 === 0 ? null : 3000,
    curves: i % 2 === 0,
    slotted: i === 7,
  }));
  const text = summary(makeResult({ units: 'US', runs }));
  expect(Math.max(...text.split('\n').map((line) => line.length))).toBeLessThanOrEqual(100);
  expect(text).toContain('Units: US customary (kip, in, ksi).');
  expect(text).not.toMatch(/\b(kN|mm|MPa)\b/);
});

test('the answer comes first', () => {
  const lines = summary(makeResult()).split('\n');
  expect(lines[0]).toBe('Made-up rails for a test');
  expect(lines[2]).toBe('1 of 3 runs fails. R2/1 governs: shear range is 1.61 times its limit.');
});

test('damage is also told as a range ratio', () => {
  // D = 0.2 of an allowed 1 and a slope of 5: 0.2^(1/5) = 0.7248 by hand.
  expect(summary(makeResult())).toMatch(/R1 +fastener +R1\/1 +0\.2 +0\.725 +0\.839 kN/);
});

test('a part of a year is said to stand for the whole, a whole year is not', () => {
  const note =
    /covers 90 days: damage.*scaled from them.*the rest of the\s+year is taken to be alike/s;
  const short = summary(makeResult({ hours: 90 * 24 }));
  expect(short).toMatch(note);
  // and at every life and damage
  expect(short).toMatch(/R1 .*250 years, from 90 days/);
  expect(short).toContain('Damage in 50 years (allowed 1), scaled from 90 days');
  expect(summary(makeResult())).not.toMatch(/90 days|alike/);
});

test('peaks are called the record’s own only without extremes', () => {
  const result = makeResult();
  const extremes = [{ name: 'hot', temperatures: new Map([['south', 77]]) }];
  const withExtremes: Result = { ...result, job: { ...result.job, extremes } };
  expect(summary(result)).toContain('No extremes were given');
  expect(summary(withExtremes)).not.toContain('No extremes were given');
});

test('gated cycles are told with the damage that they would have done', () => {
  const result = makeResult();
  const [run, ...rest] = result.runs;
  const [first, ...others] = run.connections;
  const gated = {
    ...first,
    fastenerDamage: { ...first.fastenerDamage, gatedCycles: 1234, gatedDamage: 0.00021 },
  };
  const text = summary({ ...result, runs: [{ ...run, connections: [gated, ...others] }, ...rest] });
  expect(words(text)).toContain(
    'The gate dropped up to 1,234 cycles of a series. They would have added at most 0.00021 to a damage sum',
  );
  expect(summary(result)).not.toContain('gate');
});

test('with no limit for anything it says that nothing was checked', () => {
  const result = makeResult({ runs: [{ id: 'R1', count: 2 }] });
  const unchecked = {
    ...result,
    runs: result.runs.map((run) => ({
      ...run,
      connections: run.connections.map((c) => ({
        ...c,
        governing: null,
        checks: c.checks.map((check) => ({
          ...check,
          limit: null,
          utilisation: null,
          status: 'not given' as const,
        })),
      })),
    })),
  };
  const text = summary(unchecked);
  expect(text).toContain('so nothing was checked');
  expect(text).toMatch(/peak shear +R1/);
});

test('alike defaults stand together', () => {
  const result = makeResult();
  const defaults = [
    { key: 'units', value: 'SI' },
    { key: 'limits.damage', value: '1.0' },
    { key: 'limits.load_factor', value: '1.0' },
    ...['R1', 'R2'].flatMap((id) => [
      { key: `runs ${id}: overhang`, value: '0 mm' },
      { key: `runs ${id}: added_shear`, value: '0 N' },
    ]),
    { key: 'fasteners M12 slot: per_connection', value: '1' },
  ];
  const text = summary({ ...result, job: { ...result.job, defaults } });
  expect(text).toContain(
    [
      'Left at their defaults',
      '  - units SI',
      '  - limits: damage 1.0, load_factor 1.0',
      '  - runs R1, R2: overhang 0 mm, added_shear 0 N',
      '  - fasteners M12 slot: per_connection 1',
    ].join('\n'),
  );
});

test('over the limit of an exempting rule the missing curve is named', () => {
  const missing = 'and no curve to judge the damage by';
  const run = { id: 'R1', count: 21, shearRangeLimit: 3000 };
  expect(words(summary(makeResult({ runs: [{ ...run, exempts: true }] })))).toContain(missing);
  expect(words(summary(makeResult({ runs: [run] })))).not.toContain(missing);
});
