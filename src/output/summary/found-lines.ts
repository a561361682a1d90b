import { type Job, RECORD_FINDINGS, type RecordFinding } from '../../model.ts';
import { grouped, shortNumber } from '../number-text.ts';
import { wrap } from './text-layout.ts';

/** What judging the record found, counted by kind and by what was done; how to know more. */
export function foundLines({ recordFindings }: Job): string[] {
  if (recordFindings.length === 0) return [];
  const lines = RECORD_FINDINGS.flatMap((kind) => {
    const ofKind = recordFindings.filter((finding) => finding.kind === kind);
    return [...byWhatWasDone(ofKind)].map(([done, some]) =>
      wrap(`${kind}: ${grouped(some.length)}${lasting(some)}, ${done}`, '  - ', 4),
    );
  });
  return [...lines, '  One by one in record.csv.'];
}

/** What was done ends at a semicolon; behind it stands what is special of one finding. */
function byWhatWasDone(found: readonly RecordFinding[]): Map<string, RecordFinding[]> {
  const groups = new Map<string, RecordFinding[]>();
  for (const finding of found) {
    const [done] = finding.done.split(';');
    const group = groups.get(done);
    if (group === undefined) groups.set(done, [finding]);
    else group.push(finding);
  }
  return groups;
}

function lasting(found: readonly RecordFinding[]): string {
  const hours = found.reduce((sum, finding) => sum + (finding.hours ?? 0), 0);
  return hours === 0 ? '' : ` (${shortNumber(hours)} h)`;
}
