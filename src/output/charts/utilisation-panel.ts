import { CHECKS, type CheckName, type Connection, type Job } from '../../model.ts';
import { shortNumber } from '../number-text.ts';
import { edgeLabel, MOST_SHAPES, place, reach } from './along.ts';
import type { Point } from './chart.ts';
import { CHECK_LOOKS } from './check-looks.ts';
import { roundTicks } from './log-ticks.ts';
import { COLOUR, DASH, line } from './theme.ts';

/** Over this a linear scale would press the other checks flat. */
const MOST_LINEAR = 4;

/** Least utilisation of a logarithmic scale; smaller ones are drawn at it. */
const LEAST = 0.01;

/** Utilisation of each check along a run; `scale` and `ticks` suit the largest. */
export function utilisationPanel(connections: readonly Connection[], job: Job) {
  const checks = CHECKS.flatMap((name) => {
    const points = connections.flatMap((connection) => usePoint(connection, name, job));
    return points.length === 0 ? [] : [{ name, look: CHECK_LOOKS[name], points }];
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
      edgeLabel('limit', 'use', { x: max, y: 1 }, COLOUR.limit),
      ...checks.map(({ name, look, points }) => {
        const largest = Math.max(...points.map(({ y }) => y));
        const last = drawn(points[points.length - 1]);
        return edgeLabel(`${name}, up to ${shortNumber(largest)}`, 'use', last, look.borderColor);
      }),
    ],
  };
}

function usePoint(connection: Connection, name: CheckName, job: Job): Point[] {
  const check = connection.checks.find((one) => one.check === name);
  if (check === undefined || (check.status !== 'pass' && check.status !== 'fail')) return [];
  return [{ x: place(connection, job), y: check.utilisation ?? 0 }];
}
