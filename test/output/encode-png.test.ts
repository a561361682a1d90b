import { crc32, inflateSync } from 'node:zlib';
import { createCanvas, loadImage } from 'canvas';
import { expect, test } from 'vitest';
import { encodePng } from '../../src/output/encode-png.ts';

const WIDTH = 5;
const HEIGHT = 3;
const pixels = Uint8Array.from({ length: 4 * WIDTH * HEIGHT }, (_, i) =>
  i % 4 === 3 ? 255 : (i * 37) % 256,
);
const png = encodePng(pixels, WIDTH, HEIGHT);

test('another decoder reads the same pixels', async () => {
  const image = await loadImage(png);
  const context = createCanvas(WIDTH, HEIGHT).getContext('2d');
  context.drawImage(image, 0, 0);
  expect([image.width, image.height]).toEqual([WIDTH, HEIGHT]);
  expect([...context.getImageData(0, 0, WIDTH, HEIGHT).data]).toEqual([...pixels]);
});

test('every chunk carries the check of a general-purpose library', () => {
  const types: string[] = [];
  for (let at = 8; at < png.length; ) {
    const length = png.readUInt32BE(at);
    types.push(png.toString('latin1', at + 4, at + 8));
    const check = png.readUInt32BE(at + 8 + length);
    expect(check).toBe(crc32(png.subarray(at + 4, at + 8 + length)));
    at += 12 + length;
  }
  expect(types).toEqual(['IHDR', 'IDAT', 'IEND']);
  const length = png.readUInt32BE(33);
  expect(inflateSync(png.subarray(41, 41 + length))).toHaveLength((4 * WIDTH + 1) * HEIGHT);
});
