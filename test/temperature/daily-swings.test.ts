import { quantileSeq } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { dailySwings } from '../../src/temperature/daily-swings.ts';
import { quantile } from '../../src/temperature/quantile.ts';
import { scaleDailySwing } from '../../src/temperature/scale-daily-swing.ts';
import { axisOf } from '../support/clear-day.ts';

const DAY = 86_400_000;

describe('daily swings', () => {
  it('are those of whole days', () => {
    const start = Date.UTC(2031, 0, 1, 12);
    const axis = axisOf(start, 12 + 48 + 5);
    const temperature = axis.times.map((time) => (time / 3_600_000) % 24);
    const swings = dailySwings(axis, temperature);
    const first = Date.UTC(2031, 0, 2);
    expect(Array.from(swings.days)).toEqual([first, first + DAY]);
    expect(Array.from(swings.coldest)).toEqual([0, 0]);
    expect(Array.from(swings.warmest)).toEqual([23, 23]);
  });
});

describe('quantiles', () => {
  it('agree with mathjs', () => {
    const values = Float64Array.of(3, 9, -4, 12.5, 0, 7, 7, 1).sort();
    for (const share of [0, 0.05, 0.33, 0.5, 0.9, 1]) {
      expect(quantile(values, share)).toBeCloseTo(quantileSeq(Array.from(values), share), 12);
    }
  });
});

describe('a scaled daily swing', () => {
  const { times } = axisOf(Date.UTC(2031, 0, 1), 24 * 30 + 1);
  const daily = (hours: number) => 8 * Math.sin((2 * Math.PI * hours) / 24);
  const slow = (hours: number) => 5 + hours / 100;
  const hours = times.map((time) => (time - times[0]) / 3_600_000);

  it('leaves the season and multiplies the day', () => {
    const temperature = hours.map((hour) => slow(hour) + daily(hour));
    const scaled = scaleDailySwing(times, temperature, 1.25);
    // A sinusoid of a day and a straight line: the mean over 24 h is the line itself, half a day from either end.
    for (let i = 12; i < times.length - 12; i++) {
      expect(scaled[i]).toBeCloseTo(slow(hours[i]) + 1.25 * daily(hours[i]), 6);
    }
  });

  it('changes nothing by a factor of one, and leaves uneven steps and short records whole', () => {
    const uneven = Float64Array.of(0, 1, 5, 6, 20, 30, 49).map((hour) => hour * 3_600_000);
    const values = Float64Array.of(3, 4, 8, 2, 5, 9, 1);
    expect(Array.from(scaleDailySwing(uneven, values, 1))).toEqual(Array.from(values));
    const short = scaleDailySwing(Float64Array.of(0, 3_600_000), Float64Array.of(2, 4), 2);
    expect(Array.from(short)).toEqual([1, 5]);
    expect(Array.from(scaleDailySwing(Float64Array.of(0), Float64Array.of(7), 2))).toEqual([7]);
  });
});
