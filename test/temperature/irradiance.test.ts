import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { erbsDiffuseShare } from '../../src/temperature/erbs.ts';
import { extraterrestrialNormal } from '../../src/temperature/extraterrestrial.ts';
import { hiddenSun } from '../../src/temperature/shade.ts';
import { type SkyParts, skyParts } from '../../src/temperature/sky-parts.ts';
import { sunPath } from '../../src/temperature/sun-path.ts';
import { type Surface, tiltedIrradiance } from '../../src/temperature/tilted-irradiance.ts';
import {
  ERBS_SPLITS,
  EXTRATERRESTRIAL,
  GROUND,
  ISOTROPIC_SKY,
  TEXTBOOK_HOUR,
} from '../reference/irradiance.ts';
import { SPA_EXAMPLE } from '../reference/sun-position.ts';
import { axisOf, clearSky, stillSun } from '../support/clear-day.ts';

const DEGREE = Math.PI / 180;
const partsOf = (global: number, direct: number, diffuse: number): SkyParts => ({
  global: Float64Array.of(global),
  direct: Float64Array.of(direct),
  diffuse: Float64Array.of(diffuse),
});
const upright = (azimuth: number): Surface => ({
  azimuth,
  tilt: 90,
  albedo: 0.2,
  sky: 'isotropic',
});
const LEVEL: Surface = { azimuth: 0, tilt: 0, albedo: 0.2, sky: 'Hay-Davies' };

describe('light outside the atmosphere', () => {
  it('is as published', () => {
    const { dayOfYear, irradiance, tolerance } = EXTRATERRESTRIAL;
    expect(Math.abs(extraterrestrialNormal(dayOfYear) - irradiance)).toBeLessThan(tolerance);
  });

  it('follows the calendar over a record', () => {
    const site = { latitude: 45, longitude: 10, utcOffset: 1 };
    const sun = sunPath(axisOf(Date.UTC(2016, 9, 25, 23), 2), site, 'instant');
    expect(sun.extraterrestrial[0]).toBe(extraterrestrialNormal(299));
    expect(sun.extraterrestrial[1]).toBe(extraterrestrialNormal(300));
  });
});

describe('the split of global light', () => {
  it.each(ERBS_SPLITS)('is as published at $global W/m²', (row) => {
    const outside = extraterrestrialNormal(1);
    expect(row.global / (outside * Math.cos(row.zenith * DEGREE))).toBeCloseTo(row.clearness, 8);
    const sun = stillSun(row.zenith, 180, outside);
    const global = Float64Array.of(row.global);
    const parts = skyParts({ global, direct: null, diffuse: null }, sun)!;
    expect(parts.diffuse[0]).toBeCloseTo(row.diffuse, 5);
    expect(parts.direct[0]).toBeCloseTo(row.direct, 5);
  });

  it('agrees with the textbook', () => {
    const { global, clearness, diffuse } = TEXTBOOK_HOUR;
    expect(Math.abs(global * erbsDiffuseShare(clearness) - diffuse)).toBeLessThan(0.0015);
  });

  it('joins where its pieces meet, as closely as its published digits do', () => {
    for (const clearness of [0.22, 0.8]) {
      const gap = erbsDiffuseShare(clearness) - erbsDiffuseShare(clearness + 1e-9);
      expect(Math.abs(gap)).toBeLessThan(2e-3);
    }
  });

  it('keeps what was measured on the horizontal, hour by hour', () => {
    const sun = sunPath(
      axisOf(Date.UTC(2031, 2, 1), 72),
      { latitude: 52, longitude: 5, utcOffset: 1 },
      'end',
    );
    const reading = fc.double({ min: 0, max: 1400, noNaN: true });
    const column = fc
      .array(reading, { minLength: 72, maxLength: 72 })
      .map((values) => Float64Array.from(values));
    const maybe = fc.option(column);
    fc.assert(
      fc.property(column, maybe, fc.boolean(), (global, other, isDirect) => {
        const [direct, diffuse] = isDirect ? [other, null] : [null, other];
        const parts = skyParts({ global, direct, diffuse }, sun)!;
        const level = tiltedIrradiance(parts, sun, LEVEL);
        for (let i = 0; i < 72; i++) {
          expect(level[i]).toBeCloseTo(global[i], 9);
          expect(parts.diffuse[i]).toBeGreaterThanOrEqual(-1e-9);
          expect(parts.direct[i]).toBeLessThanOrEqual(sun.extraterrestrial[i] * sun.lit[i]);
        }
      }),
      { seed: 5, numRuns: 60 },
    );
  });

  it('leaves direct and diffuse as measured', () => {
    const sun = stillSun(60, 180, 1400);
    const measured = partsOf(500, 700, 160);
    expect(skyParts(measured, sun)).toEqual(measured);
    expect(skyParts({ ...measured, global: null }, sun)!.global[0]).toBeCloseTo(510, 9);
  });

  it('takes direct from global and diffuse, and diffuse from global and direct', () => {
    const sun = stillSun(60, 180, 1400);
    const { global, direct, diffuse } = partsOf(500, 680, 160);
    expect(skyParts({ global, direct: null, diffuse }, sun)!.direct[0]).toBeCloseTo(680, 9);
    expect(skyParts({ global, direct, diffuse: null }, sun)!.diffuse[0]).toBeCloseTo(160, 9);
  });

  it('gives an hour half lit half the light of the whole, alike in its parts', () => {
    const whole = stillSun(60, 180, 1400);
    const half = { ...whole, lit: Float64Array.of(0.5) };
    const [ofWhole, ofHalf] = [whole, half].map((sun, i) => {
      const global = Float64Array.of(i === 0 ? 500 : 250);
      const parts = skyParts({ global, direct: null, diffuse: null }, sun)!;
      const surface = { ...upright(180), sky: 'Hay-Davies' } as const;
      return { ...parts, onWall: tiltedIrradiance(parts, sun, surface) };
    });
    expect(ofHalf.direct[0]).toBeCloseTo(ofWhole.direct[0] / 2, 9);
    expect(ofHalf.diffuse[0]).toBeCloseTo(ofWhole.diffuse[0] / 2, 9);
    expect(ofHalf.onWall[0]).toBeCloseTo(ofWhole.onWall[0] / 2, 9);
  });

  it('counts all as diffuse under a sun lower than 3°', () => {
    const global = Float64Array.of(30);
    const split = (zenith: number) =>
      skyParts({ global, direct: null, diffuse: null }, stillSun(zenith, 180, 1400))!;
    expect([split(87.1).direct[0], split(87.1).diffuse[0]]).toEqual([0, 30]);
    expect(split(86.9).direct[0]).toBeGreaterThan(0);
  });

  it('is none without a measured sun', () => {
    const direct = Float64Array.of(700);
    expect(skyParts({ global: null, direct, diffuse: null }, stillSun(60, 180, 1400))).toBeNull();
  });
});

