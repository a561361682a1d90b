import { isUtf8 } from 'node:buffer';
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
    sunlit(textsIn(folder('examples/larch-yard'))),
    textsIn(folder('test/fuzz/job')),
    { 'job.yaml': STARTER_JOB, 'record.csv': shortened(starterRecord()) },
  ];
}

/** A small job on each awkward record that the tests hold. */
export function recordJobs(root: string): Texts[] {
  const folder = join(root, 'test/records');
  return readdirSync(folder)
    .filter((name) => isText(join(folder, name)))
    .map((name) => {
      const { 'record.yaml': record, 'clean.csv': _, ...csvs } = textsIn(join(folder, name));
      const indented = record.replace(/^/gm, '  ').trimEnd();
      return { ...csvs, 'job.yaml': `record:\n${indented}\n${REST_OF_JOB}` };
    });
}

const REST_OF_JOB = `zones: { rail: { column: deck } }
members: [{ id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2 }]
fasteners: [{ id: bracket, stiffness: 2 kN/mm, shear_resistance: 12 kN }]
runs: [{ id: R1, member: rail, zone: rail, fastener: bracket, count: 3, spacing: 600 mm, lock_in: 5 degC }]
`;

/** True where every file of a folder is UTF-8: the others cannot be changed as text. */
function isText(folder: string): boolean {
  return readdirSync(folder).every((name) => isUtf8(readFileSync(join(folder, name))));
}

/** The same job with two of its eight runs. */
function sunlit(texts: Texts): Texts {
  const job = texts['job.yaml'].replace(/^ {2}- \{ id: (?:DE|DW|L[ENSW]),.*\n/gm, '');
  return { ...texts, 'job.yaml': job };
}

/** The same job with its short runs alone: searching remedies for long ones takes seconds. */
function fewRuns(texts: Texts): Texts {
  const runs = texts['runs.csv'].split('\n').filter((line) => /^(?:id|R1|R5|R6),/.test(line));
  return { ...texts, 'runs.csv': `${runs.join('\n')}\n` };
}

function textsIn(folder: string): Texts {
  const names = readdirSync(folder).filter((name) => /\.(?:csv|yaml|epw)$/.test(name));
  const read = (name: string) => shortened(readFileSync(join(folder, name), 'utf8'));
  return Object.fromEntries(names.map((name) => [name, read(name)]));
}

/** A long record cut short; other files are short themselves. */
function shortened(text: string): string {
  const lines = text.split('\n');
  return lines.length < 200 ? text : `${lines.slice(0, ROWS + 1).join('\n')}\n`;
}
