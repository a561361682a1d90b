import type { Chart as DrawnChart, Plugin, Scale } from 'chart.js';
import { COLOUR, FONT } from './theme.ts';

/** A text beside what it names, placed by data values or at the edge of a panel. */
export interface DirectLabel {
  readonly text: string;
  readonly xAxis: string;
  readonly yAxis: string;
  readonly x: number | 'left' | 'right';
  readonly y: number | 'top' | 'bottom';
  /** Where the text lies from its place; default `right`. */
  readonly side?: 'left' | 'right' | 'middle';
  /** Moved by so many pixels, right and down. */
  readonly shift?: readonly [number, number];
  readonly colour?: string;
  readonly bold?: boolean;
  /** Labels of one group are moved apart, each tied to its place by a thin line. */
  readonly group?: string;
}

interface PlacedLabel {
  readonly label: DirectLabel;
  readonly x: number;
  readonly anchor: number;
  y: number;
}

const LINE_HEIGHT = 18;

/** Draws the labels of a configuration over everything else. */
export const directLabels: Plugin = {
  id: 'directLabels',
  afterDraw(chart) {
    const options = chart.config.options?.plugins?.directLabels;
    const labels = (options?.labels ?? []) as readonly DirectLabel[];
    const placed = labels.map((label) => place(chart, label));
    for (const group of new Set(labels.map((label) => label.group))) {
      if (group === undefined) continue;
      const together = placed.filter(({ label }) => label.group === group);
      moveApart(together, chart.scales[together[0].label.yAxis]);
      for (const one of together) drawTie(chart.ctx, one);
    }
    for (const one of placed) drawText(chart.ctx, one);
  },
};

function place(chart: DrawnChart, label: DirectLabel): PlacedLabel {
  const xScale = chart.scales[label.xAxis];
  const yScale = chart.scales[label.yAxis];
  const [right, down] = label.shift ?? [0, 0];
  const x = typeof label.x === 'number' ? xScale.getPixelForValue(label.x) : xScale[label.x];
  const y = typeof label.y === 'number' ? yScale.getPixelForValue(label.y) : yScale[label.y];
  return { label, x: x + right, anchor: y + down, y: y + down };
}

/** Down the panel each label is pushed below the one before, then back up from the panel's foot. */
function moveApart(labels: PlacedLabel[], panel: Scale): void {
  labels.sort((a, b) => a.y - b.y);
  let lowest = panel.top;
  for (const label of labels) {
    label.y = Math.max(label.y, lowest);
    lowest = label.y + LINE_HEIGHT;
  }
  let highest = panel.bottom;
  for (const label of labels.reverse()) {
    label.y = Math.min(label.y, highest);
    highest = label.y - LINE_HEIGHT;
  }
}

function drawTie(ctx: DrawnChart['ctx'], { label, x, anchor, y }: PlacedLabel): void {
  ctx.strokeStyle = label.colour ?? COLOUR.faint;
  ctx.lineWidth = 1;
  ctx.beginPath();
  ctx.moveTo(x - (label.shift?.[0] ?? 0) + 3, anchor);
  ctx.lineTo(x - 4, y);
  ctx.stroke();
}

/** On a white edge, so that the text stays readable over lines. */
function drawText(ctx: DrawnChart['ctx'], { label, x, y }: PlacedLabel): void {
  ctx.font = `${label.bold ? 600 : 400} 15px "${FONT}"`;
  ctx.textAlign = label.side === 'left' ? 'right' : label.side === 'middle' ? 'center' : 'left';
  ctx.textBaseline = 'middle';
  ctx.lineJoin = 'round';
  ctx.lineWidth = 4;
  ctx.strokeStyle = COLOUR.paper;
  ctx.strokeText(label.text, x, y);
  ctx.fillStyle = label.colour ?? COLOUR.ink;
  ctx.fillText(label.text, x, y);
}
