import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { temperaturesCommand } from '../../src/commands/temperatures.ts';
import { csvRecord } from '../support/temporary-job.ts';

let folder: string;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'daystrain-'));
  const record = csvRecord(Date.UTC(2031, 5, 1), 240, {
    'rail [degC]': (h) => (h === 50 ? '' : 20 - 8 * Math.cos((2 * Math.PI * h) / 24)),
  });
  await writeFile(join(folder, 'record.csv'), record);
  const zones = '{ "rail/top": { column: rail }, room: { constant: 21 degC } }';
  await writeFile(
    join(folder, 'job.yaml'),
    `title: Ten days\nrecord: { file: record.csv }\nzones: ${zones}\n`,
  );
});

afterAll(() => rm(folder, { recursive: true }));

it('shows the zones of a job that has nothing else yet', async () => {
  const out = join(folder, 'out');
  const { lines, fails } = await temperaturesCommand(folder, { out, charts: 'none' });
  expect(fails).toBe(false);
  expect((await readdir(out)).sort()).toEqual(
    expect.arrayContaining(['days.csv', 'manifest.json', 'summary.txt', 'temperatures.csv']),
  );
  const text = await readFile(join(out, 'summary.txt'), 'utf8');
  expect(lines[0]).toBe(text);
  expect(text).toMatch(/rail\/top +12 °C +2031-06-01 00:00 +28 °C +2031-06-01 12:00/);
  expect(text).toMatch(/rail\/top: 1 h filled and counted as covered, 0 h bridged and not/);
  expect(text).toContain('Constant, and not shown: room.');
  const rows = (await readFile(join(out, 'temperatures.csv'), 'utf8')).trim().split('\n');
  expect(rows[0]).toBe('time,rail/top [°C],rail/top gaps');
  expect(rows[51]).toMatch(/^2031-06-03T02:00,13\.\d+,filled$/);
  expect(rows).toHaveLength(241);
  const days = (await readFile(join(out, 'days.csv'), 'utf8')).trim().split('\n');
  expect(days[1]).toBe('rail/top,2031-06-01,12,28,16');
  // a swing of 16 K a day
  expect(text).toMatch(/16 to 18 +365\n/);
});

it('draws two charts a zone under names that a file may have', async () => {
  const out = join(folder, 'charts');
  await temperaturesCommand(folder, { out, charts: 'all' });
  const pictures = (await readdir(out)).filter((name) => name.endsWith('.png'));
  expect(pictures.sort()).toEqual(['rail-top-days.png', 'rail-top-record.png']);
});

it('tells what is wrong with zones', async () => {
  const job = join(folder, 'wrong.yaml');
  await writeFile(job, 'record: { file: record.csv }\nzones: { rail: { column: rial } }\n');
  await expect(temperaturesCommand(job, { charts: 'none' })).rejects.toThrow(/Did you mean "rail"/);
});
