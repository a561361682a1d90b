import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberForm, numberReader } from '../../src/input/number-form.ts';
import { orderSaidBy, readTimeNumber, writtenTimeReader } from '../../src/input/written-time.ts';
import { zoneClock } from '../../src/input/zone-clock.ts';

const NONE = { decimal: null, thousands: null } as const;
const PLAIN = { decimal: '.', thousands: '' } as const;

describe('numbers of a record', () => {
  it('are read to the very values that the platform reads', () => {
    const read = numberReader(PLAIN);
    const number = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true }).map(String),
      fc.tuple(fc.integer(), fc.nat(9999)).map(([whole, part]) => `${whole}.${part}`),
      fc.nat({ max: 999999999 }).map((n) => `${n}.`),
      fc.nat({ max: 999999999 }).map((n) => `-.${n}`),
    );
    fc.assert(
      fc.property(number, (text) => {
        expect(read(text)).toBe(Number(text));
      }),
      { seed: 2, numRuns: 2000 },
    );
  });

  it('are read to the very values that the platform writes in other languages', () => {
    const forms = [
      { language: 'de-DE', decimal: ',', thousands: '.' },
      { language: 'fr-FR', decimal: ',', thousands: ' ' },
      { language: 'de-CH', decimal: '.', thousands: "'" },
      { language: 'en-GB', decimal: '.', thousands: ',' },
    ] as const;
    for (const { language, ...form } of forms) {
      const format = new Intl.NumberFormat(language, { maximumFractionDigits: 3 });
      const read = numberReader(form);
      fc.assert(
        fc.property(fc.integer({ min: -99_999_999, max: 99_999_999 }), (thousandths) => {
          const value = thousandths / 1000;
          expect(read(format.format(value))).toBe(value);
        }),
        { seed: 3, numRuns: 300 },
      );
    }
  });

  it.each(['', ' ', '-', '.', '1.2.3', '1,5', '0x10', 'Infinity', '1e', '--1', '1 2', 'NaN'])(
    'are not: %j',
    (text) => expect(numberReader(PLAIN)(text)).toBeNaN(),
  );

  // Worked by hand.
  it.each([
    [['12', '-3'], PLAIN],
    [['12', '1.234'], PLAIN],
    [['n/a', '12,5'], { decimal: ',', thousands: '' }],
    [['0,250'], { decimal: ',', thousands: '' }],
    [['1.234,5'], { decimal: ',', thousands: '.' }],
    [['1,234.5'], { decimal: '.', thousands: ',' }],
    [['1,250', '12.5'], { decimal: '.', thousands: ',' }],
    [['1,250', '12,5'], { decimal: ',', thousands: '' }],
    [['1.250', '12,5'], { decimal: ',', thousands: '.' }],
    [['1.250', '0.512'], PLAIN],
    [['12.250', '1.005'], PLAIN],
    [['1,234,567'], { decimal: '.', thousands: ',' }],
    [['1.234.567'], { decimal: ',', thousands: '.' }],
    [['1 250,5'], { decimal: ',', thousands: ' ' }],
    [['1’250.5'], { decimal: '.', thousands: "'" }],
  ] as const)('have their form found from %j', (samples, form) => {
    expect(numberForm(samples, NONE)).toEqual(form);
  });

  it('leave their form open where a mark may be either', () => {
    expect(numberForm(['1,250', '980'], NONE)).toEqual({ unclear: '1,250' });
    expect(numberForm(['980', '1.250'], NONE)).toEqual({ unclear: '1.250' });
    expect(numberForm(['12,5', '1,234,567'], NONE)).toHaveProperty('unclear');
    expect(numberForm(['1,250'], { ...NONE, decimal: ',' })).toMatchObject({ decimal: ',' });
  });
});

