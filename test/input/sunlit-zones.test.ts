import { describe, expect, it } from 'vitest';
import { summary } from '../../src/output/summary/summary.ts';
import { screen } from '../../src/verdict/screen.ts';
import { csvRecord, jobOf, messagesOf, PAIR } from '../support/temporary-job.ts';

const START = Date.UTC(2031, 5, 20);
/** Light by day, falling to the level of a photocell's own error by night. */
const sunlight = (hour: number) => Math.max(-1, Math.round(900 * -Math.cos((hour / 12) * Math.PI)));
const RECORD = csvRecord(START, 72, {
  'air [degC]': (h) => 18 + (h % 24) / 4,
  'global [W/m^2]': sunlight,
  'wall [W/m^2]': (h) => (h === 30 ? '' : Math.max(0, sunlight(h) / 2)),
  'wind [m/s]': () => 2,
});
const SITE = 'site: { latitude: 45 deg, longitude: 0 deg, utc_offset: 0 h }, stamp: end';

const files = (zone: string, record = SITE, csv = RECORD) => ({
  'record.csv': csv,
  'job.yaml': `record: { file: record.csv, ${record} }\nzones: { bar: ${zone} }\n${PAIR}`,
});
const zoneOf = async (zone: string, record = SITE) => (await jobOf(files(zone, record))).zones[0];

describe('a zone in the sun', () => {
  it('with light measured on its surface is the sol-air temperature, T = T_air + a·I/h − ε·ΔR/h', async () => {
    const zone = await zoneOf(
      '{ air: air, sun: { on_surface: wall }, tilt: 0 deg, absorptance: 0.8, emissivity: 0.9, film: 20 W/m^2/K, time_constant: 0 h }',
      'stamp: instant',
    );
    const { air, irradiance } = zone.sunlit!;
    for (const hour of [0, 11, 12, 40]) {
      // ASHRAE Fundamentals: ΔR = 63 W/m² of a level surface
      const expected =
        18 + (hour % 24) / 4 + (0.8 * Math.max(0, sunlight(hour) / 2) - 0.9 * 63) / 20;
      expect(zone.temperature[hour]).toBeCloseTo(expected, 9);
      expect(air[hour]).toBe(18 + (hour % 24) / 4);
    }
    // the missing hour is a straight line, and filled
    expect(irradiance[30]).toBeCloseTo((irradiance[29] + irradiance[31]) / 2, 9);
    expect([zone.standing[29], zone.standing[30]]).toEqual([0, 1]);
  });

  it('reckons its film from the wind by EN ISO 6946, 4 + 4v + 4εσT³ (from memory)', async () => {
    const zone = await zoneOf(
      '{ air: air, sun: { on_surface: wall }, absorptance: 0.8, emissivity: 0.9, wind: wind, sky_loss: 0 W/m^2 }',
      'stamp: instant',
    );
    const air = 18 + 3;
    const film = 4 + 8 + 4 * 0.9 * 5.670374419e-8 * (air + 273.15) ** 3;
    expect(zone.temperature[12]).toBeCloseTo(air + (0.8 * 450) / film, 6);
  });

  it('of a level surface keeps the light on the horizontal, and a named surface its absorptance', async () => {
    const zone = await zoneOf(
      '{ air: air, sun: { global: global }, tilt: 0 deg, sky: isotropic, absorptance: dark surface }',
    );
    expect(zone.sunlit!.basis.absorptance).toBe(0.9);
    for (const hour of [10, 12, 14]) {
      expect(zone.sunlit!.irradiance[hour]).toBeCloseTo(sunlight(hour), 6);
    }
  });

  it('takes lag from mass, heat capacity and perimeter: m·c/(h·u)', async () => {
    const from = '{ air: air, sun: { on_surface: wall }, absorptance: 0.8';
    const store = await zoneOf(
      `${from}, mass: 6.8 kg/m, heat_capacity: 900 J/kg/K, exposed_perimeter: 200 mm }`,
    );
    // 6.8·900/(17·0.2) s = 1800 s
    const hours = await zoneOf(`${from}, time_constant: 30 min }`);
    for (const [i, value] of store.temperature.entries()) {
      expect(value).toBeCloseTo(hours.temperature[i], 9);
    }
  });

  it('under shade is never warmer, and in full shade is that of diffuse light', async () => {
    const zone = '{ air: air, sun: { global: global }, faces: 180 deg, absorptance: 0.9';
    const sunny = await zoneOf(`${zone} }`);
    const overhang = await zoneOf(`${zone}, overhang: { depth: 1 m, above: 300 mm } }`);
    const horizon = await zoneOf(`${zone}, horizon: [[0 deg, 90 deg], [180 deg, 90 deg]] }`);
    const cooler = (a: Float64Array, b: Float64Array) =>
      a.every((value, i) => value <= b[i] + 1e-9);
    expect(cooler(overhang.temperature, sunny.temperature)).toBe(true);
    expect(cooler(horizon.temperature, overhang.temperature)).toBe(true);
    expect(horizon.temperature[12]).toBeLessThan(sunny.temperature[12] - 5);
  });

  it('stays dark at night where a gap in the light spans it, and is not counted as covered there', async () => {
    const record = csvRecord(START, 72, {
      'air [degC]': () => 20,
      'global [W/m^2]': (h) => (h > 15 && h < 34 ? '' : Math.max(0, sunlight(h))),
    });
    const zone =
      '{ air: air, sun: { global: global }, tilt: 0 deg, sky: isotropic, absorptance: 1 }';
    const [bar] = (await jobOf(files(zone, SITE, record))).zones;
    const { irradiance } = bar.sunlit!;
    // at 45° N in June the sun is down from 21:00 to 03:00 at the least
    for (let hour = 22; hour <= 27; hour++) expect(irradiance[hour]).toBe(0);
    expect(irradiance[33]).toBeGreaterThan(100);
    expect(Array.from(bar.standing.slice(15, 35))).toEqual([0, ...new Array(18).fill(2), 0]);
  });

  it('says in the summary what it was reckoned from', async () => {
    const job = await jobOf(
      files(
        '{ air: air, sun: { global: global }, faces: 200 deg, absorptance: dark surface, wind: wind, overhang: { depth: 1 m, above: 300 mm } }',
      ),
    );
    const text = summary(screen(job)).replace(/\s+/g, ' ');
    for (const said of [
      'bar: air temperature from air; sun from global, parted into direct and diffuse by Erbs, at 45° N 0° E (UTC+0)',
      'facing 200°, tilt 90°, under an overhang 1,000 mm deep and 300 mm above',
      'Hay-Davies sky, ground 0.2',
      'absorptance 0.9 (dark surface)',
      'film from the wind',
      'errs to the cool side',
      'no lag',
    ]) {
      expect(text).toContain(said);
    }
  });
});

