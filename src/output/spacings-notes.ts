import { scaledFrom } from '../temperature/short-season.ts';
import type { SpacingComparison } from '../verdict/spacings.ts';
import { shortNumber } from './number-text.ts';
import { caseText, lengthText } from './spacings-words.ts';

/** What a comparison of spacings leaves out or assumes, one entry a point. */
export function spacingsNotes(comparison: SpacingComparison): string[] {
  const { job, cases } = comparison;
  const cut = cases.some(({ rows }) => rows.some(({ pieces }) => pieces > 1));
  return [
    'Each run keeps its fastened length, its fasteners set evenly, never wider apart than asked.',
    'Only the spacings tried were screened; nothing is said of those between.',
    ...(cut
      ? [
          'A run in pieces is cut at mid-spans, each piece with the same number of fasteners or one more, and each is screened alone; the worst of them counts.',
        ]
      : []),
    'Joint gaps are not checked here: screen the run that you choose.',
    ...walking(comparison),
    ...record(comparison),
    ...(job.counting.forceGate > 0 || job.counting.stressGate > 0
      ? ["Ranges under the job's gate were dropped; screening a run tells how many."]
      : []),
    'Left out: bending of the member from fasteners off its axis.',
    'Left out: torsional, local and distortional buckling.',
    'Forces and ranges are unfactored; damage and static checks carry the factors of the job.',
  ];
}

function walking({ cases, job: { units } }: SpacingComparison): string[] {
  return cases.flatMap((one) => {
    const walks = one.rows.filter((row) => row.walks);
    if (walks.length === 0) return [];
    const at = walks.map(({ asked }) => lengthText(asked, units)).join(', ');
    return [
      `${caseText(one, units)}, walks at ${at}: its slips still drift from pass to pass. The drift over the design life is added to slot travel.`,
    ];
  });
}

function record({ cases, job }: SpacingComparison): string[] {
  const days = scaledFrom(...cases.map(({ rows }) => rows[0]));
  return [
    ...(days === null
      ? []
      : [
          `The record covers ${shortNumber(days)} days: damage a year and lives are scaled from them, and the rest of the year is taken to be alike.`,
        ]),
    ...(job.extremes.length === 0
      ? ['No extremes were given: peak forces and slips are those of this record alone.']
      : []),
  ];
}
