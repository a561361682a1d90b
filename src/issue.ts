/** Where in the user's input something stands. Lines and columns count from 1. */
export interface Place {
  readonly file: string;
  readonly line?: number;
  readonly column?: number;
  /** The CSV column's header or the key's path in the job, such as `limits.damage`. */
  readonly key?: string;
}

/** One thing wrong with the input: data, not prose, so that every message is worded in one place. */
export interface Issue {
  readonly place: Place;
  /** What stood there; absent where nothing did. */
  readonly found?: string;
  /** What was expected there, as the end of a sentence that begins «expected». */
  readonly expected: string;
  /** How to mend it, a whole sentence. */
  readonly hint?: string;
  /** The nearest known name. */
  readonly nearest?: string;
}

/** Every issue of a job at once. */
export class InputError extends Error {
  readonly issues: readonly Issue[];

  constructor(issues: readonly Issue[]) {
    super(issues.map(wordIssue).join('\n'));
    this.name = 'InputError';
    this.issues = issues;
  }
}

/** The issue as one message of one to three lines: place, found and expected, and how to mend it. */
export function wordIssue(issue: Issue): string {
  const { file, line, column, key } = issue.place;
  const where = [file, line, column].filter((part) => part !== undefined).join(':');
  const subject = key === undefined ? '' : `${key}: `;
  const found = issue.found === undefined ? 'nothing stands here' : `found ${quote(issue.found)}`;
  const nearest = issue.nearest === undefined ? '' : ` Did you mean ${quote(issue.nearest)}?`;
  const hint = issue.hint === undefined ? '' : `\n    ${issue.hint}`;
  return `${where}  ${subject}${found}, expected ${issue.expected}.${nearest}${hint}`;
}

/** The user's own text in quotes, shortened where it is very long. */
function quote(text: string): string {
  const shown = text.length > 80 ? `${text.slice(0, 77)}…` : text;
  return `"${shown}"`;
}