describe('a zone in the sun with faults', () => {
  it.each([
    [
      '{ air: air, absorptance: 0.9, faces: 0 deg }',
      SITE,
      /zones\.bar\.sun: nothing stands here, expected the channels of irradiance/,
    ],
    [
      '{ air: air, sun: { global: global }, absorptance: 0.9 }',
      SITE,
      /faces: nothing stands here, expected where the surface faces/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg }',
      SITE,
      /absorptance: nothing stands here/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: dark surfce }',
      SITE,
      /Did you mean "dark surface"/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1.2 }',
      SITE,
      /found "1.2", expected a number from 0 to 1/,
    ],
    [
      '{ air: global, sun: { global: global }, faces: 0 deg, absorptance: 1 }',
      SITE,
      /found "global", expected a channel of temperature/,
    ],
    [
      '{ air: air, sun: { global: air }, faces: 0 deg, absorptance: 1 }',
      SITE,
      /found "air", expected a channel of irradiance/,
    ],
    [
      '{ air: air, sun: { global: globl }, faces: 0 deg, absorptance: 1 }',
      SITE,
      /Did you mean "global"/,
    ],
    [
      '{ air: air, sun: { direct: global }, faces: 0 deg, absorptance: 1 }',
      SITE,
      /found "direct", expected global \(with direct/,
    ],
    [
      '{ air: air, sun: { on_surface: wall }, faces: 0 deg, absorptance: 1 }',
      SITE,
      /found "faces", expected no such key/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1 }',
      'stamp: end',
      /expected record\.site/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1 }',
      'site: { latitude: 45 deg, longitude: 0 deg, utc_offset: 0 h }',
      /expected record\.stamp/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1 }',
      'site: { latitude: 45 deg, longitude: 0 deg }, stamp: end',
      /how far the record's clock runs ahead of UTC/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1, film: 17 W/m^2/K, wind: wind }',
      SITE,
      /expected either film or wind/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1, mass: 2 kg/m }',
      SITE,
      /heat_capacity: nothing stands here, expected a value, since mass is given/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1, horizon: [[90 deg, 10 deg], [80 deg, 5 deg]] }',
      SITE,
      /azimuths that rise/,
    ],
    [
      '{ air: air, sun: { global: global }, faces: 0 deg, absorptance: 1, horizon: [90 deg] }',
      SITE,
      /a pair of azimuth and altitude/,
    ],
    [
      '{ column: air, tilt: 10 deg }',
      SITE,
      /found "tilt", expected no key of a zone in the sun beside column/,
    ],
    [
      '{ column: air, air: air }',
      SITE,
      /found "column and air", expected one of column, constant and air/,
    ],
    ['{ column: wind }', SITE, /found "wind", expected a channel of temperature/],
  ])('%s', async (zone, record, message) => {
    expect((await messagesOf(files(zone, record))).join('\n')).toMatch(message);
  });
});
