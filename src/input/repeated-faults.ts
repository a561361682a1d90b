import type { Issue, Place } from '../issue.ts';
import type { Findings } from './findings.ts';

/** How many faults of one kind are told in full. */
const TOLD = 5;

/** Faults of a long file: the first few of a kind are reported, and how many more there are. */
export interface RepeatedFaults {
  add(kind: string, place: Place, issue: Omit<Issue, 'place'>): void;
  /** Says on the last reported fault of each kind how many more there are. To be called once, at the end. */
  finish(): void;
}

/** Reports the faults of a long file to the findings. */
export function repeatedFaults(findings: Findings): RepeatedFaults {
  const kinds = new Map<string, { count: number; last: number }>();
  return {
    add(kind, place, issue) {
      const { count, last } = kinds.get(kind) ?? { count: 0, last: 0 };
      if (count < TOLD) findings.issues.push({ place, ...issue });
      kinds.set(kind, { count: count + 1, last: count < TOLD ? findings.issues.length - 1 : last });
    },
    finish() {
      for (const { count, last } of kinds.values()) {
        if (count <= TOLD) continue;
        const issue = findings.issues[last];
        const more = `The same is wrong in ${count - TOLD} more places.`;
        const hint = issue.hint === undefined ? more : `${issue.hint} ${more}`;
        findings.issues[last] = { ...issue, hint };
      }
    },
  };
}
