import {
  CHECKS,
  type CheckName,
  type Connection,
  type Job,
  type Role,
  type RunResult,
} from '../../model.ts';
import { connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Chart, Point } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { roundTicks } from './log-ticks.ts';
import { axis, baseOptions, COLOUR, DASH, type LineSet, line, spacer, TICKS } from './theme.ts';

/** With more fasteners than these, point shapes would run together. */
const MOST_SHAPES = 80;

/** Over this a linear scale would press the other checks flat. */
const MOST_LINEAR = 4;

/** Least utilisation of a logarithmic scale; smaller ones are drawn at it. */
const LEAST = 0.01;

/** Along one run: each fastener's shear range against its limit, and the utilisation by check. */
export function alongChart(result: RunResult, job: Job): Chart {
  const { run, connections } = result;
  const rangePanel = shearPanel(connections, job);
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

interface Panel {
  readonly sets: LineSet[];
  readonly labels: DirectLabel[];
}

function title({ run, connections, governing }: RunResult): string {
  const connection = connections[governing];
  const check = connection.governing;
  if (check === null) return `${run.id}: no limit was given, so nothing was checked`;
  const use = shortNumber(check.utilisation ?? 0);
  const verb = check.status === 'fail' ? 'fails' : 'governs';
  return `${run.id}: ${check.check} ${verb} at ${connectionName(connection)}, ${use} times its limit`;
}

function subtitle({ run, connections }: RunResult): string {
  const failing = connections.filter(({ verdict }) => verdict === 'fails').length;
  const count = connections.length === 1 ? '1 connection' : `${connections.length} connections`;
  const kinds = [...new Set(run.fasteners.map(({ id }) => id))].join(', ');
  return `${count} (${kinds}), ${failing === 0 ? 'none fails' : `${failing} with a failing check`}.`;
}

/** The x scale: from end to end with a little room. */
function reach(connections: readonly Connection[], job: Job) {
  const first = place(connections[0], job);
  const last = place(connections[connections.length - 1], job);
  const room = last > first ? (last - first) * 0.02 : Math.max(1, Math.abs(first) * 0.1);
  return { min: first - room, max: last + room, ticks: { ...TICKS, includeBounds: false } };
}

function place({ position }: Connection, job: Job): number {
  return inUnits(position, 'length', job.units);
}

function shearPanel(connections: readonly Connection[], job: Job): Panel {
  const at = (connection: Connection): Point => ({
    x: place(connection, job),
    y: inUnits(connection.shearRange, 'force', job.units),
  });
  const all = line(connections.map(at), {
    label: 'shear range',
    yAxisID: 'range',
    borderWidth: 1.5,
  });
  const roles = (['fixed', 'slotted'] as const).flatMap((role) => {
    const some = connections.filter((connection) => connection.role === role);
    return some.length === 0 ? [] : [{ role, points: some.map(at) }];
  });
  const limit = limitLine(connections, job);
  const last = at(connections[connections.length - 1]);
  return {
    sets: [
      all,
      ...roles.map(({ role, points }) => rolePoints(role, points, connections.length)),
      limit,
    ],
    labels: [
      label(`shear range`, 'range', last, COLOUR.demand),
      ...(roles.length > 1 ? roles.map(({ role, points }) => nameOfRole(role, points)) : []),
      limit.data.length === 0
        ? NO_LIMIT
        : label('limit', 'range', limit.data[limit.data.length - 1], COLOUR.limit),
    ],
  };
}

function limitLine(connections: readonly Connection[], job: Job): LineSet {
  const limits = connections.flatMap((connection) => {
    const limit = connection.fastener.shearRangeLimit;
    if (limit === null) return [];
    return [{ x: place(connection, job), y: inUnits(limit, 'force', job.units) }];
  });
  return line(limits, {
    label: 'limit of the shear range',
    yAxisID: 'range',
    borderColor: COLOUR.limit,
    borderDash: DASH.dashed,
    borderWidth: 2,
    stepped: 'middle',
    pointRadius: limits.length === 1 ? 6 : 0,
    pointStyle: 'line',
    pointBorderColor: COLOUR.limit,
  });
}

function rolePoints(role: Role, data: Point[], connections: number): LineSet {
  return line(data, {
    label: role,
    yAxisID: 'range',
    showLine: false,
    pointRadius: connections > MOST_SHAPES ? 2 : 5,
    pointStyle: role === 'fixed' ? 'circle' : 'rect',
    pointBackgroundColor: role === 'fixed' ? COLOUR.demand : COLOUR.paper,
    pointBorderColor: COLOUR.demand,
    pointBorderWidth: 1.5,
  });
}

const NO_LIMIT: DirectLabel = {
  text: 'no limit was given',
  xAxis: 'x',
  yAxis: 'range',
  x: 'right',
  y: 'top',
  shift: [18, 8],
  colour: COLOUR.faint,
};

/** Where a run has both roles: the fixed ones are named at their first point, the slotted at their last. */
function nameOfRole(role: Role, points: readonly Point[]): DirectLabel {
  const axes = { xAxis: 'x', yAxis: 'range' };
  return role === 'fixed'
    ? { text: role, ...axes, ...points[0], side: 'right', shift: [8, -11] }
    : { text: role, ...axes, ...points[points.length - 1], side: 'left', shift: [0, -14] };
}

function utilisationPanel(connections: readonly Connection[], job: Job) {
  const checks = CHECKS.flatMap((name, i) => {
    const points = connections.flatMap((connection) => usePoint(connection, name, job));
    return points.length === 0 ? [] : [{ name, look: LOOKS[i], points }];
  });
  const all = checks.flatMap(({ points }) => points.map(({ y }) => y));
  const most = Math.max(1, ...all.filter(Number.isFinite));
  const top = most * 1.3;
  const logarithmic = most > MOST_LINEAR;
  const shapes = connections.length <= MOST_SHAPES;
  const { min, max } = reach(connections, job);
  // An infinite utilisation is drawn at the top, and a small one at the foot of a logarithmic scale.
  const drawn = ({ x, y }: Point): Point => ({
    x,
    y: Math.min(top, logarithmic ? Math.max(y, LEAST) : y),
  });
  return {
    scale: logarithmic
      ? { type: 'logarithmic', min: LEAST, max: top }
      : { min: 0, suggestedMax: 1.1, grace: '8%' },
    ticks: logarithmic ? { use: roundTicks(LEAST, top) } : {},
    sets: [
      line(
        [
          { x: min, y: 1 },
          { x: max, y: 1 },
        ],
        {
          label: 'limit',
          yAxisID: 'use',
          borderColor: COLOUR.limit,
          borderDash: DASH.dashed,
          borderWidth: 2,
        },
      ),
      ...checks.map(({ name, look, points }) =>
        line(points.map(drawn), {
          label: name,
          yAxisID: 'use',
          ...look,
          pointRadius: shapes || points.length === 1 ? 4.5 : 0,
        }),
      ),
    ],
    labels: [
      label('limit', 'use', { x: max, y: 1 }, COLOUR.limit),
      ...checks.map(({ name, look, points }) => {
        const largest = Math.max(...points.map(({ y }) => y));
        const last = drawn(points[points.length - 1]);
        return label(`${name}, up to ${shortNumber(largest)}`, 'use', last, look.borderColor);
      }),
    ],
  };
}

function usePoint(connection: Connection, name: CheckName, job: Job): Point[] {
  const check = connection.checks.find((one) => one.check === name);
  if (check === undefined || (check.status !== 'pass' && check.status !== 'fail')) return [];
  return [{ x: place(connection, job), y: check.utilisation ?? 0 }];
}

/** One look a check, in the order of `CHECKS`: shape and dash tell them apart without the colour. */
const LOOKS = [
  { borderColor: '#6a3d5c', borderDash: DASH.solid, pointStyle: 'triangle' },
  { borderColor: '#6a3d5c', borderDash: DASH.dotted, pointStyle: 'rectRot' },
  { borderColor: COLOUR.demand, borderDash: DASH.solid, pointStyle: 'circle' },
  { borderColor: COLOUR.demand, borderDash: DASH.dashed, pointStyle: 'rect' },
  { borderColor: COLOUR.demand, borderDash: DASH.dotted, pointStyle: 'cross' },
  { borderColor: COLOUR.second, borderDash: DASH.solid, pointStyle: 'star' },
  { borderColor: COLOUR.second, borderDash: DASH.dashed, pointStyle: 'crossRot' },
  { borderColor: COLOUR.ink, borderDash: DASH.chain, pointStyle: 'rectRounded' },
] as const satisfies readonly { borderColor: string; borderDash: number[]; pointStyle: string }[];

/** At the right edge, tied to the last point that it names. */
function label(text: string, yAxis: string, { y }: Point, colour: string): DirectLabel {
  return { text, xAxis: 'x', yAxis, x: 'right', y, shift: [18, 0], colour, group: yAxis };
}
