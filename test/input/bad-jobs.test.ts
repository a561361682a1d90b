import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readJob } from '../../src/input/job.ts';
import { InputError } from '../../src/issue.ts';

const FOLDER = join(import.meta.dirname, '../bad-jobs');
const JOBS = readdirSync(FOLDER);

describe('bad jobs, each with its whole message', () => {
  it('are many', () => expect(JOBS.length).toBeGreaterThanOrEqual(60));

  it.each(JOBS)('%s', async (name) => {
    const error = await readJob(join(FOLDER, name)).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(InputError);
    const message = (error as InputError).message;
    await expect(`${message}\n`).toMatchFileSnapshot(join(FOLDER, name, 'message.txt'));
  });
});

describe('a job that is not there', () => {
  it('is named', async () => {
    const path = join(FOLDER, 'nothing-here');
    await expect(readJob(path)).rejects.toThrow('expected a file that can be read');
  });
});
