import { describe, expect, it } from 'vitest';
import type { Job } from '../../src/model.ts';
import { summary } from '../../src/output/summary/summary.ts';
import { warmingCsv } from '../../src/output/warming-csv.ts';
import { yearsCsv } from '../../src/output/years-csv.ts';
import { screen } from '../../src/verdict/screen.ts';
import { csvRecord, jobOf, PAIR, pairShear } from '../support/temporary-job.ts';

const DAY = 24;
const START = Date.UTC(2031, 0, 1);
/** C and m of the pair's fastener curve, and the factor on its ranges. */
const [C, M, FACTOR] = [1e20, 4, 1.35];

/** Season and day. */
const weather = (swing: number) => (hour: number) =>
  10 -
  9 * Math.cos((2 * Math.PI * hour) / (365 * DAY)) -
  swing * Math.cos((2 * Math.PI * hour) / DAY) * (1 + 0.3 * Math.sin(Math.floor(hour / DAY)));

const jobFor = (record: string, more = ''): Promise<Job> =>
  jobOf({
    'record.csv': record,
    'job.yaml': `record: { file: record.csv }\nzones: { bar: { column: bar } }\n${more}${PAIR}`,
  });

describe('years one by one', () => {
  const swings = [8, 11, 6];
  // each begins with its coldest hour, so that cutting there cuts no swing in two
  const year = (k: number) => (hour: number) => (hour === 0 ? -25 : weather(swings[k])(hour));
  const start = (k: number) => START + k * 365 * DAY * 3_600_000;

  it('are what each year gives as a record of its own', async () => {
    // 2032 is a leap year
    const hours = 8760 + 8784 + 8760;
    const joined = csvRecord(START, hours, {
      'bar [degC]': (h) =>
        h < 8760 ? year(0)(h) : h < 8760 + 8784 ? year(1)(h - 8760) : year(2)(h - 8760 - 8784),
    });
    const [run] = screen(await jobFor(joined)).runs;
    const found = run.yearByYear();
    expect(found.map(({ from }) => new Date(from).getUTCFullYear())).toEqual([2031, 2032, 2033]);
    for (const [k, length] of [8760, 8784, 8760].entries()) {
      const alone = csvRecord(start(k), length, { 'bar [degC]': year(k) });
      const [only] = screen(await jobFor(alone)).runs;
      expect(only.yearByYear()).toEqual([]);
      for (const [i, connection] of found[k].connections.entries()) {
        const expected = only.connections[i];
        expect(connection.fastenerDamagePerYear! / expected.fastenerDamagePerYear!).toBeCloseTo(
          1,
          9,
        );
        expect(connection.memberDamagePerYear! / expected.memberDamagePerYear!).toBeCloseTo(1, 9);
        expect(connection.life! / expected.life!).toBeCloseTo(1, 9);
      }
    }
  });

  it('are told with their mean and their worst, and a short one is left out and named', async () => {
    const record = csvRecord(START, 8760 * 2 + 24 + 2400, {
      'bar [degC]': (h) => (h < 8760 ? year(0)(h) : year(1)(h - 8760)),
    });
    const result = screen(await jobFor(record));
    const text = summary(result);
    expect(text).toMatch(/Year by year\n.*\n {2}R1 +R1\/1 +2 .* 2032-01-01/);
    expect(text).toMatch(/The year from 2033-01-01 covers 100 days and is left out here/);
    const rows = yearsCsv(result)!.trim().split('\n');
    expect(rows).toHaveLength(1 + 3 * 2);
    // damage of the short year is scaled from its days
    expect(rows[6].split(',').slice(2, 6)).toEqual([
      '2033-01-01T00:00',
      '2033-04-10T23:00',
      '100',
      '100',
    ]);
    expect(rows[1].split(',')[5]).toBe('');
  });

  it('are not told of a single year', async () => {
    const result = screen(await jobFor(csvRecord(START, 8760, { 'bar [degC]': year(0) })));
    expect(yearsCsv(result)).toBeNull();
    expect(summary(result)).not.toContain('Year by year');
  });
});

