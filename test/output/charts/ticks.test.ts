import { expect, test } from 'vitest';
import { decadeTicks, roundTicks } from '../../../src/output/charts/log-ticks.ts';
import { timeTicks } from '../../../src/output/charts/time-ticks.ts';

const day = (y: number, m: number, d: number) => Date.UTC(y, m - 1, d);
const labels = (from: number, to: number) => timeTicks(from, to).map(({ label }) => label);

test('a year has a tick a month, the first with its year', () => {
  expect(labels(day(2031, 1, 1), day(2031, 12, 31))).toEqual([
    ['Jan', '2031'],
    ...['Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'],
  ]);
});

test('a year that turns is named where it begins', () => {
  expect(labels(day(2031, 11, 15), day(2032, 8, 20))).toEqual(
    expect.arrayContaining([['Jan', '2032']]),
  );
});

test('three days have ticks at whole hours, thirty years at whole years', () => {
  expect(labels(day(2031, 3, 30), day(2031, 4, 1)).slice(0, 3)).toEqual([
    ['30 Mar', '2031'],
    '06:00',
    '12:00',
  ]);
  expect(labels(day(2001, 1, 1), day(2030, 12, 31))).toEqual([
    ...['2005', '2010', '2015', '2020', '2025', '2030'],
  ]);
});

test('ticks stay within their axis and few, however long it is', () => {
  for (const days of [0.2, 1, 3, 10, 40, 90, 200, 400, 1500, 5000, 20000]) {
    const [from, to] = [day(2003, 5, 7), day(2003, 5, 7) + days * 86_400_000];
    const ticks = timeTicks(from, to);
    expect(ticks.length, `${days} days`).toBeGreaterThan(1);
    expect(ticks.length, `${days} days`).toBeLessThanOrEqual(16);
    expect(ticks.every(({ value }) => value >= from && value <= to)).toBe(true);
  }
});

test('logarithmic ticks are powers of ten, or round numbers between them', () => {
  expect(decadeTicks(1, 1e4).map(({ label }) => label)).toEqual([
    '10⁰',
    '10¹',
    '10²',
    '10³',
    '10⁴',
  ]);
  expect(roundTicks(0.9, 60).map(({ value }) => value)).toEqual([1, 2, 5, 10, 20, 50]);
  expect(roundTicks(0.01, 3).map(({ label }) => label)).toEqual([
    '0.01',
    '0.03',
    '0.1',
    '0.3',
    '1',
    '3',
  ]);
});
