import { type Findings, report } from './findings.ts';
import type { RunValues } from './run-parts.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';

/** Rounding of drawn figures that is let pass [mm]. */
const SLACK = 1;

/** Reports fasteners and overhangs that do not fit on the member, where its length is given. */
export function checkLength(
  { length, overhang, spacing }: Partial<RunValues>,
  positions: Float64Array | null,
  row: SourceMap,
  findings: Findings,
): void {
  if (length == null || overhang === undefined || positions === null) return;
  // The first position is the overhang on the left, unless it is 0.
  const left = positions[0] > 0 ? 0 : overhang;
  const needed = left + positions[positions.length - 1] + overhang;
  if (needed <= length + SLACK) return;
  const given = `${Math.round(length)} mm`;
  const key = givenValue(row, 'positions') ? 'positions' : 'count';
  if (spacing != null && spacing > length) {
    const found = givenText(row, 'spacing') ?? '';
    const expected = `a spacing shorter than the run, whose length is ${given}`;
    report(findings, placeOf(row, 'spacing'), { found, expected });
    return;
  }
  const found = `${Math.round(needed)} mm from end to end`;
  report(findings, placeOf(row, key), { found, expected: `no more than the length, ${given}` });
}
