import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readText } from '../support/read-text.ts';

/** What is read of a text under `record.columns` of the job. */
async function read(text: string, columns: string | null = null) {
  const keys = columns === null ? '' : `columns:\n  ${columns.replaceAll('\n', '\n  ')}`;
  const { record, findings } = await readText({ 'r.csv': text }, keys);
  return { record, findings };
}

const hours = (times: Float64Array | undefined) =>
  [...(times ?? [])].map((time) => (time - Date.UTC(2031, 2, 30)) / 3_600_000);

describe('a record', () => {
  it('reads times and channels, blanks and units', async () => {
    const { record } = await read(
      'time,"a, b [degF]",c [K]\n2031-03-30T00:00,32,\n\n2031-03-30T01:00:00, 50 ,274.15\n',
    );
    expect(hours(record?.times)).toEqual([0, 1]);
    expect([...(record?.channels.get('a, b') ?? [])]).toEqual([0, 10]);
    expect([...(record?.channels.get('c') ?? [])]).toEqual([Number.NaN, 1]);
    expect(record?.offset).toBeNull();
  });

  it('keeps the clock of its first row through a change to summer time', async () => {
    const { record } = await read(
      'time,a [degC]\n2031-03-30T01:00+01:00,1\n2031-03-30T03:00+02:00,2\n2031-03-30T04:00+02:00,3\n',
    );
    expect(hours(record?.times)).toEqual([1, 2, 3]);
    expect(record?.offset).toBe(3_600_000);
  });

  it('wants an offset in every time or in none', async () => {
    const { findings } = await read('time,a [degC]\n2031-03-30T01:00Z,1\n2031-03-30T03:00,2\n');
    expect(findings.issues.map(({ place }) => place)).toEqual([
      { file: 'r.csv', line: 3, column: 1, cell: 'A3', key: 'time' },
    ]);
  });

  it('tells the first few of many faults, and how many more there are', async () => {
    const rows = Array.from(
      { length: 24 },
      (_, i) => `2031-03-30T${String(i).padStart(2, '0')}:00,x`,
    );
    const { findings } = await read(`time,a [degC]\n${rows.join('\n')}\n`);
    expect(findings.issues.length).toBe(5);
    expect(findings.issues[4].hint).toMatch(/The same is wrong in 19 more places\.$/);
  });

  it('places cells behind quoted lines', async () => {
    const text = 'note,time,a [degC]\n"two\nlines",2031-03-30T01:00,1\n"x,",2031-03-30T02:00,y\n';
    const columns = 'time: time\na [degC]: { channel: a }';
    const { findings } = await read(text, columns);
    expect(findings.issues[0].place).toMatchObject({ line: 4, key: 'a [degC]' });
  });

  it('refuses rows of another width, too few rows and numbers in other forms', async () => {
    const count = async (text: string) => (await read(text)).findings.issues.length;
    expect(await count('time,a [degC]\n2031-03-30T01:00\n2031-03-30T02:00,1,2\n')).toBe(2);
    expect(await count('time,a [degC]\n2031-03-30T01:00,1\n')).toBe(1);
    expect(await count('time,a [degC]\n2031-03-30T01:00,0x10\n2031-03-30T02:00,Infinity\n')).toBe(
      2,
    );
    expect(await count('')).toBe(1);
  });

  it('refuses a mapped header that stands twice, and a channel that does', async () => {
    const rows = '2031-03-30T01:00,1,2\n2031-03-30T02:00,1,2\n';
    const mapping = 't: time\na: { channel: x, unit: degC }';
    const found = async (text: string, columns: string | null) =>
      (await read(text, columns)).findings.issues.map((issue) => issue.found);
    expect(await found(`t,a,a\n${rows}`, mapping)).toEqual(['a']);
    expect(await found(`time,a [degC],a [degF]\n${rows}`, null)).toEqual(['a']);
    expect(await found(`t,a,b\n${rows}`, `${mapping}\nb: { channel: x, unit: degC }`)).toEqual([
      'x',
    ]);
    expect(await found(`t,a,b\n${rows}`, mapping)).toEqual([]);
  });

  it('reads a data set with headers of its own', async () => {
    // NOAA hourly normals of Seattle as the npm package vega-datasets ships them.
    const data = '../../node_modules/vega-datasets/data/seattle-weather-hourly-normals.csv';
    const file = join(import.meta.dirname, data);
    const text = readFileSync(file, 'utf8');
    const columns = 'date: time\ntemperature: { channel: air, unit: degC }';
    const { record } = await read(text, columns);
    const rows = text
      .trim()
      .split('\n')
      .slice(1)
      .map((line) => line.split(','));
    expect(record?.times.length).toBe(8759);
    expect([...(record?.channels.keys() ?? [])]).toEqual(['air']);
    expect([...(record?.channels.get('air') ?? [])]).toEqual(rows.map((row) => Number(row[2])));
    const times = rows.map((row) => Date.parse(`${row[0]}Z`));
    expect([...(record?.times ?? [])]).toEqual(times);
  });
});