describe('written times', () => {
  const date = fc.date({
    min: new Date('2000-01-01T00:00Z'),
    max: new Date('2099-12-31T23:59Z'),
    noInvalidDate: true,
  });
  const two = (value: number) => String(value).padStart(2, '0');
  const forms = {
    'day-first': (d: Date) =>
      `${d.getUTCDate()}.${d.getUTCMonth() + 1}.${d.getUTCFullYear()} ${d.getUTCHours()}:${two(d.getUTCMinutes())}`,
    'month-first': (d: Date) =>
      `${two(d.getUTCMonth() + 1)}/${two(d.getUTCDate())}/${two(d.getUTCFullYear() % 100)} ${d.toLocaleTimeString('en-US', { timeZone: 'UTC' })}`,
    'year-first': (d: Date) => d.toISOString().slice(2, 19).replace('T', ' ').replaceAll('-', '/'),
  } as const;

  it.each(Object.keys(forms) as (keyof typeof forms)[])('agree with the platform, %s', (order) => {
    const read = writtenTimeReader(order);
    fc.assert(
      fc.property(date, (given) => {
        const size = order === 'day-first' ? 60_000 : 1000;
        const local = Math.floor(given.getTime() / size) * size;
        expect(read(forms[order](given))).toEqual({ local, offset: null });
      }),
      { seed: 4, numRuns: 500 },
    );
  });

  it('agree with the platform where the month is a name', () => {
    const read = writtenTimeReader(null);
    for (const month of ['short', 'long'] as const) {
      for (const language of ['en-GB', 'en-US']) {
        const how = { day: 'numeric', month, year: 'numeric', timeZone: 'UTC' } as const;
        for (let day = 0; day < 400; day++) {
          const local = Date.UTC(2031, 0, 1) + day * 86_400_000;
          const text = new Date(local).toLocaleDateString(language, how);
          expect(read(`${text} 00:00`)).toEqual({ local, offset: null });
        }
      }
    }
  });

  it.each([
    ['31/02/2031 10:00', 'day-first'],
    ['13/13/2031 10:00', 'day-first'],
    ['01/13/2031 10:00', 'day-first'],
    ['01/02/2031 10:00', null],
    ['01/02/31 10:00', null],
    ['01/02/231 10:00', 'day-first'],
    ['01/02/2031 13:00 PM', 'day-first'],
    ['01/02/2031 0:00 AM', 'day-first'],
    ['01/02/2031 24:01', 'day-first'],
    ['01/02/2031 10:60', 'day-first'],
    ['01/02/2031 10:00 BST', 'day-first'],
    ['1 Feb 31 10:00', null],
    ['1 Fab 2031 10:00', null],
    ['10:00', 'day-first'],
    ['', 'day-first'],
  ] as const)('are refused: %s, %s', (text, order) =>
    expect(writtenTimeReader(order)(text)).toBeNull(),
  );

  it('say what they can of their order', () => {
    const said = ['13/01/2031', '01/13/2031', '01/02/2031', '13/01/31', '2031-01-13', '1 May 2031'];
    expect(said.map(orderSaidBy)).toEqual([
      'day-first',
      'month-first',
      'either',
      'open',
      'none',
      'none',
    ]);
  });

  it('may be the day numbers of a spreadsheet', () => {
    // Open Document Format 1.2, part 2 (OpenFormula), 4.3.3: day 0 is 30 December 1899 by default (from memory).
    expect(readTimeNumber(1.5, 'spreadsheet days')?.local).toBe(Date.UTC(1899, 11, 31, 12));
    expect(readTimeNumber(Number.NaN, 'spreadsheet days')).toBeNull();
  });
});

describe("a zone's clock", () => {
  const ZONES = ['Europe/London', 'America/Denver', 'Australia/Lord_Howe', 'Asia/Tokyo', 'UTC'];

  it.each(ZONES)('agrees with what the platform shows, %s', async (zone) => {
    const clock = (await zoneClock(zone, Date.UTC(2031, 0, 1)))!;
    const format = new Intl.DateTimeFormat('sv-SE', {
      timeZone: zone,
      dateStyle: 'short',
      timeStyle: 'medium',
    });
    // The platform's own tables of time zones, every half hour of two years.
    for (let time = Date.UTC(2031, 0, 1); time < Date.UTC(2033, 0, 1); time += 1_800_000) {
      const shown = Date.parse(`${format.format(time).replace(' ', 'T')}Z`);
      const { first, second, exists } = clock.read(shown);
      if (!exists || (time + clock.standard !== first && time + clock.standard !== second)) {
        expect.fail(`${zone} ${new Date(time).toISOString()}`);
      }
    }
    expect(clock.zone).toBe(zone);
  });

  it('shows one hour twice and one never', async () => {
    const clock = (await zoneClock('Europe/London', Date.UTC(2031, 0, 1)))!;
    const twice = clock.read(Date.UTC(2031, 9, 26, 1, 30));
    expect(twice.second - twice.first).toBe(3_600_000);
    expect(clock.read(Date.UTC(2031, 2, 30, 1, 30)).exists).toBe(false);
  });

  it('is none of a zone that there is not', async () => {
    expect(await zoneClock('Europe/Londn', 0)).toBeNull();
  });
});
