import { createRequire as requireFrom } from 'node:module';
import { type Canvas, GlobalFonts } from 'canvas';
import type { Chart as DrawnChart } from 'chart.js';
import { ChartJSNodeCanvas } from 'chartjs-node-canvas';
import type { Chart } from './charts/chart.ts';
import { directLabels } from './charts/direct-labels.ts';
import { drawingMarks } from './charts/drawing-marks.ts';
import { fixedTicks } from './charts/fixed-ticks.ts';
import { COLOUR, FONT, HEIGHT, WIDTH } from './charts/theme.ts';
import { encodePng } from './encode-png.ts';
import type { OutputFile } from './write-files.ts';

/**
 * Draws each chart as a PNG of 1200 × 675 pixels, named after the chart. The same chart gives the same
 * bytes.
 */
export function renderPngs(charts: readonly Chart[]): OutputFile[] {
  registerFonts();
  const renderer = new ChartJSNodeCanvas({
    width: WIDTH,
    height: HEIGHT,
    backgroundColour: COLOUR.paper,
    plugins: { modern: [fixedTicks, drawingMarks, directLabels, quickEncoding] as never[] },
  });
  return charts.map(({ name, configuration }) => ({
    name: `${name}.png`,
    content: renderer.renderToBufferSync(configuration as never, 'image/png'),
  }));
}

/** The canvas's own encoder would take most of a picture's time. */
const quickEncoding = {
  id: 'quickEncoding',
  beforeInit(chart: DrawnChart) {
    const canvas = chart.canvas as unknown as Canvas;
    canvas.toBuffer = () => encodePng(canvas.data(), canvas.width, canvas.height);
  },
};

/** The pictures' own font, so that they look alike on every machine. */
function registerFonts(): void {
  if (GlobalFonts.has(FONT)) return;
  const { resolve } = requireFrom(import.meta.url);
  for (const face of ['400Regular/IBMPlexSans_400Regular', '600SemiBold/IBMPlexSans_600SemiBold']) {
    GlobalFonts.registerFromPath(resolve(`@expo-google-fonts/ibm-plex-sans/${face}.ttf`), FONT);
  }
}
