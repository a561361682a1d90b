import { createCanvas, loadImage } from 'canvas';
import { expect, test } from 'vitest';
import { chooseCharts } from '../../src/output/charts/choose-charts.ts';
import { renderPngs } from '../../src/output/png.ts';
import { makeResult } from './make-result.ts';

const result = makeResult({
  hours: 240,
  runs: [
    { id: 'R1', count: 1, shearRangeLimit: 900, curves: true },
    { id: 'R2', count: 500, shearRangeLimit: 300, curves: true },
    { id: 'R3', count: 9, slotted: true },
  ],
});

test('every chart becomes a picture of 1200 × 675 with something on it', async () => {
  const files = renderPngs(chooseCharts(result, 'all'));
  expect(files).toHaveLength(10);
  for (const { name, content } of files) {
    const image = await loadImage(content as Buffer);
    expect([name, image.width, image.height]).toEqual([name, 1200, 675]);
    expect(inkShare(image), name).toBeGreaterThan(0.01);
  }
});

test('the same chart gives the same bytes', () => {
  const [once] = renderPngs(chooseCharts(result, 'governing'));
  const [again] = renderPngs(chooseCharts(result, 'governing'));
  expect(Buffer.compare(once.content as Buffer, again.content as Buffer)).toBe(0);
});

/** Share of the pixels that are not white. */
function inkShare(image: Awaited<ReturnType<typeof loadImage>>): number {
  const context = createCanvas(image.width, image.height).getContext('2d');
  context.drawImage(image, 0, 0);
  const { data } = context.getImageData(0, 0, image.width, image.height);
  let ink = 0;
  for (let i = 0; i < data.length; i += 4) if (data[i] < 250) ink++;
  return ink / (data.length / 4);
}