describe('light on a tilted surface', () => {
  it('comes from an equally bright sky as published', () => {
    const { tilt, diffuse, irradiance } = ISOTROPIC_SKY;
    const surface = { azimuth: 180, tilt, albedo: 0, sky: 'isotropic' } as const;
    const [onSurface] = tiltedIrradiance(
      partsOf(diffuse, 0, diffuse),
      stillSun(60, 180, 1400),
      surface,
    );
    expect(onSurface).toBeCloseTo(irradiance, 9);
  });

  it.each(GROUND)('comes from the ground as published at tilt $tilt', (row) => {
    const surface = { azimuth: 180, tilt: row.tilt, albedo: row.albedo, sky: 'isotropic' } as const;
    const [onSurface] = tiltedIrradiance(
      partsOf(row.global, 0, 0),
      stillSun(60, 180, 1400),
      surface,
    );
    // The published value of the first row holds a rounded cosine.
    expect(Math.abs(onSurface - row.irradiance)).toBeLessThan(5e-4);
  });

  it('comes from the sun at the incidence of the SPA example', () => {
    const sun = sunPath(axisOf(SPA_EXAMPLE.time, 1), SPA_EXAMPLE.site, 'instant');
    const surface = { ...SPA_EXAMPLE.surface, albedo: 0, sky: 'isotropic' } as const;
    const [onSurface] = tiltedIrradiance(partsOf(0, 1000, 0), sun, surface);
    const incidence = Math.acos(onSurface / 1000) / DEGREE;
    expect(Math.abs(incidence - SPA_EXAMPLE.incidence)).toBeLessThan(0.01);
  });

  it('agrees with the textbook’s hour, part by part', () => {
    const { latitude, declination, hourAngle, tilt, albedo } = TEXTBOOK_HOUR;
    const [phi, delta, omega] = [latitude, declination, hourAngle].map((angle) => angle * DEGREE);
    const cosZenith =
      Math.cos(phi) * Math.cos(delta) * Math.cos(omega) + Math.sin(phi) * Math.sin(delta);
    const sun = {
      east: Float64Array.of(-Math.cos(delta) * Math.sin(omega)),
      north: Float64Array.of(
        Math.cos(phi) * Math.sin(delta) - Math.sin(phi) * Math.cos(delta) * Math.cos(omega),
      ),
      up: Float64Array.of(cosZenith),
      lit: Float64Array.of(1),
      extraterrestrial: Float64Array.of(TEXTBOOK_HOUR.outside / cosZenith),
    };
    const surface = { azimuth: 180, tilt, albedo: 0, sky: 'isotropic' } as const;
    const { global, diffuse, beam } = TEXTBOOK_HOUR;
    const direct = beam / cosZenith;
    const on = (parts: SkyParts, rest: Partial<Surface> = {}) =>
      tiltedIrradiance(parts, sun, { ...surface, ...rest })[0];
    // The book carries three digits.
    const near = (value: number, printed: number) =>
      expect(Math.abs(value - printed)).toBeLessThan(0.006);
    near(on(partsOf(0, 1 / cosZenith, 0)), TEXTBOOK_HOUR.beamRatio);
    near(on(partsOf(0, direct, 0)), TEXTBOOK_HOUR.fromBeam);
    near(on(partsOf(0, 0, diffuse)), TEXTBOOK_HOUR.fromSky);
    near(on(partsOf(global, 0, 0), { albedo }), TEXTBOOK_HOUR.fromGround);
    near(on(partsOf(global, direct, diffuse), { albedo }), TEXTBOOK_HOUR.total);
    // Hay and Davies by hand from the book's figures: A = 0.244/2.34, 0.796 (A · 1.71 + (1 − A) · 0.75) = 0.6767.
    near(on(partsOf(0, direct, diffuse), { sky: 'Hay-Davies' }) - TEXTBOOK_HOUR.fromBeam, 0.6767);
  });

  it('is higher on a south wall at noon in winter than in summer at 45° N', () => {
    const noonOn = (month: number) => {
      const site = { latitude: 45, longitude: 0, utcOffset: 0 };
      const sun = sunPath(axisOf(Date.UTC(2031, month, 21, 12), 1), site, 'instant');
      return tiltedIrradiance(clearSky(sun), sun, upright(180))[0];
    };
    expect(noonOn(11)).toBeGreaterThan(noonOn(5));
  });
});

