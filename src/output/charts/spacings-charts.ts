import type { SpacingComparison } from '../../verdict/spacings.ts';
import type { Chart } from './chart.ts';
import { spacingsForceChart } from './spacings-force-chart.ts';
import { spacingsUseChart } from './spacings-use-chart.ts';

/** The charts of each run, arrangement and cut: utilisation over spacing where anything is checked, and forces. */
export function spacingsCharts({ job, cases }: SpacingComparison): Chart[] {
  return cases.flatMap((one) => [
    ...(one.rows.some(({ governing }) => governing !== null)
      ? [spacingsUseChart(one, job.units)]
      : []),
    spacingsForceChart(one, job.units),
  ]);
}
