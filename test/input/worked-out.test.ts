import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { gripOfTorque } from '../../src/input/fastener-grip.ts';
import { cantileverStiffness } from '../../src/input/fastener-stiffness.ts';
import { readJob } from '../../src/input/job.ts';
import { InputError } from '../../src/issue.ts';
import type { Job } from '../../src/model.ts';

const SI = join(import.meta.dirname, 'jobs/si');

/** A small job with one fastener, one member and one run, each with these keys and more. */
async function read(parts: { fastener?: string; member?: string; run?: string }): Promise<Job> {
  const folder = mkdtempSync(join(tmpdir(), 'job-'));
  writeFileSync(join(folder, 'record.csv'), readFileSync(join(SI, 'record.csv')));
  const job = `
record: { file: record.csv }
zones: { south: { column: rail_south } }
members: [{ id: m, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2${parts.member ?? ''} }]
fasteners: [{ id: f, ${parts.fastener ?? 'stiffness: 2 kN/mm'} }]
runs: [{ id: R1, member: m, zone: south, fastener: f, count: 4, spacing: 600 mm${parts.run ?? ', lock_in: 15 degC'} }]
`;
  writeFileSync(join(folder, 'job.yaml'), job);
  return readJob(folder);
}

const messageOf = (parts: Parameters<typeof read>[0]) =>
  read(parts).then(
    () => '',
    (error: unknown) => (error as InputError).message,
  );

describe('what users do not know', () => {
  it('a cantilever bends by Pl³/3EI (elementary beam theory)', () => {
    // 1000 N at the end of 100 mm of 210 GPa and 5000 mm⁴: 1000 · 100³ / (3 · 210000 · 5000) = 0.31746 mm.
    expect(1000 / cantileverStiffness(100, 210_000, 5000)).toBeCloseTo(0.3174603, 6);
  });

  it('springs in series give way together', async () => {
    const job = await read({ fastener: 'stiffness: 2 kN/mm, bracket_stiffness: 2 kN/mm' });
    expect(job.runs[0].fasteners[0].stiffness).toBeCloseTo(1000, 9);
    expect(job.derived[0]).toMatchObject({ key: 'fasteners f: stiffness', quantity: 'stiffness' });
  });

  it('fasteners side by side share one bracket', async () => {
    const fastener =
      'per_connection: 2, stiffness: rigid, bracket_length: 100 mm, bracket_modulus: 210 GPa, bracket_inertia: 5000 mm^4';
    const job = await read({ fastener });
    const [{ stiffness }] = job.runs[0].fasteners;
    expect(2 * Number(stiffness)).toBeCloseTo(cantileverStiffness(100, 210_000, 5000), 9);
  });

  it('a tightened bolt grips by T/(0.2 d)·μ·share (from memory)', async () => {
    // 40 N m on 12 mm: 40000 / 2.4 = 16667 N of preload; half of it at 0.2 is 1667 N.
    expect(gripOfTorque(40_000, 0.2 * 12, 0.2 * 0.5)).toBeCloseTo(1666.67, 2);
    const fastener =
      'stiffness: 2 kN/mm, free_play: 2 mm, tightening_torque: 40 Nm, diameter: 12 mm, friction: 0.2, grip_share: 0.5';
    const job = await read({ fastener });
    expect(job.runs[0].fasteners[0].grip).toBeCloseTo(1666.67, 2);
    expect(job.derived.map(({ how }) => how).join()).toContain('estimate');
    expect(job.defaults.some(({ key }) => key.endsWith('grip'))).toBe(false);
  });

  it('a hole takes its width times the thickness', async () => {
    const job = await read({ member: ', thickness: 5 mm, hole: 14 mm, holes: 2' });
    expect(job.runs[0].member.netArea).toBe(450 - 2 * 14 * 5);
  });

  it('lock-in may be a range, a time without «at», or left out', async () => {
    const ranged = await read({ run: ', lock_in: 0 degC to 30 degC' });
    expect(ranged.runs[0].lockIn).toBe(15);
    expect(ranged.derived[0].how).toBe('the middle of 0 degC to 30 degC');
    const timed = await read({ run: ', lock_in: 2031-01-01T01:30' });
    // Half way from 15 to 40.
    expect(timed.runs[0].lockIn).toBe(27.5);
    const none = await read({ run: '' });
    expect(none.runs[0].lockIn).toBe(15);
    expect(none.defaults).toContainEqual({ key: 'runs R1: lock_in', value: '5 degC to 25 degC' });
    expect(none.warnings.join()).toContain('lock_in is not given');
  });

  it.each([
    ['fastener', 'stiffness: 2 kN/mm, bracket_length: 80 mm', 'since bracket_length is given'],
    [
      'fastener',
      'stiffness: 2 kN/mm, grip: 1 kN, tightening_torque: 4 N m',
      'expected one of them',
    ],
    ['fastener', 'stiffness: 2 kN/mm, friction: 0.2', 'nothing without tightening_torque'],
    ['member', ', hole: 14 mm', 'since hole is given'],
    ['member', ', hole: 14 mm, thickness: 40 mm', 'leave some of the area'],
    ['member', ', hole: 14 mm, thickness: 4 mm, net_area: 400 mm^2', 'not both'],
    ['run', ', lock_in: 30 degC to 0 degC', 'the lower temperature first'],
    ['run', ', lock_in: 47950.4167', '2031-04-12T10:00'],
    ['run', ', lock_in: 12/04/2031 10:00', 'year, month and day'],
  ])('refuses %s %s', async (part, text, words) => {
    expect(await messageOf({ [part]: text })).toContain(words);
  });
});

