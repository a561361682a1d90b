/** Where in the user's input something stands. Lines and columns count from 1. */
export interface Place {
  readonly file: string;
  readonly line?: number;
  readonly column?: number;
  /** Of a CSV, the cell as a spreadsheet names it, such as `C3`. */
  readonly cell?: string;
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

/** A place in words, such as `runs.csv:2:8 (cell C2)  spacing [mm]`. */
export function wordPlace({ file, line, column, cell, key }: Place): string {
  const position = [file, line, column].filter((part) => part !== undefined).join(':');
  const where = cell === undefined ? position : `${position} (cell ${cell})`;
  return key === undefined ? where : `${where}  ${key}`;
}

/** The issue as one message of one to three lines: place, found and expected, and how to mend it. */
export function wordIssue(issue: Issue): string {
  const found = issue.found === undefined ? 'nothing stands here' : `found ${quote(issue.found)}`;
  const nearest = issue.nearest === undefined ? '' : ` Did you mean ${quote(issue.nearest)}?`;
  const hint = issue.hint === undefined ? '' : `\n    ${issue.hint}`;
  const where = `${wordPlace(issue.place)}${issue.place.key === undefined ? '  ' : ': '}`;
  return `${where}${found}, expected ${issue.expected}.${nearest}${hint}`;
}

/** How many issues are told in full unless all are asked for. */
export const TOLD_IN_FULL = 10;

/**
 * The messages of several issues: the first ten in full and how many more there are, or all.
 *
 * @param all whether to word every one
 */
export function wordIssues(issues: readonly Issue[], all: boolean): string[] {
  const told = all ? issues : issues.slice(0, TOLD_IN_FULL);
  const rest = issues.length - told.length;
  const more = `… and ${rest} more ${rest === 1 ? 'error' : 'errors'}: --all-errors shows all.`;
  return [...told.map(wordIssue), ...(rest === 0 ? [] : [more])];
}

/** The user's own text in quotes on one line, shortened where it is very long. */
function quote(text: string): string {
  const shown = text.length > 80 ? `${text.slice(0, 77)}…` : text;
  return `"${shown.replace(/\p{Cc}+/gu, ' ')}"`;
}
