import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readText } from '../support/read-text.ts';

const FOLDER = join(import.meta.dirname, '../records');
const KINDS = readdirSync(FOLDER);

/**
 * Reads the files that a folder's record.yaml names, under its other keys.
 * @param blockSize the bytes come in blocks of so many
 */
async function readAwkward(kind: string, blockSize: number) {
  const folder = join(FOLDER, kind);
  const [first, ...keys] = readFileSync(join(folder, 'record.yaml'), 'utf8').split('\n');
  const names = first.replace(/^files?: \[?|\]$/g, '').split(', ');
  const files = names.map((name) => [name, readFileSync(join(folder, name))] as const);
  return readText(Object.fromEntries(files), keys.join('\n'), blockSize);
}

describe('records as loggers write them, each beside its clean twin', () => {
  it('are of many kinds', () => expect(KINDS.length).toBeGreaterThanOrEqual(50));

  it.each(KINDS)('%s', async (kind) => {
    const clean = await readText({ 'clean.csv': readFileSync(join(FOLDER, kind, 'clean.csv')) });
    expect(clean.findings.issues).toEqual([]);
    // A block may end anywhere, in the middle of a character too.
    for (const blockSize of [1 << 20, 7, 1]) {
      const { record, findings } = await readAwkward(kind, blockSize);
      expect(findings.issues).toEqual([]);
      expect(record?.times).toEqual(clean.record?.times);
      expect([...(record?.channels.keys() ?? [])]).toEqual([...clean.record!.channels.keys()]);
      for (const [name, values] of clean.record!.channels) {
        // Degrees Fahrenheit are off by a rounding.
        const off = record!.channels.get(name)!.map((value, i) => Math.abs(value - values[i]));
        expect(off.every((one, i) => one < 1e-12 || Number.isNaN(values[i]))).toBe(true);
        expect([...off].map(Number.isNaN)).toEqual([...values].map(Number.isNaN));
      }
    }
  });
});
