import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { judgeChannels } from '../../src/input/judge-record.ts';
import { readText } from '../support/read-text.ts';
import { csvRecord, jobOf, messagesOf, PAIR } from '../support/temporary-job.ts';

const START = Date.UTC(2031, 4, 1);
const HOUR = 3_600_000;

/** A day like any other, to two decimals. */
const day = (hour: number) => Number((15 - 8 * Math.cos((Math.PI * hour) / 12)).toFixed(2));

/** What judging finds in a record of a few days: kind, hour, channel, value and what was done. */
async function judged(
  channels: Readonly<Record<string, (hour: number) => number | ''>>,
  keys = '',
  hours = 72,
) {
  const text = csvRecord(START, hours, channels);
  const { record, list, judging, findings } = await readText({ 'r.csv': text }, keys);
  expect(findings.issues).toEqual([]);
  judgeChannels(record!, judging, list);
  const found = list
    .inOrder()
    .map(({ kind, time, channel, value, done }) =>
      [kind, (time - START) / HOUR, channel, value, done].join(' | '),
    );
  return { found, record: record! };
}

const spoilt = (at: number, value: number) => (hour: number) => (hour === at ? value : day(hour));

// Expected findings are worked by hand from the rules; there is no source outside for them.
describe('judging a record', () => {
  it('finds nothing in a sound one', async () => {
    expect((await judged({ 'rail [degC]': day, 'deck [degC]': () => 12 })).found).toEqual([]);
  });

  it('keeps spikes, or leaves them out where the job says so', async () => {
    const rail = { 'rail [degC]': spoilt(30, 85) };
    const kept = await judged(rail);
    expect(kept.found).toEqual(['spike | 30 | rail | 85 | kept']);
    expect(kept.record.channels.get('rail')?.[30]).toBe(85);
    const out = await judged(rail, 'spikes: { over: 10 K, rule: leave out }');
    expect(out.found).toEqual(['spike | 30 | rail | 85 | left out']);
    expect(out.record.channels.get('rail')?.[30]).toBeNaN();
  });

  it('names jumps, and those from file to file', async () => {
    const raised = (hour: number) => day(hour) + (hour < 40 ? 0 : 45);
    const { found } = await judged({ 'rail [degC]': raised });
    expect(found).toEqual([`jump | 40 | rail | ${raised(40)} | kept`]);
    const whole = csvRecord(START, 72, { 'rail [degC]': raised });
    const lines = whole.trimEnd().split('\n');
    const files = {
      'a.csv': lines.slice(0, 41).join('\n'),
      'b.csv': [lines[0], ...lines.slice(41)].join('\n'),
    };
    const { record, list, judging } = await readText(files);
    judgeChannels(record!, judging, list);
    expect(list.inOrder().map(({ kind }) => kind)).toEqual(['jump between files']);
  });

  it('leaves stuck stretches out but for their first value, or keeps them', async () => {
    const stuck = (hour: number) => (hour > 20 && hour <= 50 ? day(20) : day(hour));
    const out = await judged({ 'rail [degC]': stuck });
    expect(out.found).toEqual([
      `stuck | 20 | rail | ${day(20)} | left out but for its first value`,
    ]);
    const missing = [...out.record.channels.get('rail')!].flatMap((v, i) =>
      Number.isNaN(v) ? [i] : [],
    );
    expect([missing[0], missing.at(-1), missing.length]).toEqual([21, 50, 30]);
    const kept = await judged({ 'rail [degC]': stuck }, 'stuck: { rule: keep }');
    expect(kept.found).toEqual([`stuck | 20 | rail | ${day(20)} | kept`]);
    expect(kept.record.channels.get('rail')?.[40]).toBe(day(20));
    expect((await judged({ 'rail [degC]': stuck }, 'stuck: { longer_than: 30 h }')).found).toEqual(
      [],
    );
  });

  it('leaves other quantities alone', async () => {
    const sun = (hour: number) => (hour === 30 ? 900 : 0);
    expect((await judged({ 'sun [W/m^2]': sun, 'rail [degC]': day })).found).toEqual([]);
  });

  it('names channels far apart, as one in another unit', async () => {
    const hot = (hour: number) => Number((day(hour) * 1.8 + 32).toFixed(2));
    const { found } = await judged(
      { 'rail [degC]': day, 'deck [degC]': hot },
      'jumps: { apart: 30 K }',
    );
    expect(found).toHaveLength(1);
    expect(found[0]).toMatch(/^channels apart \| 0 \| deck \| .*against that of rail$/);
  });

  it('tells what was done about rows: order, repeats, band, an hour that stands once', async () => {
    const rows = ['01:00,1', '00:00,0', '02:00,2', '02:00,9', '03:00,95'];
    const text = `time,rail [degC]\n${rows.map((row) => `2031-10-26T${row}`).join('\n')}\n`;
    const keys = `disorder: sort
repeats: last
band: { to: 90 degC, rule: leave out }
time: { zone: Europe/London }`;
    const { record, list } = await readText({ 'r.csv': text }, keys);
    expect([...record!.channels.get('rail')!]).toEqual([0, 1, 9, Number.NaN]);
    expect(
      list
        .inOrder()
        .map(({ kind, done }) => `${kind}: ${done}`)
        .sort(),
    ).toEqual([
      'disorder: put in order of time',
      'doubled hour once: taken as the first time, in summer time',
      'out of band: left out',
      'repeat: left out; the last row of this time is kept',
    ]);
  });

  it('refuses a time that stands twice once rows are sorted', async () => {
    const text = 'time,rail [degC]\n2031-01-01T01:00,1\n2031-01-01T00:00,0\n2031-01-01T01:00,2\n';
    const { record, findings } = await readText({ 'r.csv': text }, 'disorder: sort');
    expect(record).toBeNull();
    expect(findings.issues[0]).toMatchObject({ found: '2031-01-01T01:00:00 twice, once sorted' });
  });
});

