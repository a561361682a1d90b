import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { screenCommand } from '../../src/commands/screen.ts';
import { readJob } from '../../src/input/job.ts';
import { InputError, type Issue, wordIssue } from '../../src/issue.ts';
import type { Job } from '../../src/model.ts';
import { understood } from '../../src/output/understood.ts';

/** How a job ended: screened, refused with a message, or in a way that it never should. */
export interface Judgement {
  readonly end: 'screened' | 'refused' | 'fault';
  /** Of a fault, what is wrong. */
  readonly why: string;
  /** Results, or the message. */
  readonly text: string;
  /** All that was read of the job: jobs that are alike in it must have the same results. */
  readonly read: string;
}

/**
 * Screens a job and judges how that ended. Screened must mean whole and sensible results; refused must mean messages
 * that each name a place, and a folder of results as it was.
 *
 * @param folder of the job
 * @param out folder of the results
 */
export async function judge(folder: string, out: string): Promise<Judgement> {
  const before = contents(out);
  try {
    const { lines } = await screenCommand(folder, { out, charts: 'none' });
    const job = await readJob(folder);
    const tables = ['results.csv', 'checks.csv', 'cycles.csv', 'record.csv'];
    const written = tables.map((name) => readFileSync(join(out, name), 'utf8'));
    const text = [lines[0], ...written].join('\n');
    const typed = contents(folder);
    const why = brokenFolder(out) ?? nonsense(`${text}\n${understood(job)}`, typed);
    return { end: why === null ? 'screened' : 'fault', why: why ?? '', text, read: allOf(job) };
  } catch (error) {
    if (!(error instanceof InputError)) {
      const why = error instanceof Error ? (error.stack ?? error.message) : String(error);
      return { end: 'fault', why, text: '', read: '' };
    }
    const why = error.issues.map(badIssue).find((one) => one !== null) ?? changed(before, out);
    const end = why === null ? 'refused' : 'fault';
    return { end, why: why ?? '', text: error.message, read: '' };
  }
}

/** A job as one text, but for the hashes of its files. */
function allOf({ inputs: _, ...job }: Job): string {
  return JSON.stringify(job, (key, value) => {
    if (value instanceof Map) return [...value];
    if (ArrayBuffer.isView(value)) return Array.from(value as Float64Array, String);
    if (typeof value === 'function' && key === 'cyclesAt') return [30, 100, 400].map(value);
    return typeof value === 'number' ? String(value) : value;
  });
}

/** What is wrong with a message, or `null`. */
function badIssue(issue: Issue): string | null {
  const words = wordIssue(issue);
  const { file, line, column } = issue.place;
  if (file === '') return `no file: ${words}`;
  for (const number of [line, column]) {
    if (number !== undefined && !(number >= 1)) return `no such place: ${words}`;
  }
  // Whatever the user typed may be shown; the rest is ours.
  const ours = `${issue.expected} ${issue.hint ?? ''}`.replaceAll(issue.found ?? '\0', '');
  if (/undefined|\[object|\bNaN\b/.test(ours)) return `unworded: ${words}`;
  return words.length < 4000 ? null : `${words.length} characters long: ${words.slice(0, 200)}`;
}

/** Words that no result holds, unless the user called something so. */
function nonsense(text: string, typed: string): string | null {
  const found = /undefined|\[object|(?<![\w-])NaN(?![\w-])/.exec(text);
  if (found === null || typed.includes(found[0])) return null;
  return `results hold ${text.slice(Math.max(0, found.index - 80), found.index + 40)}`;
}

/** What is wrong with a folder of results, or `null`. */
function brokenFolder(out: string): string | null {
  const { files } = JSON.parse(readFileSync(join(out, 'manifest.json'), 'utf8'));
  const names: string[] = files.map(({ name }: { name: string }) => name);
  const extra = readdirSync(out).filter(
    (name) => name !== 'manifest.json' && !names.includes(name),
  );
  if (extra.length > 0) return `left over: ${extra.join(', ')}`;
  for (const { name, sha256 } of files) {
    const hash = createHash('sha256')
      .update(readFileSync(join(out, name)))
      .digest('hex');
    if (hash !== sha256) return `${name} is not what the manifest says`;
  }
  return null;
}

function changed(before: string, out: string): string | null {
  return contents(out) === before ? null : 'refused, and the results changed';
}

/** All that a folder holds. */
function contents(folder: string): string {
  if (!existsSync(folder)) return '';
  return readdirSync(folder)
    .sort()
    .map((name) => `${name}\n${readFileSync(join(folder, name), 'utf8')}`)
    .join('\n');
}
