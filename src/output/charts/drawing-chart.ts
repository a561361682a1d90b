import type { Connection, Job, Remedy, Run, RunResult } from '../../model.ts';
import { connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import { changedFasteners } from '../remedies/changed-fasteners.ts';
import { drawnLength, schemeWords } from '../remedies/remedy-words.ts';
import { edgeLabel, MOST_SHAPES } from './along.ts';
import type { Chart, Point } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { gapLabels, roleLabels } from './drawing-labels.ts';
import type { DrawnPiece, DrawnRun } from './drawing-marks.ts';
import { roundTicks } from './log-ticks.ts';
import { axis, baseOptions, COLOUR, DASH, line, spacer, TICKS } from './theme.ts';

/** Over this a linear scale would press the passing utilisations flat. */
const MOST_LINEAR = 4;
/** Least utilisation of a logarithmic scale; smaller ones are drawn at it. */
const LEAST = 0.05;
/** Room for the labels at the right [px], and about how wide the drawing then is. */
const RIGHT = 190;
const DRAWN_WIDTH = 910;

/** A run as it stands in the job and as its remedy would have it, to scale, each with the utilisation of its connections. */
export function drawingChart(result: RunResult, remedy: Remedy, job: Job): Chart {
  const before = viewOf('before', [result], job);
  const after = viewOf('after', remedy.pieces, job);
  const most = Math.max(1, ...[...before.uses, ...after.uses].filter(Number.isFinite));
  const scale = utilisationScale(most);
  const { min, max } = reach([...before.drawn.pieces, ...after.drawn.pieces]);
  const pixels = DRAWN_WIDTH / (max - min);
  const base = baseOptions(title(result, remedy, job), '', { right: RIGHT });
  const limit = (use: string) =>
    line(
      [min, max].map((x) => ({ x, y: 1 })),
      {
        yAxisID: use,
        borderColor: COLOUR.limit,
        borderDash: DASH.dashed,
      },
    );
  return {
    name: `${result.run.id}-drawing`,
    configuration: {
      type: 'line',
      data: {
        datasets: [before, after].flatMap((view) => [
          limit(view.use),
          ...view.lines.map((points) => useLine(points.map(scale.drawn), view.use)),
        ]),
      },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          subtitle: { ...base.plugins?.subtitle, text: subtitle(result, remedy, job) },
          drawingMarks: { runs: [before.drawn, after.drawn] },
          fixedTicks: { axes: { [before.use]: scale.ticks, [after.use]: scale.ticks } },
          directLabels: {
            labels: [before, after].flatMap((view) => [
              ...roleLabels(view.drawn.pieces, view.strip, pixels),
              ...gapLabels(view.drawn.pieces, gapText(remedy, job), view.strip),
              heading(view),
              ...governingLabels(view, scale.drawn, max),
            ]),
          },
        },
        scales: {
          x: axis(`Position along the run [${unitOf('length', job.units)}], to scale`, {
            min,
            max,
            ticks: { ...TICKS, includeBounds: false },
          }),
          ...panels(after, scale.options),
          between: spacer(0.5),
          ...panels(before, scale.options),
        },
      },
    },
  };
}

/** One of the two drawings: the run, and the utilisation under it. */
interface View {
  readonly name: 'before' | 'after';
  /** Axes of the drawing and of the utilisation. */
  readonly strip: string;
  readonly use: string;
  readonly drawn: DrawnRun;
  /** Utilisation of each connection, a line a piece. */
  readonly lines: readonly Point[][];
  readonly uses: readonly number[];
  readonly governing: Connection;
}

type Assessed = Pick<RunResult, 'run' | 'connections' | 'governing'>;

function viewOf(name: View['name'], pieces: readonly Assessed[], { units }: Job): View {
  const length = (value: number) => inUnits(value, 'length', units);
  const strip = `${name}Drawing`;
  const lines = pieces.map(({ connections }) =>
    connections.flatMap(({ position, governing }) =>
      governing === null ? [] : [{ x: length(position), y: governing.utilisation ?? 0 }],
    ),
  );
  const worst = pieces.map(({ connections, governing }) => connections[governing]);
  const use = ({ governing }: Connection) => governing?.utilisation ?? 0;
  return {
    name,
    strip,
    use: `${name}Use`,
    drawn: { yAxis: strip, pieces: pieces.map(({ run }) => pieceOf(run, length)) },
    lines,
    uses: lines.flat().map(({ y }) => y),
    governing: worst.reduce((most, one) => (use(one) > use(most) ? one : most)),
  };
}

function pieceOf(run: Run, length: (value: number) => number): DrawnPiece {
  const { positions, overhangs, roles } = run;
  return {
    from: length(positions[0] - overhangs.left),
    to: length(positions[positions.length - 1] + overhangs.right),
    fasteners: roles.map((role, i) => ({ x: length(positions[i]), role })),
  };
}