describe('the findings of a job', () => {
  it('hold its gaps and changes of step, and warn once a kind', async () => {
    const rail = (hour: number) => (hour === 30 ? 85 : hour === 10 ? '' : day(hour));
    const hourly = csvRecord(START, 72, { 'bar [degC]': rail });
    const next = csvRecord(START + 72 * HOUR, 48, { 'bar [degC]': day });
    const everyFour = next.split('\n').filter((_, i) => i % 4 === 1);
    const job = await jobOf({
      'record.csv': hourly + everyFour.join('\n'),
      'job.yaml': `record: { file: record.csv }\nzones: { bar: { column: bar } }\n${PAIR}`,
    });
    expect(job.recordFindings.map(({ kind, done }) => `${kind}: ${done}`)).toEqual([
      'gap: filled by a straight line',
      'spike: kept',
      'step changes: kept; from 1 to 4 h',
    ]);
    expect(job.warnings.filter((text) => text.startsWith('record:'))).toHaveLength(1);
  });
});

describe('how a record was read', () => {
  it('is said where it is not the plain form', async () => {
    const text = 'Logger 7\n\ntime;rail [°C]\n13/01/2031 10:00;12,25\n13/01/2031 11:00;12,5\n';
    const bytes = Buffer.from(text, 'latin1');
    const { record } = await readText({ 'r.csv': bytes });
    expect(record?.readAs).toEqual([
      'r.csv is read with Windows-1252 characters, semicolons between cells, header in line 3, decimal commas, dates day-first.',
    ]);
    const zoned = await readText({ 'r.csv': bytes }, 'time: { zone: Europe/London }');
    expect(zoned.record?.readAs[1]).toBe(
      'Times are on the standard time of Europe/London all year.',
    );
    const plain = await readText({ 'r.csv': csvRecord(START, 3, { 'rail [degC]': day }) });
    expect(plain.record?.readAs).toEqual([]);
  });
});

describe('the file of a record', () => {
  const job = (file: string) => ({
    'job.yaml': `record: { file: ${file} }\nzones: { bar: { column: bar } }\n${PAIR}`,
  });

  it.each([
    ['.', 'This is a folder.'],
    ['nothing.csv', 'There is no file of this name.'],
    ['/dev/zero', 'It could not be read (no regular file).'],
  ])('is one that can be read to its end: %s', async (file, why) => {
    expect((await messagesOf(job(file))).join(' ')).toContain(why);
  });

  it('is named with its hash', async () => {
    const text = csvRecord(START, 30, { 'bar [degC]': day });
    const { inputs } = await jobOf({ ...job('record.csv'), 'record.csv': text });
    const sha256 = createHash('sha256').update(text).digest('hex');
    expect(inputs[1]).toEqual({ name: 'record.csv', sha256 });
  });
});
