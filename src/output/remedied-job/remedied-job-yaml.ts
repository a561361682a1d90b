import { type Document, isMap, isScalar, isSeq, parseDocument, YAMLSeq } from 'yaml';
import type { Result, Run, RunResult } from '../../model.ts';
import { fastenerIds, idAmong } from './fastener-ids.ts';
import { fastenerRow } from './fastener-row.ts';
import { runRow } from './run-row.ts';

/** The first line of every job that is written here. */
export const REMEDIED_MARK =
  '# Written by daystrain: a job with the remedies of its failing runs in.';

/**
 * The job with its remedies in, as a job file of its own: fasteners and runs stand in it as lists, everything else is as
 * the user wrote it.
 *
 * @param result a screened job
 * @param jobText the text that the job was read from
 * @param relocate a file's name as the new job must have it, from the name in the old one
 * @returns YAML text; read and screened it gives the utilisations that the remedies promise
 */
export function remediedJobYaml(
  { job, runs }: Result,
  jobText: string,
  relocate: (name: string) => string,
): string {
  // Without a schema every value stays as it was typed: `01` is no 1.
  const document = parseDocument(jobText, { schema: 'failsafe' });
  for (const path of FILES) renameAt(document, path, relocate);
  const drawn = runs.flatMap(drawnRuns);
  const types = fastenerIds(drawn);
  const { units } = job;
  setList(
    document,
    'fasteners',
    [...types].map(([id, fastener]) => fastenerRow(fastener, id, units)),
  );
  setList(
    document,
    'runs',
    drawn.map((run) => runRow(run, (fastener) => idAmong(fastener, types), units)),
  );
  // Remedies are checked for uneven friction, and a job is where it gives the spread of grips.
  if (!isMap(document.get('remedies'))) document.set('remedies', document.createNode({}));
  document.setIn(['remedies', 'grip_spread'], String(job.remedies.gripSpread));
  const text = document.toString({ lineWidth: 0 });
  return `${REMEDIED_MARK}\n${text.replace(new RegExp(`^${REMEDIED_MARK}\n`), '')}`;
}

/** A run as drawn: the pieces of its remedy, or itself where it has none. */
function drawnRuns({ run, remedy }: RunResult): readonly Run[] {
  return remedy === null || remedy.kind === 'rework'
    ? [run]
    : remedy.pieces.map((piece) => piece.run);
}

/** Where a job names files: a text, or the texts of a list. */
const FILES = [['record', 'file'], ['record', 'files'], ['extremes'], ['members'], ['curves']];

function renameAt(
  document: Document,
  path: readonly string[],
  relocate: (name: string) => string,
): void {
  const node = document.getIn(path, true);
  const texts = isSeq(node) ? node.items : [node];
  for (const text of texts) {
    if (isScalar(text) && typeof text.value === 'string') text.value = relocate(text.value);
  }
}

/** Puts a list in place of what the document holds under a key, each item on a line of its own. */
function setList(document: Document, key: string, rows: readonly object[]): void {
  const list = new YAMLSeq();
  list.items = rows.map((row) => document.createNode(row, { flow: true }));
  document.set(key, list);
}
