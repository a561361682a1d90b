import { createHash } from 'node:crypto';
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readJob } from '../../src/input/job.ts';
import { flatNumbers } from '../support/flat-numbers.ts';

const SI = join(import.meta.dirname, 'jobs/si');
const US = join(import.meta.dirname, 'jobs/us');

/** A folder with the SI job, some of its files changed. */
function changed(changes: Readonly<Record<string, (text: string) => string>>): string {
  const folder = mkdtempSync(join(tmpdir(), 'job-'));
  for (const name of [
    'job.yaml',
    'record.csv',
    'members.csv',
    'fasteners.csv',
    'curves.csv',
    'runs.csv',
  ]) {
    const text = readFileSync(join(SI, name), 'utf8');
    writeFileSync(join(folder, name), changes[name]?.(text) ?? text);
  }
  return folder;
}

describe('a job', () => {
  it('reads into base units', async () => {
    const job = await readJob(SI);
    const [r1, r2, r3] = job.runs;
    expect(job.runs.map(({ id }) => id)).toEqual(['R1', 'R2', 'R3']);
    expect(r1.member.id).toBe('01');
    expect(r1.member.modulus).toBe(70000);
    expect(r1.member.inertia).toBeCloseTo(16000, 9);
    expect(r1.member.buckling).toEqual({ rule: 'EN', imperfection: 0.34, plateau: 0.2 });
    expect([...r1.positions]).toEqual([0, 600, 1200, 1800]);
    expect(r1.roles).toEqual(['slotted', 'fixed', 'slotted', 'slotted']);
    expect(r1.fasteners[0].stiffness).toBe(2000);
    expect(r1.fasteners[1].shearRangeLimit).toBeCloseTo(60 * 84.3, 9);
    // Half way from 15 to 40 and from 6 to 7.
    expect([r1.lockIn, r1.structure?.lockIn]).toEqual([27.5, 6.5]);
    expect([...r2.positions]).toEqual([0, 500, 1100]);
    expect(r2.roles).toEqual(['fixed', 'slotted', 'fixed']);
    expect(r2.member.netArea).toBe(r2.member.area);
    expect(r2.structure?.lockIn).toBe(21);
    expect(r3.structure?.lockIn).toBe(18);
    expect(job.represents).toBe(1);
    expect(job.extremes[0].temperatures.get('south')).toBe(77);
    expect(job.warnings).toEqual([]);
  });

  it('gives the same numbers in US customary units', async () => {
    const si = flatNumbers(await readJob(SI));
    const us = flatNumbers(await readJob(US));
    expect([...us.keys()]).toEqual([...si.keys()]);
    expect(si.size).toBeGreaterThan(100);
    for (const [path, value] of si) {
      const off = Math.abs(Number(us.get(path)) - value);
      expect(off, path).toBeLessThanOrEqual(1e-12 * Math.max(1e-6, Math.abs(value)));
    }
  });

  it('does not depend on the order of rows, keys and columns', async () => {
    const reversed = (text: string) => {
      const [header, ...rows] = text.trim().split('\n');
      const mirrored = (line: string) => line.split(',').reverse().join(',');
      return [header, ...rows.reverse()].map(mirrored).join('\n');
    };
    const folder = changed({
      'members.csv': reversed,
      'fasteners.csv': reversed,
      'runs.csv': reversed,
      'record.csv': (text) => text.replace(/^(.*?),(.*?),(.*)$/gm, '$3,$1,$2'),
    });
    const [plain, shuffled] = [await readJob(SI), await readJob(folder)];
    expect([...shuffled.runs].reverse()).toEqual(plain.runs);
    expect(shuffled.zones).toEqual(plain.zones);
  });

  it('reads a job in one JSON file', async () => {
    const folder = changed({});
    const json = {
      record: { file: 'record.csv' },
      zones: { south: { column: 'rail_south' } },
      members: [{ id: '007', modulus: '70 GPa', expansion: '23e-6/K', area: '450 mm^2' }],
      fasteners: [{ id: 'a', stiffness: 'rigid' }],
      runs: [
        {
          id: 'R',
          member: '007',
          zone: 'south',
          fastener: 'a',
          positions: ['0 mm', '1 m'],
          lock_in: '15 degC',
        },
      ],
    };
    const path = join(folder, 'other.json');
    writeFileSync(path, JSON.stringify(json, null, 2));
    const { runs } = await readJob(path);
    expect(runs[0].member.id).toBe('007');
    expect(runs[0].fasteners[0].stiffness).toBeNull();
    expect([...runs[0].positions]).toEqual([0, 1000]);
  });

  it('names every file that it read, with its hash', async () => {
    const { inputs } = await readJob(SI);
    expect(inputs.map(({ name }) => name).sort()).toEqual(
      ['job.yaml', 'curves.csv', 'fasteners.csv', 'members.csv', 'record.csv', 'runs.csv'].sort(),
    );
    for (const { name, sha256 } of inputs) {
      const bytes = readFileSync(join(SI, name));
      expect(sha256).toBe(createHash('sha256').update(bytes).digest('hex'));
    }
  });

  it('notes every default', async () => {
    const { defaults } = await readJob(SI);
    const keys = defaults.map(({ key, value }) => `${key} = ${value}`);
    expect(keys).toContain('limits.static_factor = 1.5');
    expect(keys).toContain('members tray: net_area = the gross area');
    expect(keys).toContain('runs R1: structure_lock_in = zone deck at the time of lock_in');
    expect(keys).toContain('curves steel 80: below = cutoff');
    expect(keys.some((key) => key.startsWith('limits.member_factor'))).toBe(false);
  });

  it('warns', async () => {
    const folder = changed({
      'job.yaml': (text) =>
        text
          .replace('direct 80, on: gross', 'direct 80, log_n_sd: 0.2, survival: 97.7 %')
          .replace('threshold: 50 MPa', 'thickness_reference: 25 mm, thickness_exponent: 0.2')
          .replace('extremes:', 'extremes:\n  - { name: mild, deck: 10 degC }'),
      'fasteners.csv': (text) => text.replace('M12,2,2 kN/mm,,,', 'M12,2,2 kN/mm,,,3'),
      'record.csv': (text) =>
        text.replace('01:00,15,6', '01:00,15,').replace('02:00,40,7', '02:00,40,'),
    });
    expect((await readJob(folder)).warnings).toEqual([
      expect.stringMatching(/^curve steel 80: .*characteristic/),
      expect.stringMatching(/^member tray: curve slope 3 /),
      expect.stringMatching(/^fastener M12: grip /),
      expect.stringMatching(/^run R1: .*zone deck has a gap/),
      expect.stringMatching(/^extreme mild: /),
    ]);
  });
});