function reach(pieces: readonly DrawnPiece[]): { readonly min: number; readonly max: number } {
  const from = Math.min(...pieces.map((piece) => piece.from));
  const to = Math.max(...pieces.map((piece) => piece.to));
  const room = to > from ? (to - from) * 0.015 : 1;
  return { min: from - room, max: to + room };
}

/** One scale for both drawings, so that they can be compared. */
function utilisationScale(most: number) {
  const top = most * 1.2;
  const logarithmic = most > MOST_LINEAR;
  const least = logarithmic ? LEAST : 0;
  return {
    options: { type: logarithmic ? 'logarithmic' : 'linear', min: least, max: top },
    ticks: logarithmic ? roundTicks(LEAST, top) : linearTicks(top),
    drawn: ({ x, y }: Point): Point => ({ x, y: Math.min(top, Math.max(least, y)) }),
  };
}

function linearTicks(top: number) {
  const step = top > 2.5 ? 1 : 0.5;
  return Array.from({ length: Math.floor(top / step) + 1 }, (_, i) => ({
    value: i * step,
    label: shortNumber(i * step),
  }));
}

/** Passing points are open, failing ones filled diamonds; a dense run is a line alone. */
function useLine(points: Point[], yAxisID: string) {
  // a bolt at the end of its slot fails at a utilisation of 1
  const fails = points.map(({ y }) => y >= 1);
  return line(points, {
    yAxisID,
    pointRadius: points.length > MOST_SHAPES ? 0 : points.length > 40 ? 3.5 : 4.5,
    pointStyle: fails.map((one) => (one ? 'rectRot' : 'circle')),
    pointBackgroundColor: fails.map((one) => (one ? COLOUR.limit : COLOUR.paper)),
    pointBorderColor: fails.map((one) => (one ? COLOUR.limit : COLOUR.demand)),
  });
}

function panels({ strip, use }: View, scale: object) {
  return {
    [use]: axis('Utilisation', { position: 'left', stack: 'panels', stackWeight: 2, ...scale }),
    [strip]: { ...spacer(1.3), min: 0, max: 1 },
  };
}

function heading({ name, strip }: View): DirectLabel {
  const text = name === 'before' ? 'as in the job' : 'with the remedy';
  return { text, xAxis: 'x', yAxis: strip, x: 'right', y: 0.5, shift: [18, 0], bold: true };
}

/** What governs, tied to the height of its point, and under it where. */
function governingLabels(view: View, drawn: (point: Point) => Point, x: number): DirectLabel[] {
  const { governing } = view.governing;
  const y = governing?.utilisation ?? 0;
  const text = governing === null ? 'nothing to check' : `${governing.check} ${shortNumber(y)}`;
  const colour = governing?.status === 'fail' ? COLOUR.limit : COLOUR.demand;
  const label = edgeLabel(text, view.use, drawn({ x, y }), colour);
  if (governing === null) return [label];
  const { group: _, ...untied } = label;
  return [label, { ...untied, text: `at ${connectionName(view.governing)}`, shift: [18, 18] }];
}

function title({ run }: RunResult, remedy: Remedy, job: Job): string {
  const { joints, gap, added, slots, endGap } = remedy;
  const count = remedy.pieces.reduce((sum, piece) => sum + piece.run.roles.length, 0);
  const parts = [
    ...(gap === null || joints === 0
      ? []
      : [`${joints === 1 ? 'a joint' : `${joints} joints`} of ${drawnLength(gap, job.units)}`]),
    ...(added === 0 ? [] : [`${added} fasteners more`]),
    ...(slots === 0 ? [] : [`${slots} of ${count} slotted`]),
    ...(endGap === undefined ? [] : [`end gap ${drawnLength(endGap, job.units)}`]),
  ];
  const uses = `${shortNumber(remedy.utilisationBefore)} → ${shortNumber(remedy.utilisation)}`;
  return `${run.id}: ${parts.join(', ')}; utilisation ${uses}`;
}

function gapText({ gap }: Remedy, job: Job): string {
  return gap === null ? '' : `gap ${drawnLength(gap, job.units)}`;
}

/** Characters that fit under the title in one line. */
const LINE = 150;

/** The scheme in words, in two lines at most. */
function subtitle(result: RunResult, remedy: Remedy, job: Job): string[] {
  const { slotted, fixed } = changedFasteners(result.run, remedy);
  const words = schemeWords(result, remedy, job.units);
  const scheme = `${words[0].toUpperCase()}${words.slice(1)}.`;
  const marks = 'Filled is fixed, open is slotted; slots and gaps are drawn larger than they are.';
  const long = scheme.length > LINE;
  const short = `${slotted.length} fasteners newly slotted, ${fixed.length} newly fixed; remedies.csv names them.`;
  return [long ? short : scheme, marks];
}
