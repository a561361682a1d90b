import { createDamageTables } from '../damage/damage-table.ts';
import type { Job, Run } from '../model.ts';
import { type Arrangement, arrangementOf } from './arrangement.ts';
import { type Cut, evenPieces } from './even-pieces.ts';
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
  const cases: SpacingCase[] = [];
  const notCompared: NotCompared[] = [];
  for (const run of question.runs) {
    if (run.positions.length === 1) {
      notCompared.push({ run, why: 'one fastener' });
      continue;
    }
    const own = arrangementOf(run);
    const arrangements = question.arrangements ?? (own === null ? [] : [own]);
    if (arrangements.length === 0) notCompared.push({ run, why: 'fixed by numbers' });
    for (const cut of question.cuts) {
      const few = question.spacings.filter((one) => evenPieces(run, one, 'all', cut) === null);
      if (few.length === 0) continue;
      notCompared.push({ run, why: 'too few fasteners for the pieces', cut, spacings: few });
    }
    for (const arrangement of arrangements) {
      if (arrangement !== 'all' && run.slottedType === null) {
        notCompared.push({ run, why: 'no slotted fastener', arrangement });
        continue;
      }
      for (const cut of question.cuts) {
        const rows = rowsOf(run, arrangement, cut);
        if (rows.length === 0) continue;
        const answer = spacingAnswer(rows, run, arrangement);
        cases.push({ run, arrangement, cut, rows, answer });
      }
    }
  }
  return { job, question, cases, notCompared };

  /** Spacings that come to the same number of fasteners are screened once. */
  function rowsOf(run: Run, arrangement: Arrangement, cut: Cut): SpacingRow[] {
    const rows: SpacingRow[] = [];
    for (const asked of question.spacings) {
      const even = evenPieces(run, asked, arrangement, cut);
      if (even === null) continue;
      const alike = rows.find(({ count }) => count === even.count);
      rows.push(alike ? { ...alike, asked } : spacingRow(asked, even, job, tables));
    }
    return rows;
  }
}
