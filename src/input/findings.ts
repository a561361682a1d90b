import type { Issue, Place } from '../issue.ts';
import type { DefaultUsed, DerivedValue } from '../model.ts';

/** What reading a job brings to light beside the job itself. Filled as the reading goes on. */
export interface Findings {
  readonly issues: Issue[];
  readonly defaults: DefaultUsed[];
  readonly derived: DerivedValue[];
  readonly warnings: string[];
}

/** Nothing found yet. */
export function noFindings(): Findings {
  return { issues: [], defaults: [], derived: [], warnings: [] };
}

/** Notes an issue and answers `null`, so that a reader can end with it. */
export function report(findings: Findings, place: Place, issue: Omit<Issue, 'place'>): null {
  findings.issues.push({ place, ...issue });
  return null;
}
