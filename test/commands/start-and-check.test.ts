import { mkdtempSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { checkCommand } from '../../src/commands/check.ts';
import { screenCommand } from '../../src/commands/screen.ts';
import { startCommand } from '../../src/commands/start.ts';
import { readJob } from '../../src/input/job.ts';
import { InputError } from '../../src/issue.ts';

const parent = mkdtempSync(join(tmpdir(), 'start-'));
const folder = join(parent, 'new', 'job');

beforeAll(async () => {
  await startCommand(folder);
});

describe('a starter job', () => {
  it('is sound, and gives no cause for doubt', async () => {
    const job = await readJob(folder);
    expect(job.warnings).toEqual([]);
    expect(job.axis.times).toHaveLength(8760);
    expect(job.title).toContain('invented');
  });

  it('is screened as it stands', async () => {
    const out = join(parent, 'results');
    await screenCommand(folder, { out, charts: 'none' });
    const rows = readFileSync(join(out, 'results.csv'), 'utf8').trim().split('\n');
    expect(rows).toHaveLength(1 + 24);
  });

  it('is not written over what stands there', async () => {
    const other = mkdtempSync(join(tmpdir(), 'start-'));
    writeFileSync(join(other, 'record.csv'), 'mine');
    await expect(startCommand(other)).rejects.toThrow(InputError);
    expect(readdirSync(other)).toEqual(['record.csv']);
    expect(readFileSync(join(other, 'record.csv'), 'utf8')).toBe('mine');
  });

  it('is refused where its folder is a file', async () => {
    const file = join(parent, 'file');
    writeFileSync(file, 'mine');
    await expect(startCommand(file)).rejects.toThrow(InputError);
    expect(readFileSync(file, 'utf8')).toBe('mine');
  });
});

describe('check', () => {
  it('says in words what was understood, and writes nothing', async () => {
    const before = readdirSync(folder);
    const { lines, fails } = await checkCommand(folder);
    const text = lines.join('\n');
    expect(fails).toBe(false);
    expect(readdirSync(folder)).toEqual(before);
    // 3EI/l³ = 3 · 210000 · 2500 / 60³ = 7291.7 N/mm; in series with 8000: 3814.7 N/mm.
    expect(text).toContain('fasteners bracket: stiffness 3.81 kN/mm');
    // 5 N m / (0.2 · 12 mm) · 0.2 · 0.5 = 208 N.
    expect(text).toContain('grip 0.208 kN, an estimate');
    expect(text).toContain('net_area 394 mm^2');
    expect(text).toMatch(/R1 +[─]*■.*■[─]* +12 +6,600 mm +rail +rail on deck +15 °C/);
    expect(text).toMatch(/R2 +─○──○──○──○──○──■──○──○──○──○──○──○─ /);
    expect(text).toContain('α 23e-6 / K');
    expect(text).toContain('The job can be screened: 2 runs with 24 connections.');
    for (const line of text.split('\n')) expect(line.length).toBeLessThanOrEqual(120);
  });

  it('gives the errors of a job that has any', async () => {
    const bad = join(import.meta.dirname, '../bad-jobs/many-at-once');
    await expect(checkCommand(bad)).rejects.toThrow('job.yaml:2:1');
  });
});
