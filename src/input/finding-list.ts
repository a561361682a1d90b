import type { RecordFinding, RecordFindingKind } from '../model.ts';

/** So many of a kind are listed one by one; a longer list is of no use and takes the memory of the record. */
const MOST_LISTED = 100_000;

/** What was found in a record, gathered while it is read and judged. */
export class FindingList {
  private readonly listed: RecordFinding[] = [];
  private readonly counts = new Map<RecordFindingKind, number>();

  add(finding: RecordFinding): void {
    const count = (this.counts.get(finding.kind) ?? 0) + 1;
    this.counts.set(finding.kind, count);
    if (count <= MOST_LISTED) this.listed.push(finding);
  }

  /** How many of a kind there are, listed or not. */
  count(kind: RecordFindingKind): number {
    return this.counts.get(kind) ?? 0;
  }

  /** In order of time; where there are more of a kind than are listed, the last one of it says so. */
  inOrder(): RecordFinding[] {
    const more = [...this.counts].filter(([, count]) => count > MOST_LISTED);
    for (const [kind, count] of more) {
      const at = this.listed.findLastIndex((finding) => finding.kind === kind);
      const done = `${this.listed[at].done}; ${count - MOST_LISTED} more of its kind are not listed`;
      this.listed[at] = { ...this.listed[at], done };
    }
    return this.listed.sort((a, b) => a.time - b.time);
  }
}
