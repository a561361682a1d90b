import type { ChartConfiguration, ChartType } from 'chart.js';
import type { DirectLabel } from './direct-labels.ts';
import type { DrawnRun } from './drawing-marks.ts';
import type { FixedTicks } from './fixed-ticks.ts';

/** A chart as plain data, and the name of the picture that it becomes, without its ending. */
export interface Chart {
  readonly name: string;
  readonly configuration: ChartConfiguration<'line', Point[]>;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

declare module 'chart.js' {
  // The library's own name for its type parameter, which every declaration must repeat.
  interface PluginOptionsByType<TType extends ChartType> {
    directLabels?: { labels: readonly DirectLabel[] };
    drawingMarks?: { runs: readonly DrawnRun[] };
    fixedTicks?: { axes: Readonly<Record<string, FixedTicks>> };
  }
}
