import { nearestName } from '../input/nearest-name.ts';
import { InputError, type Issue } from '../issue.ts';
import type { Job, Run } from '../model.ts';
import { lengthText } from '../output/spacings-words.ts';
import { readQuantity } from '../units.ts';
import type { Arrangement } from '../verdict/arrangement.ts';
import type { Cut } from '../verdict/even-pieces.ts';
import type { SpacingQuestion } from '../verdict/spacings.ts';

/** What the command line says about a comparison, as it was typed. */
export interface SpacingOptions {
  readonly at?: readonly string[];
  readonly from?: string;
  readonly to?: string;
  readonly by?: string;
  readonly runs?: readonly string[];
  readonly fixed?: readonly Arrangement[];
  readonly pieces?: readonly string[];
  readonly piece?: readonly string[];
}

/** A run has no more fasteners than these, and a comparison no more spacings. */
const MOST_FASTENERS = 500;
const MOST_SPACINGS = 200;

/** The parts of a question that do not hang on the job. */
export type AskedSpacings = Pick<SpacingQuestion, 'spacings' | 'arrangements' | 'cuts'>;

/**
 * Reads spacings [mm], arrangements and cuts.
 *
 * @throws InputError with every fault
 */
export function readSpacings(options: SpacingOptions): AskedSpacings {
  const issues: Issue[] = [];
  const spacings = [...listed(options, issues), ...stepped(options, issues)];
  const cuts = cutsOf(options, issues);
  if (issues.length > 0) throw new InputError(issues);
  const arrangements = options.fixed === undefined ? null : [...new Set(options.fixed)];
  return { spacings: distinct(spacings), arrangements, cuts };
}

/**
 * The runs that are compared: those named, or all.
 *
 * @throws InputError where a run is not in the job, or would have too many fasteners
 */
export function chooseRuns(job: Job, options: SpacingOptions, spacings: readonly number[]): Run[] {
  const issues: Issue[] = [];
  const ids = job.runs.map(({ id }) => id);
  const named = [...new Set(options.runs ?? ids)];
  const runs = named.flatMap((id) => {
    const run = job.runs.find((one) => one.id === id);
    if (run !== undefined) return [run];
    const nearest = nearestName(id, ids);
    const known = ids.length > 12 ? `${ids.slice(0, 12).join(', ')}, …` : ids.join(', ');
    const issue = { ...said('--runs', id), expected: `a run of the job: ${known}` };
    issues.push(nearest === undefined ? issue : { ...issue, nearest });
    return [];
  });
  for (const run of runs) {
    const length = run.positions[run.positions.length - 1] - run.positions[0];
    if (spacings[0] >= length / (MOST_FASTENERS - 1)) continue;
    const expected = `a spacing at which ${run.id}, ${lengthText(length, job.units)} from its first fastener to its last, has at most ${MOST_FASTENERS} fasteners`;
    issues.push({ ...said('--at or --from', lengthText(spacings[0], job.units)), expected });
  }
  if (issues.length > 0) throw new InputError(issues);
  return runs;
}

function listed({ at, from, to, by }: SpacingOptions, issues: Issue[]): number[] {
  if (at === undefined && from === undefined && to === undefined && by === undefined) {
    issues.push({
      place: { file: 'spacings' },
      expected:
        'spacings to try: --at "300 mm" "600 mm", or --from "300 mm" --to "1200 mm" --by "100 mm"',
    });
  }
  return (at ?? []).flatMap((text) => readLength('--at', text, issues) ?? []);
}

/** From, from + by, … up to `to`. */
function stepped({ from, to, by }: SpacingOptions, issues: Issue[]): number[] {
  const given = { '--from': from, '--to': to, '--by': by };
  if (Object.values(given).every((text) => text === undefined)) return [];
  const [first, last, step] = Object.entries(given).map(([option, text]) => {
    if (text !== undefined) return readLength(option, text, issues);
    issues.push({
      place: { file: option },
      expected: 'it beside the others of --from, --to and --by',
    });
    return null;
  });
  if (first === null || last === null || step === null) return [];
  if (last < first) {
    issues.push({
      ...said('--to', to ?? ''),
      expected: `a spacing not closer than --from, ${from}`,
    });
    return [];
  }
  // a last step that falls short of the end by rounding is the end
  const steps = Math.floor((last - first) / step + 1e-9);
  if (steps + 1 > MOST_SPACINGS) {
    issues.push({
      ...said('--by', by ?? ''),
      expected: `steps that give no more than ${MOST_SPACINGS} spacings`,
    });
    return [];
  }
  return Array.from({ length: steps + 1 }, (_, i) => first + i * step);
}

function cutsOf({ pieces, piece }: SpacingOptions, issues: Issue[]): Cut[] {
  const numbers = (pieces ?? []).flatMap((text) => {
    const most = MOST_FASTENERS / 2;
    if (/^\d{1,3}$/.test(text) && Number(text) >= 1 && Number(text) <= most) return Number(text);
    issues.push({ ...said('--pieces', text), expected: `a whole number from 1 to ${most}` });
    return [];
  });
  const lengths = (piece ?? []).flatMap((text) => readLength('--piece', text, issues) ?? []);
  if (pieces === undefined && piece === undefined) return [{ pieces: 1 }];
  return [
    ...distinct(numbers).map((count) => ({ pieces: count })),
    ...distinct(lengths).map((longest) => ({ longest })),
  ];
}

function readLength(option: string, text: string, issues: Issue[]): number | null {
  const { value, hint } = readQuantity(text, 'length');
  if (value !== null && value > 0) return value;
  const expected = 'a length over 0 with its unit, such as 600 mm';
  const quoted = `Write the number and its unit together in quotes: ${option} "600 mm".`;
  issues.push({ ...said(option, text), expected, hint: hint ?? quoted });
  return null;
}

function said(option: string, text: string) {
  return { place: { file: option }, found: text };
}

/** Rising, and each once. */
function distinct(values: readonly number[]): number[] {
  const rising = [...values].sort((a, b) => a - b);
  return rising.filter((value, i) => i === 0 || value > rising[i - 1] * (1 + 1e-9));
}
