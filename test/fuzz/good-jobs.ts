import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { STARTER_JOB } from '../../src/output/starter/starter-job.ts';
import { starterRecord } from '../../src/output/starter/starter-record.ts';
import type { Texts } from './mutate.ts';

/** Rows of a record that are kept: enough for a gap, a cycle and a time of lock-in. */
const ROWS = 40;

/**
 * Jobs without fault, of few records so that each takes milliseconds.
 *
 * @param root the project's folder
 */
export function goodJobs(root: string): Texts[] {
  const folder = (path: string) => join(root, path);
  return [
    textsIn(folder('test/input/jobs/si')),
    textsIn(folder('test/input/jobs/us')),
    fewRuns(textsIn(folder('examples/skerry-landing'))),
    textsIn(folder('test/fuzz/job')),
    { 'job.yaml': STARTER_JOB, 'record.csv': shortened(starterRecord()) },
  ];
}

/** The same job with its short runs alone: searching remedies for long ones takes seconds. */
function fewRuns(texts: Texts): Texts {
  const runs = texts['runs.csv'].split('\n').filter((line) => /^(?:id|R1|R5|R6),/.test(line));
  return { ...texts, 'runs.csv': `${runs.join('\n')}\n` };
}

function textsIn(folder: string): Texts {
  const names = readdirSync(folder).filter((name) => /\.(?:csv|yaml)$/.test(name));
  const read = (name: string) => shortened(readFileSync(join(folder, name), 'utf8'));
  return Object.fromEntries(names.map((name) => [name, read(name)]));
}

/** A long record cut short; other files are short themselves. */
function shortened(text: string): string {
  const lines = text.split('\n');
  return lines.length < 200 ? text : `${lines.slice(0, ROWS + 1).join('\n')}\n`;
}
