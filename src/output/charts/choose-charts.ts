import type { Result } from '../../model.ts';
import { alongChart } from './along-chart.ts';
import type { Chart } from './chart.ts';
import { curveChart } from './curve-chart.ts';
import { drawingChart } from './drawing-chart.ts';
import { historyChart } from './history-chart.ts';
import { overviewChart } from './overview-chart.ts';

/** Which charts are drawn: of the governing run, an overview and every remedy, of every run, or none. */
export type ChartChoice = 'governing' | 'all' | 'none';

/** The charts of a result that are wanted, the overview first. */
export function chooseCharts(result: Result, choice: ChartChoice): Chart[] {
  if (choice === 'none') return [];
  const runs = choice === 'all' ? result.runs : [result.runs[result.governing]];
  const { job } = result;
  return [
    overviewChart(result),
    ...runs.flatMap((run) => [historyChart(run, job), curveChart(run, job), alongChart(run, job)]),
    ...result.runs.flatMap((run) => {
      const { remedy } = run;
      return remedy === null || remedy.kind === 'rework' ? [] : [drawingChart(run, remedy, job)];
    }),
  ];
}
