import type { Curve, Job } from '../../model.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Point } from './chart.ts';
import { curveLine } from './curve-line.ts';
import type { CurvePart, PartBin } from './curve-part.ts';
import type { DirectLabel } from './direct-labels.ts';
import { COLOUR, type LineSet, line } from './theme.ts';

/** Curves are drawn to this many cycles at most. */
const MOST_CYCLES = 1e9;

/** What one part draws on the axes `cycles` and `share` and on its own range axis, named as the part. */
export interface CurvePanel {
  readonly part: CurvePart['part'];
  readonly title: string;
  /** Smallest and largest of the range axis. */
  readonly ranges: readonly [number, number];
  readonly sets: readonly LineSet[];
  readonly labels: readonly DirectLabel[];
}

/** Curve, counted ranges and shares of damage of one part, in the units of the job. */
export function curvePanel(part: CurvePart, job: Job): CurvePanel {
  const scaled = (range: number) => inUnits(range, part.measure, job.units);
  const [least, most] = rangesOf(part);
  const points = part.curve === null ? [] : curvePoints(part.curve, part.bins, [most, least]);
  const at = { xAxisID: 'cycles', yAxisID: part.part };
  const dot = ({ cycles, range }: PartBin): Point => ({ x: cycles, y: scaled(range) });
  return {
    part: part.part,
    title: `${part.measure === 'force' ? 'Shear' : 'Stress'} range [${unitOf(part.measure, job.units)}]`,
    ranges: [scaled(least), scaled(most)],
    sets: [
      line(
        points.map(({ x, y }) => ({ x, y: scaled(y) })),
        { ...at, label: 'curve', borderWidth: 2, borderColor: COLOUR.ink },
      ),
      dots(part.bins.filter(isHarmful).map(dot), {
        ...at,
        label: 'ranges that do damage',
        pointBackgroundColor: COLOUR.demand,
      }),
      dots(part.bins.filter((bin) => !isHarmful(bin)).map(dot), {
        ...at,
        label: 'ranges that do none',
        pointBackgroundColor: COLOUR.paper,
      }),
      ...part.bins.filter(isHarmful).map((bin) => shareBar(part, bin, scaled(bin.range))),
    ],
    labels: labelsOf(part),
  };
}

/** From under the smallest to over the largest of the counted ranges and the curve's last points, with room for its name. */
function rangesOf({ bins, curve }: CurvePart): [number, number] {
  const known = curve?.line.kind === 'points' ? [...curve.line.ranges].slice(-2) : [];
  const limit = curve === null ? [] : [curve.limitRange];
  const all = [...bins.map(({ range }) => range), ...known, ...limit].filter((range) => range > 0);
  if (all.length === 0) return [1, 10];
  const [least, most] = [Math.min(...all) / 1.6, Math.max(...all)];
  return [least, most * Math.max(3, (most / least) ** 0.3)];
}

function curvePoints(
  curve: Curve,
  bins: readonly PartBin[],
  ranges: readonly [number, number],
): Point[] {
  return curveLine(curve, ranges, bins.some(isHarmful), MOST_CYCLES).filter(
    ({ x }) => x <= MOST_CYCLES,
  );
}

function isHarmful({ share }: PartBin): boolean {
  return share > 0;
}

function dots(data: Point[], look: Partial<LineSet>): LineSet {
  return line(data, {
    showLine: false,
    pointRadius: 5,
    pointBorderColor: COLOUR.demand,
    pointBorderWidth: 1.5,
    ...look,
  });
}

function shareBar({ part }: CurvePart, { share }: PartBin, y: number): LineSet {
  const ends = [
    { x: 0, y },
    { x: 100 * share, y },
  ];
  return line(ends, { xAxisID: 'share', yAxisID: part, label: 'share of damage', borderWidth: 3 });
}

function labelsOf(part: CurvePart): DirectLabel[] {
  const { bins, curve } = part;
  const corner: DirectLabel = {
    text: `${part.part}: ${curve === null ? 'no curve was given' : `curve ${curve.id}`}`,
    xAxis: 'cycles',
    yAxis: part.part,
    x: 'right',
    y: 'top',
    side: 'left',
    shift: [-12, 16],
    bold: true,
  };
  const factor: DirectLabel = {
    ...corner,
    text: `ranges × ${shortNumber(part.factor)}`,
    shift: [-12, 36],
    bold: false,
    colour: COLOUR.faint,
  };
  const none: DirectLabel = {
    ...factor,
    text: 'no damage',
    xAxis: 'share',
    x: 'left',
    side: 'right',
    shift: [10, 16],
  };
  if (curve === null) return [corner];
  return bins.some(isHarmful) ? [corner, factor] : [corner, factor, none];
}
