import { createDamageTables, type DamageTables } from '../damage/damage-table.ts';
import type { Job, Run } from '../model.ts';
import { type Arrangement, arrangementOf } from './arrangement.ts';
import { type Cut, type EvenPieces, evenPieces } from './even-pieces.ts';
import { type SpacingAnswer, spacingAnswer } from './spacing-answer.ts';
import { type SpacingRow, spacingRow } from './spacing-row.ts';

/** What is to be compared: every run at every spacing, in every arrangement, cut in every way. */
export interface SpacingQuestion {
  readonly runs: readonly Run[];
  /** Widest spacings [mm], rising. */
  readonly spacings: readonly number[];
  /** `null` is each run's own. */
  readonly arrangements: readonly Arrangement[] | null;
  readonly cuts: readonly Cut[];
}

/** One run in one arrangement, cut in one way, at all spacings. */
export interface SpacingCase {
  readonly run: Run;
  readonly arrangement: Arrangement;
  readonly cut: Cut;
  /** From the closest spacing to the widest. */
  readonly rows: readonly SpacingRow[];
  readonly answer: SpacingAnswer;
}

/** Why a run, or a part of its question, was not screened. */
export type NotCompared = { readonly run: Run } & (
  | { readonly why: 'one fastener' }
  | { readonly why: 'fixed by numbers' }
  | { readonly why: 'no slotted fastener'; readonly arrangement: Arrangement }
  | {
      readonly why: 'too few fasteners for the pieces';
      readonly cut: Cut;
      /** The spacings at which a piece would have fewer than two fasteners [mm]. */
      readonly spacings: readonly number[];
    }
);

export interface SpacingComparison {
  readonly job: Job;
  readonly question: SpacingQuestion;
  readonly cases: readonly SpacingCase[];
  readonly notCompared: readonly NotCompared[];
}

/**
 * Screens runs at several spacings, their fastened length kept and their fasteners set evenly, in several arrangements
 * and cut into several numbers of pieces, and finds the widest spacing that passes in each case.
 *
 * @param job the job that the runs are of
 * @param question at least one spacing and one way to cut
 */
export function compareSpacings(job: Job, question: SpacingQuestion): SpacingComparison {
  const tables = createDamageTables();
  const compared = question.runs.map((run) => compareRun(run, job, question, tables));
  return {
    job,
    question,
    cases: compared.flatMap(({ cases }) => cases),
    notCompared: compared.flatMap(({ notCompared }) => notCompared),
  };
}

function compareRun(
  run: Run,
  job: Job,
  question: SpacingQuestion,
  tables: DamageTables,
): Pick<SpacingComparison, 'cases' | 'notCompared'> {
  if (run.positions.length === 1) {
    return { cases: [], notCompared: [{ run, why: 'one fastener' }] };
  }
  const own = arrangementOf(run);
  const asked = question.arrangements ?? (own === null ? [] : [own]);
  const possible = asked.filter((one) => one === 'all' || run.slottedType !== null);
  const impossible = asked.filter((one) => !possible.includes(one));
  const cases = possible.flatMap((arrangement) =>
    question.cuts.flatMap((cut): SpacingCase[] => {
      const screened = (even: EvenPieces, spacing: number) =>
        spacingRow(spacing, even, job, tables);
      const rows = rowsOf(
        question.spacings,
        (one) => evenPieces(run, one, arrangement, cut),
        screened,
      );
      if (rows.length === 0) return [];
      return [{ run, arrangement, cut, rows, answer: spacingAnswer(rows, run, arrangement) }];
    }),
  );
  const notCompared: NotCompared[] = [
    ...(asked.length === 0 ? [{ run, why: 'fixed by numbers' } as const] : []),
    ...impossible.map((arrangement) => ({ run, why: 'no slotted fastener', arrangement }) as const),
    ...question.cuts.flatMap((cut) => tooFew(run, cut, question.spacings)),
  ];
  return { cases, notCompared };
}

/** A row for each spacing at which there can be pieces; spacings that come to one number of fasteners are screened once. */
function rowsOf(
  spacings: readonly number[],
  piecesAt: (spacing: number) => EvenPieces | null,
  screened: (even: EvenPieces, asked: number) => SpacingRow,
): SpacingRow[] {
  const rows: SpacingRow[] = [];
  for (const asked of spacings) {
    const even = piecesAt(asked);
    if (even === null) continue;
    const alike = rows.find(({ count }) => count === even.count);
    rows.push(alike ? { ...alike, asked } : screened(even, asked));
  }
  return rows;
}

function tooFew(run: Run, cut: Cut, asked: readonly number[]): NotCompared[] {
  const spacings = asked.filter((one) => evenPieces(run, one, 'all', cut) === null);
  if (spacings.length === 0) return [];
  return [{ run, why: 'too few fasteners for the pieces', cut, spacings }];
}
