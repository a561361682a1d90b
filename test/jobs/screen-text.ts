import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readJob } from '../../src/input/job.ts';
import type { Connection, Result } from '../../src/model.ts';
import { screen } from '../../src/verdict/screen.ts';

/** Screens a job given as text, with an hourly record of one channel `t` in °C; no remedies. */
export async function screenText(job: string, temperatures: readonly number[]): Promise<Result> {
  const folder = await mkdtemp(join(tmpdir(), 'daystrain-'));
  const rows = temperatures.map((t, hour) => {
    return `${new Date(Date.UTC(2031, 0, 1, hour)).toISOString().slice(0, 16)},${t}`;
  });
  try {
    await writeFile(join(folder, 'record.csv'), ['time,t [degC]', ...rows, ''].join('\n'));
    await writeFile(join(folder, 'job.yaml'), job);
    return screen(await readJob(folder), { remedies: false });
  } finally {
    await rm(folder, { recursive: true });
  }
}

/** Connection n (from 1) of the only run. */
export function connection(result: Result, n: number): Connection {
  return result.runs[0].connections[n - 1];
}
