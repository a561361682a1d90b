import { describe, expect, it } from 'vitest';
import { recordCsv } from '../../src/output/record-csv.ts';
import { resultsCsv } from '../../src/output/results-csv.ts';
import { summary } from '../../src/output/summary/summary.ts';
import { screen } from '../../src/verdict/screen.ts';
import { csvRecord, jobOf, PAIR } from '../support/temporary-job.ts';

const START = Date.UTC(2031, 0, 1);
const DAYS = 40;

/** A swing a day from 0 °C; its top, at noon, is given for each day. Hours between stand aside where `isBlank`. */
async function screened(top: (day: number) => number, isBlank: (hour: number) => boolean) {
  const bar = (hour: number) =>
    isBlank(hour)
      ? ''
      : (top(Math.floor(hour / 24)) * (1 - Math.cos((Math.PI * (hour % 24)) / 12))) / 2;
  const record = csvRecord(START, DAYS * 24 + 1, { 'bar [degC]': bar });
  const job = await jobOf({
    'record.csv': record,
    'job.yaml': `record: { file: record.csv }\nzones: { bar: { column: bar } }\n${PAIR}`,
  });
  return screen(job);
}

describe('the share of damage that rests on gaps', () => {
  it('is none without gaps, and none where a gap lies on the way of a swing', async () => {
    const whole = await screened(
      () => 20,
      () => false,
    );
    expect(whole.runs[0].filledShares()).toEqual([
      { fastener: 0, member: 0 },
      { fastener: 0, member: 0 },
    ]);
    expect(summary(whole)).not.toContain('Found in the record');
    const rising = await screened(
      () => 20,
      (hour) => hour % 24 === 6 && hour < 100,
    );
    expect(rising.runs[0].filledShares()[0]).toEqual({ fastener: 0, member: 0 });
    expect(summary(rising)).toContain('No damage rests on the gaps');
  });

  it('is that of the days whose top lies at the edge of a gap', async () => {
    // Ten of forty equal days have a blank at 13 h, beside the top at 12 h: their cycles rest on it.
    const { runs } = await screened(
      () => 20,
      (hour) => hour % 24 === 13 && Math.floor(hour / 24) % 4 === 1,
    );
    const [left, right] = runs[0].filledShares();
    expect(left.fastener).toBeCloseTo(10 / DAYS, 9);
    expect(left.member).toBeCloseTo(10 / DAYS, 9);
    expect(right.fastener).toBeCloseTo(10 / DAYS, 9);
  });

  it('grows with the damage of such a day as its range to the power of the slope', async () => {
    const result = await screened(
      (day) => (day === 7 ? 40 : 20),
      (hour) => hour === 7 * 24 + 11,
    );
    const [share] = result.runs[0].filledShares();
    // PAIR's fastener curve has slope 4 and its member curve slope 3.
    const expected = (m: number) => 2 ** m / (2 ** m + DAYS - 1);
    expect(share.fastener).toBeCloseTo(expected(4), 9);
    expect(resultsCsv(result)).toContain('fastener_damage_filled_share,member_damage_filled_share');
    expect(summary(result)).toContain("of a connection's damage (R1/1) rests on the gaps");
    expect(recordCsv(result.job)).toBe(
      'time,channel,found,value [°C],lasts [h],done\n2031-01-08T11:00,,gap,,1,filled by a straight line\n',
    );
  });
});
