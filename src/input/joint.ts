import type { Joint } from '../model.ts';
import { type Findings, report } from './findings.ts';
import type { RunValues } from './run-parts.ts';
import { placeOf, type SourceMap } from './source.ts';

/** How the gap at a run's right end is covered; `null` with a fault, which is reported. */
export function jointOf(values: RunValues, row: SourceMap, findings: Findings): Joint | null {
  const cover = coverOf(values, row, findings);
  return cover && { cover, structureMovement: values.structure_movement };
}

function coverOf(values: RunValues, row: SourceMap, findings: Findings): Joint['cover'] | null {
  const { joint, gap, lap, sealant_movement: movement } = values;
  if (joint === 'open') return { kind: 'open' };
  if (gap === null) {
    const expected = `the gap's width, such as 20 mm, for a ${joint} joint`;
    return report(findings, placeOf(row, 'gap'), { expected });
  }
  if (joint === 'sealed') {
    if (movement !== null) return { kind: 'sealed', movement };
    const expected = 'a share, such as 0.25, for a sealed joint';
    return report(findings, placeOf(row, 'sealant_movement'), { expected });
  }
  if (lap !== null) return { kind: 'lapped', lap };
  return report(findings, placeOf(row, 'lap'), {
    expected: 'a length, such as 40 mm, for a lapped joint',
  });
}
