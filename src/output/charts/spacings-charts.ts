import type { SpacingComparison } from '../../verdict/spacings.ts';
import type { Chart } from './chart.ts';
import { spacingsForceChart } from './spacings-force-chart.ts';
import { spacingsUseChart } from './spacings-use-chart.ts';

/** Two charts a run, arrangement and cut: utilisation over spacing, and forces over spacing. */
export function spacingsCharts({ job, cases }: SpacingComparison): Chart[] {
  return cases.flatMap((one) => [
    spacingsUseChart(one, job.units),
    spacingsForceChart(one, job.units),
  ]);
}