describe('doubts', () => {
  it.each([
    ['member', ', inertia: 16000 mm^4', /^$/],
    ['member', ', inertia: 1.6 mm^4', /radius of gyration/],
    ['member', ', yield: 2500 MPa', /2500 MPa is read .* 20 MPa to 2000 MPa is usual/],
    ['run', ', lock_in: 72 degF', /^$/],
    ['run', ', lock_in: 74.9 degC', /^$/],
    ['run', ', lock_in: 95 degC', /95 degC is read .*check the figure/],
    ['run', ', lock_in: 140 degC', /far from any in its zone/],
    ['fastener', 'stiffness: 2 N/mm', /2 N\/mm is read/],
  ])('of %s %s', async (part, text, words) => {
    const job = await read({ [part]: text });
    expect(job.warnings.join('\n')).toMatch(words);
  });

  it('of a record in °F under °C', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'job-'));
    const record = readFileSync(join(SI, 'record.csv'), 'utf8');
    const fahrenheit = record.replace(
      /,(-?\d+),/g,
      (_, celsius) => `,${Number(celsius) * 1.8 + 32},`,
    );
    writeFileSync(join(folder, 'record.csv'), fahrenheit);
    const job = readFileSync(join(SI, 'job.yaml'), 'utf8');
    writeFileSync(join(folder, 'job.yaml'), job.replace('77 degC', '170 degC'));
    for (const name of ['members.csv', 'fasteners.csv', 'curves.csv', 'runs.csv']) {
      writeFileSync(join(folder, name), readFileSync(join(SI, name)));
    }
    // 15 °C, the median, is 59 °F.
    expect((await readJob(folder)).warnings.join()).toMatch(/zone south: .* 59 °C; check whether/);
  });

  it.each([
    ['modulus: 70 GPa', 'modulus: 70000 GPa', 'Metals have 15 to 400 GPa'],
    ['modulus: 70 GPa', 'modulus: 70 MPa', 'Metals have 15 to 400 GPa'],
    ['expansion: 23e-6 / K', 'expansion: 12 / K', '12e-6 / K'],
    ['expansion: 23e-6 / K', 'expansion: 12e-12 / K', '12e-6 / K'],
  ])('a slip from %s to %s is refused and explained', async (_, text, words) => {
    const key = text.split(':')[0];
    const folder = mkdtempSync(join(tmpdir(), 'job-'));
    writeFileSync(join(folder, 'record.csv'), readFileSync(join(SI, 'record.csv')));
    const plain = 'modulus: 70 GPa, expansion: 23e-6 / K';
    const member = plain.replace(new RegExp(`${key}: [^,]*`), text);
    const job = `
record: { file: record.csv }
zones: { south: { column: rail_south } }
members: [{ id: m, ${member}, area: 450 mm^2 }]
fasteners: [{ id: f, stiffness: rigid }]
runs: [{ id: R1, member: m, zone: south, fastener: f, count: 4, spacing: 600 mm, lock_in: 15 degC }]
`;
    writeFileSync(join(folder, 'job.yaml'), job);
    const error = await readJob(folder).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(InputError);
    expect((error as InputError).message).toContain(words);
  });
});
