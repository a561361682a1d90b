import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readJob } from '../../src/input/job.ts';
import { InputError } from '../../src/issue.ts';
import type { Job } from '../../src/model.ts';

/** Reads a job from texts, as if they were the files of a folder. */
export async function jobOf(files: Readonly<Record<string, string>>): Promise<Job> {
  const folder = await mkdtemp(join(tmpdir(), 'daystrain-'));
  try {
    for (const [name, text] of Object.entries(files)) await writeFile(join(folder, name), text);
    return await readJob(folder);
  } finally {
    await rm(folder, { recursive: true });
  }
}

/** The messages that such a job gives; none where it is sound. */
export async function messagesOf(files: Readonly<Record<string, string>>): Promise<string[]> {
  try {
    await jobOf(files);
    return [];
  } catch (error) {
    if (error instanceof InputError) return error.message.split('\n');
    throw error;
  }
}

/** A record in CSV: a value an hour of each channel, from a moment on. */
export function csvRecord(
  start: number,
  hours: number,
  channels: Readonly<Record<string, (hour: number) => number | ''>>,
): string {
  const rows = Array.from({ length: hours }, (_, h) => {
    const time = new Date(start + h * 3_600_000).toISOString().slice(0, 16);
    return [time, ...Object.values(channels).map((of) => of(h))].join(',');
  });
  return `${['time', ...Object.keys(channels)].join(',')}\n${rows.join('\n')}\n`;
}

/** A pair of equal springs EA/L apart, which has a closed form, with curves N = C/S^m. */
export const PAIR = `
members:
  - { id: bar, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2, curve: bar }
fasteners:
  - { id: pin, stiffness: 2 kN/mm, shear_resistance: 50 kN, curve: pin }
curves:
  - { id: bar, constant: 1e12 MPa^3, slope: 3, below: continue }
  - { id: pin, constant: 1e20 N^4, slope: 4, below: continue }
runs:
  - { id: R1, member: bar, zone: bar, fastener: pin, count: 2, spacing: 3 m, lock_in: 10 degC }
`;

/** Shear of either spring of the pair for a change of temperature [N]: EAα·ΔT/(1 + 2EA/(kL)). */
export function pairShear(change: number): number {
  const [axial, stiffness, length] = [70_000 * 450, 2000, 3000];
  return (axial * 23e-6 * change) / (1 + (2 * axial) / (stiffness * length));
}
