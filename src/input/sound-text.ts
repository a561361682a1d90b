import type { Place } from '../issue.ts';
import { type Findings, report } from './findings.ts';

/** Longer than anything that a value may be; a mark that a quote is missing or the file is something else. */
export const LONGEST_TEXT = 2000;

/** The text; blank where it is far too long, which is reported. */
export function soundText(text: string, place: Place, findings: Findings): string {
  if (text.length <= LONGEST_TEXT) return text;
  report(findings, place, {
    found: `${text.slice(0, 20)}…, ${text.length} characters`,
    expected: `at most ${LONGEST_TEXT} characters`,
    hint: 'A quote may be missing at its end.',
  });
  return '';
}
