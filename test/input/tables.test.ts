import { cpSync, mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readJob } from '../../src/input/job.ts';
import { flatNumbers } from '../support/flat-numbers.ts';

const SI = join(import.meta.dirname, 'jobs/si');

/** The job with one of its tables written another way. */
function withTable(name: string, write: (text: string) => string | Uint8Array): string {
  const folder = mkdtempSync(join(tmpdir(), 'job-'));
  cpSync(SI, folder, { recursive: true });
  writeFileSync(join(folder, name), write(readFileSync(join(SI, name), 'utf8')));
  return folder;
}

const members = (text: string) => text.replace('net_area [mm²]', 'Net area (mm²)');
/** Text as Windows-1252: the characters used here have one byte each, that of their code. */
const narrow = (text: string) => Uint8Array.from(text, (c) => c.charCodeAt(0));

/** Each way with what it makes of a table. */
const WAYS: readonly (readonly [string, string, (text: string) => string | Uint8Array])[] = [
  ['headers as people write them', 'members.csv', members],
  ['semicolons', 'members.csv', (text) => text.replaceAll(',', ';')],
  ['tabs', 'runs.csv', (text) => text.replaceAll(',', '\t')],
  [
    'a separator said in the first line',
    'members.csv',
    (text) => `sep=|\n${text.replaceAll(',', '|')}`,
  ],
  [
    'empty columns and rows',
    'members.csv',
    (text) => `,,\n${text.replace(/^/gm, ',').replace(/$/gm, ',,')}\n,,,\n\n`,
  ],
  [
    'spaces, also such that do not break',
    'members.csv',
    (text) => text.replaceAll(',', ' ,\u00a0 '),
  ],
  ['a row of units', 'fasteners.csv', unitsBelow],
  ['a row of units in brackets', 'curves.csv', (text) => unitsBelow(text).replace('kN', '[kN]')],
  ['a byte order mark', 'members.csv', (text) => `\ufeff${text}`],
  ['UTF-16 with its mark', 'members.csv', (text) => Buffer.from(`\ufeff${text}`, 'utf16le')],
  ['Windows-1252', 'members.csv', (text) => narrow(members(text))],
  ['line ends of another system', 'runs.csv', (text) => text.replaceAll('\n', '\r\n')],
  ['everything in quotes', 'runs.csv', (text) => text.replace(/[^,\n]+/g, '"$&"')],
  [
    'other units',
    'members.csv',
    (text) =>
      text
        .replace('modulus [GPa]', 'modulus [N/mm²]')
        .replace(',70,', ',70000,')
        .replace(',210,', ',210000,'),
  ],
];

/** The units of the headers as a row of their own. */
function unitsBelow(text: string): string {
  const [header, ...rows] = text.split('\n');
  const cells = header.split(',').map((cell) => /^([^ ]*)(?: \[(.*)\])?$/.exec(cell) ?? []);
  const line = (part: number) => cells.map((cell) => cell[part] ?? '').join(',');
  return [line(1), line(2), ...rows].join('\n');
}

describe('tables as spreadsheets write them', () => {
  it.each(WAYS)('%s', async (_, name, write) => {
    const plain = flatNumbers(await readJob(SI));
    const read = flatNumbers(await readJob(withTable(name, write)));
    expect(plain.size).toBeGreaterThan(100);
    expect([...read.keys()]).toEqual([...plain.keys()]);
    for (const [path, value] of plain) expect(read.get(path), path).toBeCloseTo(value, 9);
  });

  it('a workbook is named as one', async () => {
    const folder = withTable('members.csv', () => Buffer.from('PK\u0003\u0004 and more', 'latin1'));
    await expect(readJob(folder)).rejects.toThrow('save the sheet as CSV');
  });

  it('bytes that are no text are refused', async () => {
    const folder = withTable('members.csv', () => Uint8Array.from([105, 100, 0, 200, 201, 0]));
    await expect(readJob(folder)).rejects.toThrow('bytes of another encoding');
  });
});