describe('shade', () => {
  const site = { latitude: 45, longitude: 0, utcOffset: 0 };
  const day = sunPath(axisOf(Date.UTC(2031, 5, 21, 1), 24), site, 'end');
  const FREE = { overhang: null, horizon: [] };

  it('never lets more light on a surface', () => {
    const angle = fc.double({ min: 0, max: 360, noNaN: true, maxExcluded: true });
    const model = fc.constantFrom('isotropic' as const, 'Hay-Davies' as const);
    fc.assert(
      fc.property(
        angle,
        fc.double({ min: 0, max: 180, noNaN: true }),
        fc.double({ min: 0, max: 60, noNaN: true }),
        model,
        (azimuth, tilt, altitude, sky) => {
          const surface = { azimuth, tilt, albedo: 0.2, sky };
          const shade = { overhang: { depth: 1, above: 2 }, horizon: [{ azimuth: 90, altitude }] };
          const parts = clearSky(day);
          const sunlit = tiltedIrradiance(parts, day, surface);
          const shaded = tiltedIrradiance(parts, day, surface, hiddenSun(day, azimuth, shade));
          for (let i = 0; i < 24; i++) expect(shaded[i]).toBeLessThanOrEqual(sunlit[i] + 1e-9);
        },
      ),
      { seed: 6, numRuns: 100 },
    );
  });

  it('of an overhang covers a sun over its edge', () => {
    // Profile angle of a sun straight in front is its altitude; the edge of this ledge stands at 60°.
    const overhang = { depth: 1, above: Math.tan(60 * DEGREE) };
    const hiddenAt = (altitude: number, sunAzimuth: number) =>
      hiddenSun(stillSun(90 - altitude, sunAzimuth, 1400), 180, { ...FREE, overhang })[0];
    expect([hiddenAt(59, 180), hiddenAt(61, 180)]).toEqual([0, 1]);
    // From 45° aside, tan(profile) = tan(altitude)/cos 45°: the edge is met at atan(√3 · cos 45°) = 50.77°.
    expect([hiddenAt(50.5, 225), hiddenAt(51, 225)]).toEqual([0, 1]);
  });

  it('of a horizon covers a sun below it, straight between its points and round the circle', () => {
    const horizon = [
      { azimuth: 90, altitude: 10 },
      { azimuth: 270, altitude: 30 },
    ];
    const hiddenAt = (altitude: number, sunAzimuth: number) =>
      hiddenSun(stillSun(90 - altitude, sunAzimuth, 1400), 180, { ...FREE, horizon })[0];
    expect([hiddenAt(9.9, 90), hiddenAt(10.1, 90)]).toEqual([1, 0]);
    expect([hiddenAt(19.9, 180), hiddenAt(20.1, 180)]).toEqual([1, 0]);
    expect([hiddenAt(24.9, 315), hiddenAt(25.1, 315)]).toEqual([1, 0]);
    expect([hiddenAt(14.9, 45), hiddenAt(15.1, 45)]).toEqual([1, 0]);
  });

  it('is nowhere at night and without an obstacle', () => {
    expect(hiddenSun(day, 180, FREE).some((hidden) => hidden === 1)).toBe(false);
    const walled = hiddenSun(day, 180, { ...FREE, horizon: [{ azimuth: 0, altitude: 89 }] });
    expect(Array.from(walled)).toEqual(Array.from(day.lit, (lit) => (lit > 0 ? 1 : 0)));
  });
});
