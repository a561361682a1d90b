import { deflateSync } from 'node:zlib';

const SIGNATURE = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
const COLOUR_AND_ALPHA = 6;

/**
 * A PNG file of 8-bit RGBA pixels, after the PNG Specification, Third Edition (W3C), clauses 5 and 11:
 * rows unfiltered and deflated at the fastest level, which for line charts takes a tenth of the time that
 * the canvas's own encoder does, and makes files up to a half larger.
 *
 * @param pixels four bytes a pixel, row by row from the top
 * @param width pixels a row
 * @param height rows
 */
export function encodePng(pixels: Uint8Array, width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, COLOUR_AND_ALPHA, 0, 0, 0], 8);
  return Buffer.concat([
    SIGNATURE,
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(unfiltered(pixels, 4 * width, height), { level: 1 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

/** Each row behind a zero byte: the filter type «none». */
function unfiltered(pixels: Uint8Array, rowBytes: number, height: number): Uint8Array {
  const rows = new Uint8Array((rowBytes + 1) * height);
  for (let y = 0; y < height; y++) {
    rows.set(pixels.subarray(y * rowBytes, (y + 1) * rowBytes), y * (rowBytes + 1) + 1);
  }
  return rows;
}

/** Length, type, data, and the check over type and data. */
function chunk(type: string, data: Uint8Array): Buffer {
  const bytes = Buffer.alloc(12 + data.length);
  bytes.writeUInt32BE(data.length, 0);
  bytes.write(type, 4, 'latin1');
  bytes.set(data, 8);
  bytes.writeUInt32BE(crc32(bytes.subarray(4, 8 + data.length)), 8 + data.length);
  return bytes;
}

/** Remainder of each byte, annex D of the specification. */
const REMAINDERS = Uint32Array.from({ length: 256 }, (_, byte) => {
  let c = byte;
  for (let bit = 0; bit < 8; bit++) c = c & 1 ? 0xedb88320 ^ (c >>> 1) : c >>> 1;
  return c;
});

function crc32(bytes: Uint8Array): number {
  let c = 0xffffffff;
  for (const byte of bytes) c = REMAINDERS[(c ^ byte) & 0xff] ^ (c >>> 8);
  return (c ^ 0xffffffff) >>> 0;
}
