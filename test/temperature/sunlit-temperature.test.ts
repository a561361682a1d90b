import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Stamp } from '../../src/model.ts';
import { ABSORPTANCES } from '../../src/temperature/absorptance.ts';
import { ASHRAE_FILM, filmFromWind } from '../../src/temperature/film-coefficient.ts';
import { hiddenSun } from '../../src/temperature/shade.ts';
import { skyLoss } from '../../src/temperature/sky-loss.ts';
import { solAirExcess } from '../../src/temperature/sol-air.ts';
import { sunPath } from '../../src/temperature/sun-path.ts';
import { type SunlitMember, sunlitTemperature } from '../../src/temperature/sunlit-temperature.ts';
import { tiltedIrradiance } from '../../src/temperature/tilted-irradiance.ts';
import {
  CONCRETE_FILM,
  LEVEL_SKY,
  SOL_AIR_NOON,
  SURFACE_RESISTANCES,
  SURFACE_RISES,
} from '../reference/sol-air.ts';
import { axisOf, clearSky } from '../support/clear-day.ts';

const DARK: SunlitMember = { absorptance: 0.9, emissivity: 0.9, skyLoss: 0, film: 17, lag: 0 };
const STAMPS: readonly Stamp[] = ['end', 'start', 'instant'];

describe('sol-air temperature', () => {
  it.each(SOL_AIR_NOON.rows)('is as tabulated, $surface, a = $absorptance', (row) => {
    const radiation = { absorptance: row.absorptance, emissivity: 1, skyLoss: row.skyLoss };
    const solAir = SOL_AIR_NOON.air + solAirExcess(row.irradiance, SOL_AIR_NOON.film, radiation);
    expect(Math.abs(solAir - row.solAir)).toBeLessThan(SOL_AIR_NOON.tolerance);
  });

  it('loses to the sky what is tabulated: level, and upright nothing', () => {
    expect(skyLoss(0)).toBe(LEVEL_SKY.skyLoss);
    expect([skyLoss(90), skyLoss(135)]).toEqual([0, 0]);
    const radiation = { absorptance: 0.9, emissivity: 1, skyLoss: skyLoss(0) };
    // Printed to the whole degree.
    expect(
      Math.abs(solAirExcess(0, LEVEL_SKY.film, radiation) - LEVEL_SKY.correction),
    ).toBeLessThan(0.5);
  });

  it('has ASHRAE’s film coefficient in both systems', () => {
    // 1 Btu/(h·ft²·°F) = 5.678263 W/(m²·K), from 1 Btu = 1055.05585 J, 1 ft = 0.3048 m, exactly.
    const unit = 1055.05585262 / 3600 / 0.3048 ** 2 / (5 / 9);
    expect(Math.abs(SOL_AIR_NOON.film * unit - ASHRAE_FILM)).toBeLessThan(0.05);
  });
});

describe('the film coefficient from wind', () => {
  it.each(SURFACE_RESISTANCES)('is as tabulated at $wind m/s', ({ wind, resistance }) => {
    expect(Math.abs(1 / filmFromWind(wind, 0, 0.9) - resistance)).toBeLessThan(0.0051);
  });

  it('lies within what was measured on concrete from a light air to a strong wind', () => {
    for (const wind of [1.5, 3, 5, 10]) {
      expect(filmFromWind(wind, 10, 0.9)).toBeGreaterThan(CONCRETE_FILM.least);
      expect(filmFromWind(wind, 10, 0.9)).toBeLessThan(CONCRETE_FILM.most);
    }
  });
});

describe('named absorptances', () => {
  it('lie between nought and one, each with its source', () => {
    for (const { absorptance, source } of Object.values(ABSORPTANCES)) {
      expect(absorptance).toBeGreaterThan(0);
      expect(absorptance).toBeLessThan(1);
      expect(source).toMatch(/from memory|ASHRAE|common practice, no source/);
    }
  });
});

