import type { Chart as DrawnChart, Plugin, Scale } from 'chart.js';
import type { Role } from '../../model.ts';
import { COLOUR } from './theme.ts';

/** One piece of member from end to end, and the fasteners along it. */
export interface DrawnPiece {
  readonly from: number;
  readonly to: number;
  readonly fasteners: readonly { readonly x: number; readonly role: Role }[];
}

/** One run drawn along the x axis, in the middle of a panel of its own. */
export interface DrawnRun {
  readonly yAxis: string;
  readonly pieces: readonly DrawnPiece[];
}

/** Half the depth of a member [px]. */
const HALF_DEPTH = 11;
/** Pieces of member are drawn at least this far apart [px]; a gap to scale would not be seen. */
const LEAST_GAP = 10;
/** Fasteners nearer than this are drawn as bands of one role [px]. */
const DENSE = 7;

/** Draws the runs of a configuration: member, filled bolts where fixed, open slots where slotted. */
export const drawingMarks: Plugin = {
  id: 'drawingMarks',
  afterDatasetsDraw(chart) {
    const runs = chart.config.options?.plugins?.drawingMarks?.runs ?? [];
    for (const run of runs as readonly DrawnRun[]) drawRun(chart, run);
  },
};

function drawRun({ ctx, scales }: DrawnChart, { yAxis, pieces }: DrawnRun): void {
  const panel = scales[yAxis];
  const y = (panel.top + panel.bottom) / 2;
  drawMembers(ctx, scales.x, y, pieces);
  const marks = pieces.map(({ fasteners }) =>
    fasteners.map(({ x, role }) => ({ x: scales.x.getPixelForValue(x), role })),
  );
  const spacing = closest(marks.flat());
  if (spacing < DENSE) {
    for (const band of marks.flatMap(bandsOf)) drawBand(ctx, y, band, spacing);
  } else {
    const size = Math.min(7, spacing * 0.26);
    for (const mark of marks.flat()) drawFastener(ctx, mark, y, size);
  }
}

/** The least distance between neighbours [px]. */
function closest(marks: readonly Mark[]): number {
  return marks
    .slice(1)
    .reduce((least, { x }, i) => Math.min(least, x - marks[i].x), Number.POSITIVE_INFINITY);
}

function drawMembers(
  ctx: DrawnChart['ctx'],
  scale: Scale,
  y: number,
  pieces: readonly DrawnPiece[],
): void {
  ctx.fillStyle = COLOUR.grid;
  ctx.strokeStyle = COLOUR.faint;
  ctx.lineWidth = 1;
  const ends = pieces.map(({ from, to }) => [
    scale.getPixelForValue(from),
    scale.getPixelForValue(to),
  ]);
  ends.forEach(([left, right], i) => {
    const before = ends[i - 1]?.[1] ?? Number.NEGATIVE_INFINITY;
    const after = ends[i + 1]?.[0] ?? Number.POSITIVE_INFINITY;
    const from = Math.max(left, (left + before + LEAST_GAP) / 2);
    const to = Math.min(right, (right + after - LEAST_GAP) / 2);
    ctx.fillRect(from, y - HALF_DEPTH, to - from, 2 * HALF_DEPTH);
    ctx.strokeRect(from, y - HALF_DEPTH, to - from, 2 * HALF_DEPTH);
  });
}

interface Mark {
  readonly x: number;
  readonly role: Role;
}

function drawFastener(ctx: DrawnChart['ctx'], { x, role }: Mark, y: number, size: number): void {
  ctx.lineWidth = 1.5;
  ctx.strokeStyle = COLOUR.ink;
  ctx.fillStyle = role === 'fixed' ? COLOUR.ink : COLOUR.paper;
  ctx.beginPath();
  if (role === 'fixed') ctx.arc(x, y, size * 0.8, 0, 2 * Math.PI);
  else ctx.roundRect(x - 1.4 * size, y - 0.7 * size, 2.8 * size, 1.4 * size, 0.7 * size);
  ctx.fill();
  ctx.stroke();
}

interface Band {
  from: number;
  to: number;
  readonly role: Role;
}

function bandsOf(marks: readonly Mark[]): Band[] {
  const bands: Band[] = [];
  for (const { x, role } of marks) {
    const last = bands.at(-1);
    if (last !== undefined && last.role === role) last.to = x;
    else bands.push({ from: x, to: x, role });
  }
  return bands;
}

function drawBand(
  ctx: DrawnChart['ctx'],
  y: number,
  { from, to, role }: Band,
  spacing: number,
): void {
  const half = HALF_DEPTH - 5;
  const [left, width] = [from - spacing * 0.4, Math.max(3, to - from + spacing * 0.8)];
  ctx.lineWidth = 1;
  ctx.strokeStyle = COLOUR.ink;
  ctx.fillStyle = role === 'fixed' ? COLOUR.ink : COLOUR.paper;
  ctx.beginPath();
  ctx.roundRect(left, y - half, width, 2 * half, role === 'fixed' ? 0 : half);
  ctx.fill();
  ctx.stroke();
}
