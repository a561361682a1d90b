import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sunlitTemperature } from '../../src/temperature/sunlit-temperature.ts';
import { lagStep, timeConstant } from '../../src/temperature/thermal-lag.ts';
import { axisOf } from '../support/clear-day.ts';

/** A member in air alone. */
const follow = (air: Float64Array, stepHours: number, lag: number): Float64Array => {
  const irradiance = new Float64Array(air.length);
  const member = { absorptance: 0.5, emissivity: 0.9, skyLoss: 0, film: 17, lag };
  return sunlitTemperature(
    { axis: axisOf(0, air.length, stepHours), air, irradiance, stamp: 'instant' },
    member,
  );
};

describe('thermal lag', () => {
  it('answers a step by 1 − e^(−t/τ)', () => {
    for (const [time, constant] of [
      [0.5, 2],
      [2, 2],
      [6, 2],
      [1, 0.05],
    ]) {
      const expected = 10 + 20 * (1 - Math.exp(-time / constant));
      expect(lagStep(10, 30, 30, time / constant)).toBeCloseTo(expected, 12);
    }
  });

  it('follows a ramp a time constant behind it', () => {
    // Settled answer to f = rt is r(t − τ).
    expect(lagStep(-2, 0, 5, 5 / 2)).toBeCloseTo(5 - 2, 12);
  });

  it('without heat capacity is where it strives to be, and in no time stays', () => {
    expect(lagStep(-40, 3, 8, Number.POSITIVE_INFINITY)).toBe(8);
    expect(lagStep(7, 3, 8, 0)).toBe(7);
  });

  it('answers a sinusoid by 1/√(1 + ω²τ²), atan(ωτ)/ω late', () => {
    const omega = (2 * Math.PI) / 24;
    const step = 1 / 20;
    for (const constant of [0.5, 2, 6]) {
      const air = new Float64Array(20 * 24 * 6).map((_, i) => Math.sin(omega * i * step));
      const temperature = follow(air, step, constant);
      const amplitude = 1 / Math.hypot(1, omega * constant);
      const delay = Math.atan(omega * constant) / omega;
      // The last day: the start has died away by e^(−120/6). Straight steps of 3 min bend by 1e-4.
      for (let i = air.length - 480; i < air.length; i++) {
        const exact = amplitude * Math.sin(omega * (i * step - delay));
        expect(Math.abs(temperature[i] - exact)).toBeLessThan(3e-5);
      }
    }
  });

  it('is unchanged where a step is halved', () => {
    const value = fc.double({ min: -40, max: 80, noNaN: true });
    fc.assert(
      fc.property(
        value,
        value,
        value,
        fc.double({ min: 1e-6, max: 50, noNaN: true }),
        (start, from, to, step) => {
          const middle = (from + to) / 2;
          const halfway = lagStep(start, from, middle, step / 2);
          expect(lagStep(halfway, middle, to, step / 2)).toBeCloseTo(
            lagStep(start, from, to, step),
            9,
          );
        },
      ),
      { seed: 8, numRuns: 300 },
    );
  });

  it('has the time constant of its heat balance', () => {
    // By hand: 15.7 kg/m × 480 J/(kg·K) / (17 W/(m²·K) × 0.5 m) = 886.6 s.
    const store = { mass: 15.7, heatCapacity: 480, exposedPerimeter: 500 };
    expect(timeConstant(store, 17)).toBeCloseTo(886.588 / 3600, 6);
  });
});
