import type { Job, RunResult } from '../../model.ts';
import { amount, connectionName } from '../names.ts';
import type { Chart } from './chart.ts';
import { shearPanel, spanPanel, temperaturePanel } from './history-panels.ts';
import { axis, baseOptions, spacer } from './theme.ts';
import { timeTicks } from './time-ticks.ts';

/**
 * The record as a run's governing connection meets it: the temperatures of its member and structure,
 * and below them the shear of one fastener and the force of the worse span beside it in the counted pass.
 */
export function historyChart(result: RunResult, job: Job): Chart {
  const { run } = result;
  const connection = result.connections[result.governing];
  const { times } = job.axis;
  const [from, to] = [times[0], times[times.length - 1]];
  const panels = [temperaturePanel(result, job), shearPanel(result, job), spanPanel(result, job)];
  const range = amount(connection.shearRange, 'force', job.units);
  const lockIn = amount(run.lockIn, 'temperature', job.units);
  const title = `${connectionName(connection)}: one fastener's shear ranges over ${range} in the record`;
  const subtitle = `Governing connection of ${run.id}: ${connection.fastener.id}, ${connection.role}. Member locked in at ${lockIn}.`;
  const base = baseOptions(title, subtitle, { right: 150 });
  return {
    name: `${run.id}-history`,
    configuration: {
      type: 'line',
      data: { datasets: panels.flatMap((panel) => panel.sets) },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: { axes: { x: timeTicks(from, to) } },
          directLabels: { labels: panels.flatMap((panel) => panel.labels) },
        },
        // The library stacks the panels from the last one down.
        scales: {
          x: axis('', { min: from, max: to }),
          span: panels[2].scale,
          lowerGap: spacer(0.4),
          shear: panels[1].scale,
          upperGap: spacer(0.4),
          temperature: panels[0].scale,
        },
      },
    },
  };
}
