import { describe, expect, it } from 'vitest';
import { constantCurve, pointsCurve } from '../../src/damage/curve.ts';
import { cyclesToFailure, slopeAt } from '../../src/damage/cycles-to-failure.ts';
import { rangeAtCycles } from '../../src/damage/range-at-cycles.ts';
import { ADM_DETAILS } from '../reference/aluminum-design-manual.ts';
import { BHANDARI } from '../reference/miner-sums.ts';
import { built, curvesOfEveryKind, KSI, STRESS } from './built.ts';

const points = (cycles: number[], ranges: number[], traits = {}) =>
  pointsCurve({ ...STRESS, ...traits }, Float64Array.from(cycles), Float64Array.from(ranges));

describe('a curve of points', () => {
  it('is straight in log N over log S: lives of the textbook example', () => {
    const curve = built(points(BHANDARI.cycles, BHANDARI.amplitudes));
    for (const { amplitude, life } of BHANDARI.blocks) {
      expect(cyclesToFailure(curve, amplitude)).toBeCloseTo(life, 0);
    }
  });

  it('meets its points and goes on above the first with the first slope', () => {
    const curve = built(points([1e4, 1e5, 1e7], [200, 100, 50]));
    expect(cyclesToFailure(curve, 200)).toBeCloseTo(1e4, 6);
    expect(cyclesToFailure(curve, 100)).toBeCloseTo(1e5, 5);
    expect(cyclesToFailure(curve, 50)).toBeCloseTo(1e7, 3);
    expect(cyclesToFailure(curve, 400)).toBeCloseTo(1e3, 6); // twice the range, a tenth of the life
    expect(slopeAt(curve, 150)).toBeCloseTo(Math.log2(10), 12);
    expect(slopeAt(curve, 60)).toBeCloseTo(Math.log2(100), 12);
  });

  it('ends, goes on or has a threshold below the last', () => {
    const below = (rule: string, overThreshold = false) => {
      const curve = built(points([1e4, 1e5], [200, 100], { below: rule }));
      return cyclesToFailure(curve, 50, overThreshold);
    };
    expect(below('cutoff')).toBe(Number.POSITIVE_INFINITY);
    expect(below('cutoff', true)).toBe(Number.POSITIVE_INFINITY);
    expect(below('continue')).toBeCloseTo(1e6, 4);
    expect(below('threshold')).toBe(Number.POSITIVE_INFINITY);
    expect(below('threshold', true)).toBeCloseTo(1e6, 4);
  });

  it('divides its cycles by the survival divisor', () => {
    const curve = built(points([1e4, 1e5], [200, 100], { survivalDivisor: 4 }));
    expect(cyclesToFailure(curve, 200)).toBeCloseTo(2500, 8);
  });

  it('has defaults', () => {
    expect(built(points([1e4, 1e5], [200, 100]))).toMatchObject({
      below: 'cutoff',
      limitRange: 100,
      on: 'net',
      compressionShare: 1,
      survivalDivisor: 1,
      thicknessEffect: null,
    });
  });

  it.each([
    [[1e4], [200], 'at least two points, each of cycles and a range'],
    [[1e4, 1e5], [200], 'at least two points, each of cycles and a range'],
    [[1e4, 1e5], [200, 0], 'cycles and ranges over zero'],
    [[1e4, Number.NaN], [200, 100], 'cycles and ranges over zero'],
    [[1e4, 1e4], [200, 100], 'cycles that rise from point to point (point 2)'],
    [[1e4, 1e5, 1e6], [200, 100, 100], 'ranges that fall as cycles rise (point 3)'],
  ])('of %j and %j is refused', (cycles, ranges, message) => {
    expect(points(cycles, ranges)).toBe(message);
  });
});

describe('a curve of one slope', () => {
  it.each(ADM_DETAILS)('aluminium detail $detail', ({ factor, slope, limit, ranges }) => {
    const line = { constant: factor ** slope, slope, threshold: null, unit: KSI };
    const curve = built(constantCurve(STRESS, line));
    expect(Math.abs(rangeAtCycles(curve, 5e6) / KSI - limit)).toBeLessThan(0.05); // one decimal
    for (const [cycles, range] of Object.entries(ranges)) {
      expect(rangeAtCycles(curve, Number(cycles)) / KSI).toBeCloseTo(range, 2);
    }
  });

  it('goes on without a threshold and ends at one', () => {
    const line = { constant: 1e12, slope: 3, threshold: null, unit: 1 };
    expect(cyclesToFailure(built(constantCurve(STRESS, line)), 1) / 1e12).toBeCloseTo(1, 12);
    const ended = built(constantCurve(STRESS, { ...line, threshold: 50 }));
    expect(ended).toMatchObject({ below: 'threshold', limitRange: 50 });
    expect(cyclesToFailure(ended, 50)).toBeCloseTo(8e6, 4);
    expect(cyclesToFailure(ended, 49)).toBe(Number.POSITIVE_INFINITY);
    expect(cyclesToFailure(ended, 25, true)).toBeCloseTo(64e6, 3);
  });

  it('is refused where figures are missing or not over zero', () => {
    const line = { constant: 1e12, slope: 0, threshold: null, unit: 1 };
    expect(constantCurve(STRESS, line)).toBe('a constant, a slope and a threshold over zero');
    expect(constantCurve({ ...STRESS, below: 'cutoff' }, { ...line, slope: 3 })).toBe(
      'a threshold, without which nothing says where the cutoff is',
    );
  });
});

describe('the range at a number of cycles', () => {
  it('is the inverse of the cycles to failure, on every kind of curve', async () => {
    for (const [name, curve] of Object.entries(await curvesOfEveryKind())) {
      for (const range of [30, 70, 90, 119.5, 150, 300, 700]) {
        const cycles = cyclesToFailure(curve, range, true);
        if (cycles === Number.POSITIVE_INFINITY) continue;
        expect(rangeAtCycles(curve, cycles) / range, name).toBeCloseTo(1, 10);
      }
    }
  });
});