describe('a member in the sun', () => {
  const site = { latitude: 50, longitude: 0, utcOffset: 0 };
  const axis = axisOf(Date.UTC(2031, 6, 1, 1), 24);
  const air = new Float64Array(24).map((_, hour) => 18 - 8 * Math.cos((hour * Math.PI) / 12));
  const sun = sunPath(axis, site, 'end');
  const parts = clearSky(sun);
  const on = (azimuth: number, tilt = 90) =>
    tiltedIrradiance(parts, sun, { azimuth, tilt, albedo: 0.2, sky: 'Hay-Davies' });

  it('stands at air temperature less the sky’s share at night, and only then', () => {
    const member = { ...DARK, skyLoss: 63 };
    const irradiance = on(0, 0);
    const temperature = sunlitTemperature({ axis, air, irradiance, stamp: 'end' }, member);
    const nights = irradiance.reduce((count, value) => count + (value === 0 ? 1 : 0), 0);
    expect(nights).toBeGreaterThan(5);
    for (let i = 0; i < 24; i++) {
      const atNight = air[i] - (0.9 * 63) / 17;
      if (irradiance[i] === 0) expect(temperature[i]).toBeCloseTo(atNight, 12);
      else expect(temperature[i]).toBeGreaterThan(atNight);
    }
  });

  it('is never warmer in the shade', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 359, noNaN: true }),
        fc.double({ min: 0, max: 6, noNaN: true }),
        fc.constantFrom(...STAMPS),
        (azimuth, lag, stamp) => {
          const shade = {
            overhang: { depth: 1, above: 1 },
            horizon: [{ azimuth: 0, altitude: 20 }],
          };
          const surface = { azimuth, tilt: 90, albedo: 0.2, sky: 'Hay-Davies' } as const;
          const hidden = hiddenSun(sun, azimuth, shade);
          const [sunlit, shaded] = [null, hidden].map((cover) => {
            const irradiance = tiltedIrradiance(parts, sun, surface, cover);
            return sunlitTemperature({ axis, air, irradiance, stamp }, { ...DARK, lag });
          });
          for (let i = 0; i < 24; i++) expect(shaded[i]).toBeLessThanOrEqual(sunlit[i] + 1e-9);
        },
      ),
      { seed: 7, numRuns: 100 },
    );
  });

  it.each(SURFACE_RISES)(
    'rises over the air in the order of EN 1991-1-5, a = $absorptance',
    (row) => {
      const rise = (irradiance: Float64Array) =>
        sunlitTemperature(
          { axis, air, irradiance, stamp: 'end' },
          { ...DARK, absorptance: row.absorptance },
        ).map((value, i) => value - air[i]);
      const southWest = rise(on(225));
      const peak = southWest.indexOf(Math.max(...southWest));
      for (const value of [southWest[peak], Math.max(...rise(on(0, 0)))]) {
        expect(value / row.southWest).toBeGreaterThan(0.75);
        expect(value / row.southWest).toBeLessThan(1.6);
      }
      // In the hour in which the south-west is warmest the north-east has only sky and ground.
      expect(Math.abs(rise(on(45))[peak] - row.northEast)).toBeLessThan(8);
    },
  );

  it.each(STAMPS)('is unchanged where its steps are divided, stamp %s', (stamp) => {
    const irradiance = on(180);
    const parts = 10;
    const fine = axisOf(axis.times[0], 23 * parts + 1, 1 / parts);
    const straight = (column: Float64Array) =>
      fine.times.map((_, i) => {
        const before = Math.floor(i / parts);
        const share = (i % parts) / parts;
        return column[before] + (share && share * (column[before + 1] - column[before]));
      });
    // A mean of an hour is the mean of each of its parts.
    const held = fine.times.map((_, i) => {
      const hour = stamp === 'end' ? Math.ceil(i / parts) : Math.floor(i / parts);
      return irradiance[hour];
    });
    const member = { ...DARK, lag: 1.7 };
    const hourly = sunlitTemperature({ axis, air, irradiance, stamp }, member);
    const divided = sunlitTemperature(
      {
        axis: fine,
        air: straight(air),
        irradiance: stamp === 'instant' ? straight(irradiance) : held,
        stamp,
      },
      member,
    );
    for (let i = 0; i < 24; i++) expect(divided[i * parts]).toBeCloseTo(hourly[i], 9);
  });

  it('is as warm as its sol-air temperature where it has no lag', () => {
    const irradiance = on(180);
    const temperature = sunlitTemperature({ axis, air, irradiance, stamp: 'end' }, DARK);
    for (let i = 0; i < 24; i++) {
      expect(temperature[i]).toBeCloseTo(air[i] + (0.9 * irradiance[i]) / 17, 12);
    }
  });

  it('takes its lag from mass, heat capacity and perimeter, and its film from the wind', () => {
    const wind = new Float64Array(24).fill(3);
    const store = { mass: 12, heatCapacity: 480, exposedPerimeter: 400 };
    const around = {
      axis,
      air: new Float64Array(24).fill(10),
      irradiance: on(180),
      stamp: 'end',
    } as const;
    const byParts = sunlitTemperature(around, { ...DARK, film: { wind }, lag: store });
    const film = filmFromWind(3, 10, DARK.emissivity);
    const lag = (12 * 480) / (film * 0.4) / 3600;
    const byHand = sunlitTemperature(around, { ...DARK, film, lag });
    for (let i = 0; i < 24; i++) expect(byParts[i]).toBeCloseTo(byHand[i], 10);
  });
});
