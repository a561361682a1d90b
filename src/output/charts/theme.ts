import type { ChartDataset, ChartOptions } from 'chart.js';
import type { Point } from './chart.ts';

/** Size of every picture [px]. */
export const WIDTH = 1200;
export const HEIGHT = 675;

export const FONT = 'IBM Plex Sans';

/** Dark on white; no meaning hangs on the colour alone. */
export const COLOUR = {
  ink: '#22303a',
  faint: '#6b7780',
  grid: '#e3e7e9',
  paper: '#ffffff',
  demand: '#1d5c73',
  second: '#8a6d1f',
  third: '#6a3d5c',
  limit: '#a33a22',
} as const;

export const DASH: Record<'solid' | 'dashed' | 'dotted' | 'chain', number[]> = {
  solid: [],
  dashed: [9, 5],
  dotted: [2, 4],
  chain: [12, 4, 2, 4],
};

export type LineSet = ChartDataset<'line', Point[]>;

/** What all charts share: still, on white, a title with a finding and a line of facts under it. */
export function baseOptions(
  title: string,
  subtitle: string,
  padding: { readonly right: number },
): ChartOptions<'line'> {
  return {
    responsive: false,
    animation: false,
    parsing: false,
    normalized: true,
    font: { family: FONT, size: 15 },
    color: COLOUR.ink,
    layout: { padding: { left: 14, right: padding.right, top: 14, bottom: 12 } },
    plugins: {
      legend: { display: false },
      tooltip: { enabled: false },
      title: heading(title, 22, 600, { top: 0, bottom: 2 }, COLOUR.ink),
      subtitle: heading(subtitle, 15, 400, { top: 0, bottom: 16 }, COLOUR.faint),
    },
  };
}

export const TICKS = { color: COLOUR.ink, font: { family: FONT, size: 14 }, maxRotation: 0 };

/** A scale's look: a thin grid, plain numbers, and a title that names the quantity and its unit. */
export function axis(title: string, more: Record<string, unknown> = {}) {
  return {
    type: 'linear' as const,
    title: {
      display: title !== '',
      text: title,
      color: COLOUR.ink,
      font: { family: FONT, size: 15 },
    },
    grid: { color: COLOUR.grid, tickLength: 4 },
    border: { color: COLOUR.faint },
    ticks: TICKS,
    ...more,
  };
}

/** An empty stretch between two stacked panels. */
export function spacer(weight: number) {
  return {
    type: 'linear' as const,
    position: 'left' as const,
    stack: 'panels',
    stackWeight: weight,
    grid: { display: false },
    border: { display: false },
    ticks: { display: false },
  };
}

/** A line without point markers. */
export function line(data: Point[], look: Partial<LineSet>): LineSet {
  return {
    data,
    borderWidth: 1.5,
    borderColor: COLOUR.demand,
    backgroundColor: COLOUR.demand,
    pointRadius: 0,
    // Point shapes on an axis stay whole; lines may not run out of their panel.
    clip: look.showLine === false || look.pointRadius ? 10 : 0,
    ...look,
  };
}

function heading(
  text: string,
  size: number,
  weight: number,
  padding: { top: number; bottom: number },
  color: string,
) {
  return {
    display: true,
    text,
    align: 'start' as const,
    color,
    font: { family: FONT, size, weight },
    padding,
  };
}
