import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readIsoTime } from '../../src/input/iso-time.ts';

describe('ISO 8601 times', () => {
  it('agree with the platform on every time that there is', () => {
    const range = { min: new Date('1900-01-01T00:00Z'), max: new Date('2199-12-31T23:59Z') };
    fc.assert(
      fc.property(fc.date({ ...range, noInvalidDate: true }), (date) => {
        const seconds = Math.floor(date.getTime() / 1000) * 1000;
        const text = new Date(seconds).toISOString().slice(0, 19);
        expect(readIsoTime(text)).toEqual({ local: seconds, offset: null });
        expect(readIsoTime(`${text}Z`)).toEqual({ local: seconds, offset: 0 });
        expect(readIsoTime(text.slice(0, 16))?.local).toBe(Math.floor(seconds / 60000) * 60000);
      }),
      { seed: 1, numRuns: 500 },
    );
  });

  it('keep an offset', () => {
    const local = Date.UTC(2031, 3, 12, 10);
    expect(readIsoTime('2031-04-12T10:00+02:00')).toEqual({ local, offset: 7_200_000 });
    expect(readIsoTime('2031-04-12T10:00:00.000-03:30')).toEqual({ local, offset: -12_600_000 });
  });

  it.each([
    '2031-02-29T00:00',
    '2100-02-29T00:00',
    '2031-04-31T00:00',
    '2031-13-01T00:00',
    '2031-00-01T00:00',
    '2031-01-00T00:00',
    "203'-01-01T00:00",
    '0031-01-01T00:00',
    '2031-01-01T24:00',
    '2031-01-01T00:60',
    '2031-01-01T00:00:60',
    '2031-01-01 00:00',
    '2031-01-01',
    '2031-1-1T00:00',
    '01/02/2031 00:00',
    '2031-01-01T00:00+15:00',
    '2031-01-01T00:00 ',
    '',
  ])('are refused: %j', (text) => expect(readIsoTime(text)).toBeNull());
});
