import { readCsv } from './csv.ts';
import type { Files } from './files.ts';
import { type Findings, report } from './findings.ts';
import type { Source, SourceMap } from './source.ts';
import { wrongForm } from './values.ts';

/**
 * The rows of a table: those of a list in the job, or those of the CSV file that it names.
 *
 * @returns one map a row; a fault is reported and its row left out
 */
export async function readTable(
  source: Source,
  files: Files,
  findings: Findings,
): Promise<SourceMap[]> {
  if (source.type === 'text') {
    const text = await files.read(source.text, source.place, findings);
    return text === null ? [] : readCsv(text, source.text, findings);
  }
  if (source.type === 'list') return source.items.flatMap((item) => rowOf(item, findings));
  report(findings, source.place, { found: 'a mapping', expected: 'a list, each item with a dash' });
  return [];
}

/** A row of a list; none where the item is no mapping, which is reported. */
export function rowOf(item: Source, findings: Findings): SourceMap[] {
  if (item.type === 'map') return [item];
  const outcome = wrongForm(item, 'a mapping of keys to values');
  if ('faults' in outcome) report(findings, item.place, outcome.faults[0]);
  return [];
}