describe('a cycle a year between the extremes', () => {
  const extremes =
    'extremes: [{ name: summer, bar: 71 degC }, { name: frost, bar: -29 degC }, { name: mild, bar: 20 degC }]\n';
  const damageOf = async (hours: number, more: string) => {
    const job = await jobFor(csvRecord(START, hours, { 'bar [degC]': weather(8) }), more);
    const [run] = screen(job).runs;
    return { run, damage: run.connections[0].fastenerDamagePerYear! };
  };

  // Closed form of two equal springs and Miner's sum: one cycle of EAα·100 K/(1 + 2EA/(kL)) against N = C/S^m.
  const added = (FACTOR * pairShear(100)) ** M / C;

  it.each([8760, 2400])('adds exactly its own damage to a record of %d h', async (hours) => {
    const off = await damageOf(hours, `${extremes}counting: { extremes_cycle: no }\n`);
    const on = await damageOf(hours, `${extremes}counting: { extremes_cycle: yes }\n`);
    expect((on.damage - off.damage) / added).toBeCloseTo(1, 6);
    expect(on.run.connections[0].cyclesPerYear - off.run.connections[0].cyclesPerYear).toBeCloseTo(
      1,
      9,
    );
    expect(on.run.extremesCycle).toEqual({ hot: 'summer', cold: 'frost' });
    expect(off.run.extremesCycle).toBeNull();
    // and the table of cycles adds up to it
    const bins = on.run.fastenerBins.reduce((sum, { damage }) => sum + damage!, 0);
    expect(bins / on.run.years / on.damage).toBeCloseTo(1, 9);
  });

  it('is said to be on or off, and is none between fewer than two', async () => {
    const text = async (more: string) =>
      summary(screen(await jobFor(csvRecord(START, 2400, { 'bar [degC]': weather(8) }), more)));
    const off = 'counting: { extremes_cycle: no }\n';
    expect(await text(extremes + off)).toMatch(/extremes_cycle is\s+off/);
    const on = 'counting: { extremes_cycle: yes }\n';
    expect(await text(extremes + on)).toMatch(/between the extremes summer and frost/);
    const one = 'extremes: [{ name: summer, bar: 71 degC }]\n';
    expect(await text(one + on)).toMatch(/No cycle between extremes was added/);
    expect(await text('')).not.toContain('extremes_cycle is');
  });

  it('is added by itself to a season short of a year only', async () => {
    const cycleOf = async (hours: number) => (await damageOf(hours, extremes)).run.extremesCycle;
    expect(await cycleOf(2400)).toEqual({ hot: 'summer', cold: 'frost' });
    expect(await cycleOf(8760)).toBeNull();
  });

  it('leaves peaks as they are', async () => {
    const off = await damageOf(2400, `${extremes}counting: { extremes_cycle: no }\n`);
    const on = await damageOf(2400, `${extremes}counting: { extremes_cycle: yes }\n`);
    expect(on.run.connections[0].shearPeak).toBe(off.run.connections[0].shearPeak);
    expect(on.run.connections[0].shearRange).toBe(off.run.connections[0].shearRange);
  });
});

describe('warmer zones', () => {
  const record = csvRecord(START, 8760, { 'bar [degC]': weather(8) });
  const warmedBy = async (warming: string) => screen(await jobFor(record, `warming: ${warming}\n`));

  it('by the same everywhere keep ranges and damage, and move the peak by the closed form', async () => {
    const { runs, warmed } = await warmedBy('{ add: 4 K }');
    const [before, after] = [runs[0].connections[0], warmed![0].connections[0]];
    expect(after.fastenerDamagePerYear! / before.fastenerDamagePerYear!).toBeCloseTo(1, 9);
    expect(after.shearRange / before.shearRange).toBeCloseTo(1, 9);
    expect((after.shearPeak - before.shearPeak) / pairShear(4)).toBeCloseTo(1, 9);
  });

  it('by a larger daily swing raise the damage by its power', async () => {
    // the same day each day: every cycle but one is a day's, and grows by 1.25
    const daily = csvRecord(START, 8760, {
      'bar [degC]': (h) => 10 - 8 * Math.cos((2 * Math.PI * h) / DAY),
    });
    const job = await jobFor(daily, 'warming: { daily_swing: 1.25 }\n');
    const { runs, warmed } = screen(job);
    const [before, after] = [runs[0].connections[0], warmed![0].connections[0]];
    expect(after.shearRange / before.shearRange).toBeCloseTo(1.25, 3);
    expect(after.fastenerDamagePerYear! / before.fastenerDamagePerYear!).toBeCloseTo(1.25 ** M, 3);
  });

  it('stand beside the record as it is, in summary and table', async () => {
    const result = await warmedBy('{ add: 2 K, daily_swing: 1.1 }');
    expect(summary(result)).toContain('What if: 2 K added, daily swing times 1.1');
    expect(summary(result)).toContain(
      'A check fails in 0 of 1 runs in warmer zones, in 0 as the record is.',
    );
    const [header, first] = warmingCsv(result)!
      .split('\n')
      .map((row) => row.split(','));
    const cell = (name: string) => Number(first[header.indexOf(name)]);
    expect(cell('fastener_damage_per_year')).toBeCloseTo(
      result.runs[0].connections[0].fastenerDamagePerYear!,
      8,
    );
    expect(cell('warmer_fastener_damage_per_year')).toBeGreaterThan(
      cell('fastener_damage_per_year'),
    );
    expect(warmingCsv(screen(await jobFor(record)))).toBeNull();
  });
});
