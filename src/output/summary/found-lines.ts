import { RECORD_FINDINGS, type RecordFinding, type Result } from '../../model.ts';
import { connectionName } from '../names.ts';
import { grouped, shortNumber } from '../number-text.ts';
import { wrap } from './text-layout.ts';

/** What judging the record found, counted by kind and by what was done, and what damage rests on its gaps. */
export function foundLines(result: Result): string[] {
  const { recordFindings } = result.job;
  if (recordFindings.length === 0) return [];
  return [...findingCounts(recordFindings), ...damageOnGaps(result), ONE_BY_ONE];
}

/** Where the findings stand singly. */
export const ONE_BY_ONE = '  One by one in record.csv.';

/** The findings counted by kind and by what was done. */
export function findingCounts(found: readonly RecordFinding[]): string[] {
  return RECORD_FINDINGS.flatMap((kind) => {
    const ofKind = found.filter((finding) => finding.kind === kind);
    return [...byWhatWasDone(ofKind)].map(([done, some]) =>
      wrap(`${kind}: ${grouped(some.length)}${lasting(some)}, ${done}`, '  - ', 4),
    );
  });
}

/** The connection whose damage rests most on gaps; nothing where the record has none. */
function damageOnGaps({ job, runs }: Result): string[] {
  if (!job.recordFindings.some(({ kind }) => kind === 'gap')) return [];
  const shares = runs.flatMap((run) =>
    run.filledShares().map(({ fastener, member }, i) => ({
      name: connectionName(run.connections[i]),
      share: Math.max(fastener ?? 0, member ?? 0),
    })),
  );
  const most = shares.reduce((a, b) => (b.share > a.share ? b : a));
  const text =
    most.share === 0
      ? 'No damage rests on the gaps: no swing that does any ends at one.'
      : `Up to ${shortNumber(100 * most.share)} % of a connection's damage (${most.name}) rests on the gaps: it is done by swings that end in one or at its edge, and that may have gone further. See results.csv.`;
  return [wrap(text, '  ')];
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
