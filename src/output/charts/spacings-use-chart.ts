import { CHECKS } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { unlikeRows } from '../../verdict/spacing-answer.ts';
import type { SpacingRow } from '../../verdict/spacing-row.ts';
import type { SpacingCase } from '../../verdict/spacings.ts';
import { shortNumber } from '../number-text.ts';
import { caseText, lengthText, useText } from '../spacings-words.ts';
import { edgeLabel } from './along.ts';
import type { Chart, Point } from './chart.ts';
import { CHECK_LOOKS } from './check-looks.ts';
import type { DirectLabel } from './direct-labels.ts';
import { roundTicks } from './log-ticks.ts';
import { caseName, countTicks, spacingOf, spacingReach, spacingScales } from './spacings-axis.ts';
import { axis, baseOptions, COLOUR, DASH, type LineSet, line, TICKS } from './theme.ts';

/** Over this a linear scale would press the other checks flat. */
const MOST_LINEAR = 4;

/** Least utilisation of a logarithmic scale; smaller ones are drawn at it. */
const LEAST = 0.01;

/** The utilisation of each check over the spacing, with the spacings that pass marked; at least one was checked. */
export function spacingsUseChart(of: SpacingCase, units: UnitSystem): Chart {
  const rows = unlikeRows(of.rows);
  const lines = linesOf(rows, units);
  const scale = scaleOf(lines.flatMap(({ points }) => points));
  const reach = spacingReach(rows, units);
  const base = baseOptions(title(of, units), subtitle(of, units), { right: 285 });
  const limit = [reach.min, reach.max].map((x) => ({ x, y: 1 }));
  return {
    name: `${caseName(of, units)}-utilisation`,
    configuration: {
      type: 'line',
      data: {
        datasets: [
          line(limit, {
            label: 'limit',
            yAxisID: 'use',
            borderColor: COLOUR.limit,
            borderDash: DASH.dashed,
            borderWidth: 2,
          }),
          ...lines.map(({ name, points }) =>
            line(points.map(scale.drawn), {
              label: name,
              yAxisID: 'use',
              ...CHECK_LOOKS[name],
              backgroundColor: CHECK_LOOKS[name].borderColor,
              pointRadius: 4.5,
            }),
          ),
          ...passingBands(rows, scale.top, units),
        ],
      },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: {
            axes: {
              count: countTicks(rows, units),
              ...(scale.logarithmic ? { use: roundTicks(LEAST, scale.top) } : {}),
            },
          },
          directLabels: {
            labels: [
              edgeLabel('limit', 'use', limit[1], COLOUR.limit),
              ...lines.map(({ name, points }) => nameOf(name, points.map(scale.drawn), points)),
              ...passingLabel(of, (reach.min + reach.max) / 2, units),
            ],
          },
        },
        scales: {
          ...spacingScales(rows, units),
          use: axis(
            `Largest utilisation in the run${scale.logarithmic ? ', logarithmic' : ''}`,
            scale.logarithmic
              ? { type: 'logarithmic', min: LEAST, max: scale.top }
              : { min: 0, max: scale.top, ticks: { ...TICKS, includeBounds: false } },
          ),
        },
      },
    },
  };
}

function title(of: SpacingCase, units: UnitSystem): string {
  const { widest, stop, nearest } = of.answer;
  const name = caseText(of, units);
  const check = (stop ?? nearest)?.governing?.check;
  if (nearest !== null && check !== undefined) {
    const at = lengthText(nearest.spacing, units);
    return `${name}: no spacing tried passes; ${check.check} is ${useText(check.utilisation ?? 0)} at ${at}`;
  }
  if (widest === null) return `${name}: nothing was checked`;
  const passes = `${name}: ${lengthText(widest.spacing, units)} is the widest that passes`;
  if (stop === null || check === undefined) return `${passes}, and the widest tried`;
  return `${passes}; ${check.check} stops it at ${lengthText(stop.spacing, units)}`;
}

function subtitle({ run, rows }: SpacingCase, units: UnitSystem): string {
  const length = run.positions[run.positions.length - 1] - run.positions[0];
  const passing = rows.some(({ passes }) => passes === true) ? ' Shaded: every check passes.' : '';
  return `${lengthText(length, units)} from the first fastener to the last. Each point is a spacing that was screened.${passing}`;
}

interface CheckLine {
  readonly name: (typeof CHECKS)[number];
  readonly points: readonly Point[];
}

function linesOf(rows: readonly SpacingRow[], units: UnitSystem): CheckLine[] {
  return CHECKS.flatMap((name) => {
    const points = rows.flatMap((row) => {
      const use = row.worst.find(({ check }) => check.check === name)?.check.utilisation ?? null;
      return use === null ? [] : [{ x: spacingOf(row, units), y: use }];
    });
    return points.length === 0 ? [] : [{ name, points }];
  });
}

/** The scale that suits the points: an infinite utilisation is drawn at its top, a small one at its foot. */
function scaleOf(points: readonly Point[]) {
  const most = Math.max(1, ...points.map(({ y }) => y).filter(Number.isFinite));
  const logarithmic = most > MOST_LINEAR;
  const top = most * (logarithmic ? 1.4 : 1.15);
  const drawn = ({ x, y }: Point): Point => ({
    x,
    y: Math.min(top, logarithmic ? Math.max(y, LEAST) : y),
  });
  return { logarithmic, top, drawn };
}

function nameOf(
  name: CheckLine['name'],
  drawn: readonly Point[],
  points: readonly Point[],
): DirectLabel {
  const uses = points.map(({ y }) => y);
  const [least, most] = [Math.min(...uses), Math.max(...uses)].map(shortNumber);
  const range = least === most ? least : `${least} to ${most}`;
  const colour = CHECK_LOOKS[name].borderColor;
  return edgeLabel(`${name}, ${range}`, 'use', drawn[drawn.length - 1], colour);
}

const SHADE = `${COLOUR.demand}26`;

/** A band over each stretch of neighbouring spacings that pass. */
function passingBands(rows: readonly SpacingRow[], top: number, units: UnitSystem): LineSet[] {
  const { min, max } = spacingReach(rows, units);
  const edge = (max - min) * 0.008;
  return stretches(rows).map(([first, last]) =>
    line(
      [
        { x: spacingOf(first, units) - edge, y: top },
        { x: spacingOf(last, units) + edge, y: top },
      ],
      {
        label: 'passes',
        yAxisID: 'use',
        borderWidth: 0,
        backgroundColor: SHADE,
        fill: 'start',
        order: 1,
      },
    ),
  );
}

/** The first and last row of each stretch of neighbours that pass. */
function stretches(rows: readonly SpacingRow[]): [SpacingRow, SpacingRow][] {
  const found: [SpacingRow, SpacingRow][] = [];
  for (const [i, row] of rows.entries()) {
    if (row.passes !== true) continue;
    if (i > 0 && rows[i - 1].passes === true) found[found.length - 1][1] = row;
    else found.push([row, row]);
  }
  return found;
}

/** Beside the widest that passes, on the side where there is more room. */
function passingLabel(
  { answer: { widest } }: SpacingCase,
  middle: number,
  units: UnitSystem,
): DirectLabel[] {
  if (widest === null) return [];
  const x = spacingOf(widest, units);
  const side = x > middle ? 'left' : 'right';
  return [
    {
      text: `widest that passes: ${lengthText(widest.spacing, units)}`,
      xAxis: 'x',
      yAxis: 'use',
      x,
      y: 'top',
      side,
      shift: [side === 'left' ? -14 : 14, 16],
      colour: COLOUR.demand,
      bold: true,
    },
  ];
}
