import type { Job, RunResult } from '../../model.ts';
import { connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { unitOf } from '../quantity.ts';
import { connectionFails } from '../run-fails.ts';
import { reach } from './along.ts';
import type { Chart } from './chart.ts';
import { shearRangePanel } from './shear-range-panel.ts';
import { axis, baseOptions, spacer } from './theme.ts';
import { utilisationPanel } from './utilisation-panel.ts';

/** Along one run: each fastener's shear range against its limit, and the utilisation by check. */
export function alongChart(result: RunResult, job: Job): Chart {
  const { run, connections } = result;
  const rangePanel = shearRangePanel(connections, job);
  const usePanel = utilisationPanel(connections, job);
  const base = baseOptions(title(result), subtitle(result), { right: 256 });
  const length = unitOf('length', job.units);
  return {
    name: `${run.id}-along`,
    configuration: {
      type: 'line',
      data: { datasets: [...rangePanel.sets, ...usePanel.sets] },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: { axes: usePanel.ticks },
          directLabels: { labels: [...rangePanel.labels, ...usePanel.labels] },
        },
        scales: {
          x: axis(`Position from the member's left end [${length}]`, reach(connections, job)),
          use: axis('Utilisation', { ...STACKED, ...usePanel.scale }),
          gap: spacer(0.3),
          range: axis(`Shear range [${unitOf('force', job.units)}]`, {
            ...STACKED,
            stackWeight: 4,
            min: 0,
            grace: '8%',
          }),
        },
      },
    },
  };
}

const STACKED = { position: 'left', stack: 'panels', stackWeight: 5 } as const;

function title({ run, connections, governing }: RunResult): string {
  const connection = connections[governing];
  const check = connection.governing;
  if (check === null) return `${run.id}: no limit was given, so nothing was checked`;
  const use = shortNumber(check.utilisation ?? 0);
  const verb = check.status === 'fail' ? 'fails' : 'governs';
  return `${run.id}: ${check.check} ${verb} at ${connectionName(connection)}, ${use} times its limit`;
}

function subtitle({ run, connections }: RunResult): string {
  const failing = connections.filter(connectionFails).length;
  const count = connections.length === 1 ? '1 connection' : `${connections.length} connections`;
  const kinds = [...new Set(run.fasteners.map(({ id }) => id))].join(', ');
  const roles =
    new Set(run.roles).size > 1 ? ' Filled points are fixed, open squares slotted.' : '';
  return `${count} (${kinds}), ${failing === 0 ? 'none fails' : `${failing} with a failing check`}.${roles}`;
}
