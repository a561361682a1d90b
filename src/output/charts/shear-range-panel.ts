import type { Connection, Job, Role } from '../../model.ts';
import { inUnits } from '../quantity.ts';
import { type AlongPanel, edgeLabel, MOST_SHAPES, place } from './along.ts';
import type { Point } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { COLOUR, DASH, type LineSet, line } from './theme.ts';

/** Shear range at each fastener of a run, and its limit. */
export function shearRangePanel(connections: readonly Connection[], job: Job): AlongPanel {
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
      edgeLabel('shear range', 'range', last, COLOUR.demand),
      limit.data.length === 0
        ? NO_LIMIT
        : edgeLabel('limit', 'range', limit.data[limit.data.length - 1], COLOUR.limit),
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
