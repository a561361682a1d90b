import type { Connection, Job } from '../../model.ts';
import { inUnits } from '../quantity.ts';
import type { Point } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { type LineSet, TICKS } from './theme.ts';

/** With more fasteners than these, point shapes would run together. */
export const MOST_SHAPES = 80;

/** What one panel along a run draws. */
export interface AlongPanel {
  readonly sets: LineSet[];
  readonly labels: DirectLabel[];
}

/** A connection's place along its run, in the units of the job. */
export function place({ position }: Connection, job: Job): number {
  return inUnits(position, 'length', job.units);
}

/** The x scale: from end to end with a little room. */
export function reach(connections: readonly Connection[], job: Job) {
  const first = place(connections[0], job);
  const last = place(connections[connections.length - 1], job);
  const room = last > first ? (last - first) * 0.02 : Math.max(1, Math.abs(first) * 0.1);
  return { min: first - room, max: last + room, ticks: { ...TICKS, includeBounds: false } };
}

/** At the right edge, tied to the last point that it names. */
export function edgeLabel(text: string, yAxis: string, { y }: Point, colour: string): DirectLabel {
  return { text, xAxis: 'x', yAxis, x: 'right', y, shift: [18, 0], colour, group: yAxis };
}
