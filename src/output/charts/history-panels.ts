import type { Job, RunResult, Zone } from '../../model.ts';
import { stamp } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Point } from './chart.ts';
import { decimate } from './decimate.ts';
import type { DirectLabel } from './direct-labels.ts';
import { axis, COLOUR, DASH, type LineSet, line, TICKS } from './theme.ts';

/** Pixel columns of the drawing area: each gets at most a smallest and a largest value. */
const COLUMNS = 960;

const STACKED = { position: 'left', stack: 'panels', stackWeight: 4 } as const;

/** One panel of the history: its scale, and what is drawn on it. */
export interface HistoryPanel {
  readonly scale: ReturnType<typeof axis>;
  readonly sets: LineSet[];
  readonly labels: DirectLabel[];
}

/** Temperatures of the run's member and of the structure behind it. */
export function temperaturePanel({ run }: RunResult, job: Job): HistoryPanel {
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
    scale: axis(`Temperature [${unitOf('temperature', job.units)}]`, STACKED),
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

/** Shear of one fastener of the governing connection. */
export function shearPanel({ trace }: RunResult, job: Job): HistoryPanel {
  return forcePanel(trace().shear, job, { name: 'Shear', axis: 'shear', colour: COLOUR.demand });
}

/** Force of the worse span beside the governing connection. */
export function spanPanel({ trace }: RunResult, job: Job): HistoryPanel {
  const panel = { name: 'Span force', axis: 'span', colour: COLOUR.second };
  const { sets, labels, scale } = forcePanel(trace().spanForce, job, panel);
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
    scale,
    sets,
    labels: [...labels, tension, { ...tension, text: 'compression −', shift: [14, 9] }],
  };
}

function forcePanel(
  forces: Float64Array,
  job: Job,
  panel: { readonly name: string; readonly axis: string; readonly colour: string },
): HistoryPanel {
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
    scale: axis(`${panel.name} [${force}]`, { ...STACKED, ...roomAround(least.y, most.y) }),
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

/** A scale from the smallest to the largest value and zero, with room for a label at either end. */
function roomAround(least: number, most: number) {
  const [low, high] = [Math.min(0, least), Math.max(0, most)];
  const room = 0.25 * (high - low || 1);
  return { min: low - room, max: high + room, ticks: { ...TICKS, includeBounds: false } };
}

/** Near an end of the record a label lies inside it. */
function sideOf(time: number, { axis: { times } }: Job): 'left' | 'right' | 'middle' {
  const share = (time - times[0]) / (times[times.length - 1] - times[0]);
  return share < 0.12 ? 'right' : share > 0.88 ? 'left' : 'middle';
}
