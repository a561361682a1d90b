import type { Job, RunResult, Zone } from '../../model.ts';
import { amount, connectionName, stamp } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Chart, Point } from './chart.ts';
import { decimate } from './decimate.ts';
import type { DirectLabel } from './direct-labels.ts';
import { axis, baseOptions, COLOUR, DASH, type LineSet, line, spacer } from './theme.ts';
import { timeTicks } from './time-ticks.ts';

/** Pixel columns of the drawing area: each gets at most a smallest and a largest value. */
const COLUMNS = 960;

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
          span: axis(panels[2].title, { ...STACKED, grace: '22%' }),
          lowerGap: spacer(0.4),
          shear: axis(panels[1].title, { ...STACKED, grace: '22%' }),
          upperGap: spacer(0.4),
          temperature: axis(panels[0].title, STACKED),
        },
      },
    },
  };
}

const STACKED = { position: 'left', stack: 'panels', stackWeight: 4 } as const;

interface Panel {
  readonly title: string;
  readonly sets: LineSet[];
  readonly labels: DirectLabel[];
}

function temperaturePanel({ run }: RunResult, job: Job): Panel {
  const member = temperatureSet(run.zone, job, { borderColor: COLOUR.demand });
  const structure =
    run.structure === null
      ? []
      : [
          temperatureSet(run.structure.zone, job, {
            borderColor: COLOUR.ink,
            borderWidth: 2,
            borderDash: DASH.dashed,
          }),
        ];
  const sets = [member, ...structure];
  const names = [`member: ${run.zone.name}`, `structure: ${run.structure?.zone.name}`];
  return {
    title: `Temperature [${unitOf('temperature', job.units)}]`,
    sets,
    labels: sets.map((set, i) => ({
      text: names[i],
      xAxis: 'x',
      yAxis: 'temperature',
      x: 'right',
      y: set.data[set.data.length - 1].y,
      shift: [14, 0],
      colour: set.borderColor as string,
      group: 'zones',
    })),
  };
}

function temperatureSet(zone: Zone, job: Job, look: Partial<LineSet>): LineSet {
  const values = zone.temperature.map((t) => inUnits(t, 'temperature', job.units));
  return line(decimate(job.axis.times, values, COLUMNS), {
    label: zone.name,
    yAxisID: 'temperature',
    borderWidth: 1,
    ...look,
  });
}

function shearPanel({ trace }: RunResult, job: Job): Panel {
  return forcePanel(trace().shear, job, { name: 'Shear', axis: 'shear', colour: COLOUR.demand });
}

function spanPanel({ trace }: RunResult, job: Job): Panel {
  const panel = { name: 'Span force', axis: 'span', colour: COLOUR.second };
  const { sets, labels, title } = forcePanel(trace().spanForce, job, panel);
  const tension: DirectLabel = {
    text: 'tension +',
    xAxis: 'x',
    yAxis: 'span',
    x: 'right',
    y: 0,
    shift: [14, -9],
    colour: panel.colour,
  };
  return {
    title,
    sets,
    labels: [...labels, tension, { ...tension, text: 'compression −', shift: [14, 9] }],
  };
}

function forcePanel(
  forces: Float64Array,
  job: Job,
  panel: { readonly name: string; readonly axis: string; readonly colour: string },
): Panel {
  const force = unitOf('force', job.units);
  const values = forces.map((force) => inUnits(force, 'force', job.units));
  const points = decimate(job.axis.times, values, COLUMNS);
  const most = points.reduce((a, b) => (b.y > a.y ? b : a));
  const least = points.reduce((a, b) => (b.y < a.y ? b : a));
  const label = ({ x, y }: Point, down: number): DirectLabel => ({
    text: `${shortNumber(y)} ${force}, ${stamp(x)}`,
    xAxis: 'x',
    yAxis: panel.axis,
    x,
    y,
    side: sideOf(x, job),
    shift: [0, down],
  });
  return {
    title: `${panel.name} [${force}]`,
    sets: [
      line(
        [
          { x: points[0].x, y: 0 },
          { x: points[points.length - 1].x, y: 0 },
        ],
        { label: 'zero', yAxisID: panel.axis, borderWidth: 1, borderColor: COLOUR.faint },
      ),
      line(points, {
        label: panel.name,
        yAxisID: panel.axis,
        borderWidth: 1,
        borderColor: panel.colour,
      }),
      line([most, least], {
        label: `${panel.name}, largest and smallest`,
        yAxisID: panel.axis,
        showLine: false,
        pointRadius: 4,
        pointStyle: 'circle',
        pointBackgroundColor: COLOUR.paper,
        pointBorderColor: COLOUR.ink,
        pointBorderWidth: 1.5,
      }),
    ],
    labels: [label(most, -13), label(least, 13)],
  };
}

/** Near an end of the record a label lies inside it. */
function sideOf(time: number, { axis: { times } }: Job): 'left' | 'right' | 'middle' {
  const share = (time - times[0]) / (times[times.length - 1] - times[0]);
  return share < 0.12 ? 'right' : share > 0.88 ? 'left' : 'middle';
}
