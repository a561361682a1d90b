import type { FileBytes } from './files.ts';

/** How a file's text is written as bytes. */
export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

/** The bytes are not what the encoding says. */
export class EncodingError extends Error {}

/**
 * The encoding of a file: UTF-16 by its mark or by its blank bytes, UTF-8 where every byte can be of it, else
 * Windows-1252, in which figures and plain letters are the same.
 */
export async function encodingOf(file: FileBytes): Promise<Encoding> {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  const start: number[] = [];
  let isUtf8 = true;
  for await (const block of file.blocks()) {
    if (start.length < LOOKED_AT) start.push(...block.subarray(0, LOOKED_AT - start.length));
    isUtf8 &&= isValid(() => decoder.decode(block, { stream: true }));
    if (!isUtf8 && start.length === LOOKED_AT) break;
  }
  isUtf8 &&= isValid(() => decoder.decode());
  return wideEncodingOf(start) ?? (isUtf8 ? 'utf-8' : 'windows-1252');
}

/** Bytes that tell UTF-16. */
const LOOKED_AT = 1000;

function isValid(run: () => unknown): boolean {
  try {
    run();
    return true;
  } catch {
    return false;
  }
}

function wideEncodingOf(start: readonly number[]): Encoding | null {
  if (start[0] === 0xff && start[1] === 0xfe) return 'utf-16le';
  if (start[0] === 0xfe && start[1] === 0xff) return 'utf-16be';
  const blanks = [0, 0];
  for (const [i, byte] of start.entries()) if (byte === 0) blanks[i % 2]++;
  // What a logger writes is nearly all ASCII, whose every other byte UTF-16 leaves blank.
  if (blanks[1] > start.length / 4) return 'utf-16le';
  return blanks[0] > start.length / 4 ? 'utf-16be' : null;
}

/**
 * A file's text, block after block, without a byte order mark and with LF line ends.
 *
 * @throws EncodingError where a byte cannot be of the encoding
 */
export async function* textBlocks(file: FileBytes, encoding: Encoding): AsyncGenerator<string> {
  const decoder = new TextDecoder(encoding, { fatal: true });
  let held = '';
  for await (const bytes of file.blocks()) {
    const text = held + decode(() => decoder.decode(bytes, { stream: true }));
    // The other half of a CR LF may stand in the next block.
    held = text.endsWith('\r') ? '\r' : '';
    yield withLineFeeds(held === '' ? text : text.slice(0, -1));
  }
  yield withLineFeeds(held + decode(() => decoder.decode()));
}

function decode(run: () => string): string {
  try {
    return run();
  } catch (error) {
    if (error instanceof TypeError) throw new EncodingError(error.message);
    throw error;
  }
}

function withLineFeeds(text: string): string {
  return text.includes('\r') ? text.replace(/\r\n?/g, '\n') : text;
}
