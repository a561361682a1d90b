import { describe, expect, it } from 'vitest';
import type { Site } from '../../src/model.ts';
import { type SunPath, sunPath } from '../../src/temperature/sun-path.ts';
import { SPA_DAYS, SPA_EXAMPLE, TEXTBOOK_POSITIONS } from '../reference/sun-position.ts';
import { axisOf } from '../support/clear-day.ts';

const DEGREE = Math.PI / 180;
const HOUR = 3_600_000;
/** The library leaves out the height of the place (0.004° of refraction at 1830 m) and small terms [degrees]. */
const POSITION_TOLERANCE = 0.01;

const altitude = ({ up }: SunPath, i = 0) => Math.asin(up[i]) / DEGREE;
const azimuth = ({ east, north }: SunPath, i = 0) =>
  (Math.atan2(east[i], north[i]) / DEGREE + 360) % 360;
const at = (time: number, site: Site) => sunPath(axisOf(time, 1), site, 'instant');

describe('the sun', () => {
  it('stands where the SPA example has it', () => {
    const sun = at(SPA_EXAMPLE.time, SPA_EXAMPLE.site);
    expect(Math.abs(90 - altitude(sun) - SPA_EXAMPLE.apparentZenith)).toBeLessThan(
      POSITION_TOLERANCE,
    );
    expect(Math.abs(azimuth(sun) - SPA_EXAMPLE.azimuth)).toBeLessThan(POSITION_TOLERANCE);
    expect(Math.hypot(sun.east[0], sun.north[0], sun.up[0])).toBeCloseTo(1, 14);
  });

  it.each(SPA_DAYS)('rises, crosses the south and sets on $name as SPA has it', (day) => {
    expect(Math.abs(azimuth(at(day.transit, SPA_EXAMPLE.site)) - 180)).toBeLessThan(0.02);
    for (const time of [day.sunrise, day.sunset]) {
      // The upper limb on the horizon puts the centre 0.2667° below it; refraction there is known to 0.1°.
      expect(Math.abs(altitude(at(time, SPA_EXAMPLE.site)) + 0.2667)).toBeLessThan(0.1);
    }
  });

  it.each(TEXTBOOK_POSITIONS)('stands near the textbook’s $zenith°, $azimuth°', (row) => {
    const site = { latitude: row.latitude, longitude: 0, utcOffset: 0 };
    const minutes = sunPath(axisOf(row.day + 11 * HOUR, 120, 1 / 60), site, 'instant');
    const noon = row.day + 11 * HOUR + minutes.east.findIndex((east) => east < 0) * 60_000;
    const sun = at(noon + row.fromNoon * HOUR, site);
    expect(Math.abs(90 - altitude(sun) - row.zenith)).toBeLessThan(1);
    expect(Math.abs(azimuth(sun) - row.azimuth)).toBeLessThan(1);
  });
});

describe('an interval’s sun', () => {
  const { site } = SPA_EXAMPLE;
  const [winter] = SPA_DAYS;
  const midnight = Date.UTC(2015, 0, 2);

  it('is that of its middle, wherever its stamp stands', () => {
    const middle = at(midnight + 11.5 * HOUR, site);
    const ending = sunPath(axisOf(midnight + 12 * HOUR, 1), site, 'end');
    const starting = sunPath(axisOf(midnight + 11 * HOUR, 1), site, 'start');
    for (const sun of [ending, starting]) {
      expect(azimuth(sun)).toBeCloseTo(azimuth(middle), 9);
      expect(altitude(sun)).toBeCloseTo(altitude(middle), 9);
      expect(sun.lit[0]).toBe(1);
    }
  });

  it('at sunrise and sunset is that of its lit part', () => {
    const hours = sunPath(axisOf(midnight + HOUR, 24), site, 'end');
    const [rise, set] = [7, 16];
    const afterRise = (midnight + 8 * HOUR - winter.sunrise) / HOUR;
    const beforeSet = (winter.sunset - midnight - 16 * HOUR) / HOUR;
    // The centre of the sun comes some two minutes after its upper limb.
    expect(Math.abs(hours.lit[rise] - afterRise)).toBeLessThan(0.05);
    expect(Math.abs(hours.lit[set] - beforeSet)).toBeLessThan(0.05);
    expect(hours.up[rise]).toBeGreaterThan(0);
    expect(azimuth(hours, rise)).toBeCloseTo(
      azimuth(at(midnight + (8 - hours.lit[rise] / 2) * HOUR, site)),
      9,
    );
    expect(Array.from(hours.lit, Math.ceil)).toEqual([
      ...Array(7).fill(0),
      ...Array(10).fill(1),
      ...Array(7).fill(0),
    ]);
  });

  it('gives a day as long as that between sunrise and sunset', () => {
    const hours = sunPath(axisOf(midnight + HOUR, 24), site, 'end');
    const dayLength = (winter.sunset - winter.sunrise) / HOUR;
    expect(Math.abs(hours.lit.reduce((sum, lit) => sum + lit) - dayLength)).toBeLessThan(0.1);
  });
});
