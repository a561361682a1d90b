import { link, mkdir, mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { screenCommand } from '../../src/commands/screen.ts';
import { readJob } from '../../src/input/job.ts';
import { REMEDIED_MARK } from '../../src/output/remedied-job/remedied-job-yaml.ts';
import { randomJobFiles } from '../support/random-job.ts';

let root = '';
const at = (...names: string[]) => join(root, ...names);
const write = (file: string, out = at('results')) =>
  screenCommand(at('job'), { out, charts: 'none', writeRemedied: file });

beforeEach(async () => {
  root = await mkdtemp(join(tmpdir(), 'write-remedied-'));
  await mkdir(at('job'));
  await mkdir(at('drawn'));
  const files = randomJobFiles(3, { most: 5, runs: 1, shortestPiece: 1e6 });
  for (const [name, text] of Object.entries(files)) await writeFile(at('job', name), text);
});

afterEach(() => rm(root, { recursive: true }));

describe('--write-remedied', () => {
  it('writes a job beside which the files of the old one are found', async () => {
    const { lines } = await write(at('drawn', 'new.yaml'));
    expect(lines.at(-1)).toBe(`The job with its remedies in: ${at('drawn', 'new.yaml')}`);
    const text = await readFile(at('drawn', 'new.yaml'), 'utf8');
    expect(parse(text).record.file).toBe('../job/record.csv');
    expect((await readJob(at('drawn', 'new.yaml'))).runs).toHaveLength(1);
    // and again over what it wrote itself
    await write(at('drawn', 'new.yaml'));
    expect(await readdir(at('drawn'))).toEqual(['new.yaml']);
  });

  it('never writes over a file of the job, under whatever name', async () => {
    const before = await readFile(at('job', 'job.yaml'), 'utf8');
    await link(at('job', 'job.yaml'), at('drawn', 'other.yaml'));
    for (const file of [
      at('job', 'job.yaml'),
      at('drawn', '..', 'job', 'job.yaml'),
      at('drawn', 'other.yaml'),
    ]) {
      await expect(write(file)).rejects.toThrow(/found "a file of the job"/);
    }
    expect(await readFile(at('job', 'job.yaml'), 'utf8')).toBe(before);
    expect(await readdir(root)).not.toContain('results');
  });

  it('leaves a job that it wrote alone once that is the job', async () => {
    await write(at('job', 'new.yaml'));
    const again = screenCommand(at('job', 'new.yaml'), {
      out: at('results'),
      charts: 'none',
      writeRemedied: at('job', 'new.yaml'),
    });
    await expect(again).rejects.toThrow(/found "a file of the job"/);
  });

  it.each([
    ['a file that somebody else wrote', 'theirs.yaml', /a file of another origin/],
    ['a name that is no job file', 'summary.txt', /a name that ends in \.yaml/],
    ['a folder that is not there', 'nowhere/new.yaml', /a folder that is there/],
    ['a folder', 'folder.yaml', /a file of another origin/],
  ])('refuses %s, and writes nothing', async (_, name, message) => {
    await writeFile(at('drawn', 'theirs.yaml'), 'title: theirs\n');
    await mkdir(at('drawn', 'folder.yaml'));
    await expect(write(at('drawn', name))).rejects.toThrow(message);
    expect(await readFile(at('drawn', 'theirs.yaml'), 'utf8')).toBe('title: theirs\n');
    expect(await readdir(root)).not.toContain('results');
  });

  it('writes nothing where the results cannot be written', async () => {
    await mkdir(at('results'));
    await writeFile(at('results', 'summary.txt'), 'not ours');
    await expect(write(at('drawn', 'new.yaml'))).rejects.toThrow(/summary\.txt/);
    expect(await readdir(at('drawn'))).toEqual([]);
    // nor touches what stood there
    const ours = `${REMEDIED_MARK}\nolder\n`;
    await writeFile(at('drawn', 'new.yaml'), ours);
    await expect(write(at('drawn', 'new.yaml'))).rejects.toThrow(/summary\.txt/);
    expect(await readFile(at('drawn', 'new.yaml'), 'utf8')).toBe(ours);
    expect(await readdir(at('drawn'))).toEqual(['new.yaml']);
  });
});
