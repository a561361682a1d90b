import { describe, expect, it } from 'vitest';
import { readEpw } from '../../src/input/epw.ts';
import { noFindings } from '../../src/input/findings.ts';
import { wordIssue } from '../../src/issue.ts';

const HOUR = 3_600_000;
/** An invented place in the layout's header. */
const HEADER = [
  'LOCATION,Skerry Landing,-,Nowhere,invented,000000,57.25,-4.5,0.0,12.0',
  'DESIGN CONDITIONS,0',
  'TYPICAL/EXTREME PERIODS,0',
  'GROUND TEMPERATURES,0',
  'HOLIDAYS/DAYLIGHT SAVINGS,No,0,0,0',
  'COMMENTS 1,"an invented, quoted remark',
  'COMMENTS 2,',
  'DATA PERIODS,1,1,Data,Sunday, 1/ 1,12/31',
];
/** A row of 35 fields; the order of the layout is from memory. */
const row = (date: string, [air, global, direct, diffuse, wind]: readonly (number | string)[]) =>
  `${date},60,*,${air},1.0,80,101000,0,0,300,${global},${direct},${diffuse},0,0,0,0,180,${wind},5,5,20,9999,9,999999999,10,0.1,0,88,0.2,0,0`;
const VALUES = [5.5, 200, 350, 90, 3.1];

const read = (lines: readonly string[], ends = '\n') => {
  const findings = noFindings();
  const weather = readEpw(lines.join(ends), 'site.epw', findings);
  return { weather, messages: findings.issues.map(wordIssue) };
};

describe('a weather file in the EPW layout', () => {
  it('gives its place, its clock and its columns at the end of each hour', () => {
    const rows = [row('2031,1,1,23', VALUES), row('2031,1,1,24', [-2, 0, 0, 0, 0]), ''];
    for (const ends of ['\n', '\r\n']) {
      const { weather, messages } = read([...HEADER, ...rows], ends);
      expect(messages).toEqual([]);
      expect(weather!.name).toBe('Skerry Landing, Nowhere');
      expect(weather!.site).toEqual({ latitude: 57.25, longitude: -4.5, utcOffset: 0 });
      expect(Array.from(weather!.times)).toEqual([Date.UTC(2031, 0, 1, 23), Date.UTC(2031, 0, 2)]);
      const { air, global, direct, diffuse, wind } = weather!.columns;
      expect([air, global, direct, diffuse, wind].map(([first]) => first)).toEqual(VALUES);
      expect(air[1]).toBe(-2);
      expect(weather!.setOn).toBeNull();
    }
  });

  it('leaves a gap where a value bears the mark of a missing one', () => {
    const { weather } = read([
      ...HEADER,
      row('2031,1,1,1', ['99.9', '9999', '9999', '9999', '999']),
      row('2031,1,1,2', VALUES),
    ]);
    for (const column of Object.values(weather!.columns)) {
      expect(column[0]).toBeNaN();
      expect(column[1]).not.toBeNaN();
    }
  });

  /** Every hour of the months of a year, each from a year of its own. */
  const monthsFrom = (years: readonly number[], februaryDays: number) => {
    const lines: string[] = [];
    for (const [month, year] of years.entries()) {
      const days = month === 1 ? februaryDays : new Date(Date.UTC(2031, month + 1, 0)).getUTCDate();
      for (let hour = 0; hour < 24 * days; hour++) {
        const date = `${year},${month + 1},${Math.floor(hour / 24) + 1},${(hour % 24) + 1}`;
        lines.push(row(date, VALUES));
      }
    }
    return lines;
  };
  const YEARS = [2004, 1999, 2001, 2004, 1996, 1998, 2002, 2000, 2003, 2005, 1997, 2004];

  it('sets a typical year’s months on one year', () => {
    const { weather, messages } = read([...HEADER, ...monthsFrom(YEARS, 28)]);
    expect(messages).toEqual([]);
    expect(weather!.years).toEqual([1996, 2005]);
    expect(weather!.setOn).toBe(2005);
    const { times } = weather!;
    expect(times.length).toBe(8760);
    expect(times.every((time, i) => i === 0 || time - times[i - 1] === HOUR)).toBe(true);
    expect(new Date(times[0]).getUTCFullYear()).toBe(2005);
  });

  it('keeps a 29 February', () => {
    const { weather } = read([
      ...HEADER,
      ...monthsFrom(
        YEARS.map((year) => year + 1),
        29,
      ),
    ]);
    expect(weather!.setOn).toBe(2008);
    expect(weather!.times.length).toBe(8784);
  });

  it('leaves dates that go on from year to year as they are', () => {
    const { weather } = read([
      ...HEADER,
      row('2030,12,31,24', VALUES),
      row('2031,1,1,1', VALUES),
      row('2031,1,1,2', VALUES),
    ]);
    expect(weather!.setOn).toBeNull();
    expect(weather!.times[0]).toBe(Date.UTC(2031, 0, 1));
  });

  it('names every fault with its place', () => {
    const { weather, messages } = read([
      HEADER[0].replace('57.25', '157.25'),
      ...HEADER.slice(1),
      row('2031,13,1,1', VALUES),
      row('2031,1,1,2', [5.5, 'x', 350, 90, 3.1]),
      '2031,1,1,3,60',
    ]);
    expect(weather).toBeNull();
    expect(messages).toEqual([
      'site.epw:1:51  LOCATION latitude: found "157.25", expected a number from -90 to 90.',
      'site.epw:9:6  month: found "13", expected a whole number from 1 to 12.',
      'site.epw:10:43  global horizontal radiation: found "x", expected a number, or 9999 where it is missing.',
      'site.epw:11  found "5 fields", expected at least 22 fields.',
    ]);
  });

  it('names a file of another layout, of another step, or out of order', () => {
    expect(read(['time,air', '2031-01-01T00:00,3']).messages).toEqual([
      'site.epw:1:1  found "time", expected a header that begins with LOCATION, as the EPW layout has it.',
      'site.epw  nothing stands here, expected a line that begins with DATA PERIODS.',
    ]);
    const quarters = [...HEADER.slice(0, 7), 'DATA PERIODS,1,4,Data,Sunday, 1/ 1,12/31'];
    expect(read(quarters).messages).toEqual([
      'site.epw:8:16  records per hour: found "4", expected 1: one row an hour.',
    ]);
    const twice = [row('2031,1,1,1', VALUES), row('2031,1,1,1', VALUES)];
    expect(read([...HEADER, ...twice]).messages[0]).toBe(
      'site.epw:10:1  date and hour: found "2031-01-01T01:00", expected a time after that of the row before, 2031-01-01T01:00.\n    Put the rows in order of time and leave out doubles.',
    );
    expect(read(HEADER).messages).toEqual([
      'site.epw  nothing stands here, expected at least two rows of data.',
    ]);
  });
});
