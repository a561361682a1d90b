import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { parse } from 'csv-parse/sync';
import { beforeAll, describe, expect, it } from 'vitest';
import { readJob } from '../../src/input/job.ts';
import type { Result } from '../../src/model.ts';
import { screen } from '../../src/verdict/screen.ts';

/**
 * A whole job on a public record: hourly temperature normals of a real city, published by a national weather service
 * and carried by the npm package vega-datasets. Every expected value is worked by hand from the record's own largest
 * and smallest temperature, read here by another parser call.
 */
const FILE = new URL(
  '../../node_modules/vega-datasets/data/seattle-weather-hourly-normals.csv',
  import.meta.url,
);
const E = 70_000;
const AREA = 450;
const ALPHA = 23e-6;
const K = 2000;

let temperatures: number[];
let result: Result;

beforeAll(async () => {
  const rows = parse(readFileSync(FILE), { columns: true }) as { temperature: string }[];
  temperatures = rows.map(({ temperature }) => Number(temperature));
  result = screen(await readJob(fileURLToPath(new URL('seattle/job.yaml', import.meta.url))));
});

const largest = () => temperatures.reduce((a, b) => Math.max(a, b));
const smallest = () => temperatures.reduce((a, b) => Math.min(a, b));
const run = (id: string) => {
  const found = result.runs.find((candidate) => candidate.run.id === id);
  if (found === undefined) throw new Error(`no run ${id}`);
  return found;
};

describe('a year of public hourly normals', () => {
  it('is read whole', () => {
    expect(temperatures).toHaveLength(8759);
    expect(result.job.axis.times).toHaveLength(8759);
    expect(run('pair').years).toBe(1);
  });

  it('gives two equal springs their closed form, N = −EAε/(1 + 2EA/(kL))', () => {
    const [first, second] = run('pair').connections;
    const share = 1 + (2 * E * AREA) / (K * 3000);
    const range = (E * AREA * ALPHA * (largest() - smallest())) / share;
    const furthest = Math.max(largest() - 10, 10 - smallest());
    for (const connection of [first, second]) {
      expect(connection.shearRange / range).toBeCloseTo(1, 9);
      expect(connection.stressRange / (range / AREA)).toBeCloseTo(1, 9);
      expect(connection.shearPeak / ((E * AREA * ALPHA * furthest) / share)).toBeCloseTo(1, 9);
    }
  });

  it('gives the end of a long row its shear lag, |N₁| = EAε·[1 − cosh((1 − n/2)φ)/cosh(nφ/2)]', () => {
    const { connections } = run('row');
    const n = 11;
    const phi = Math.acosh(1 + (K * 600) / (E * AREA) / 2);
    const share = 1 - Math.cosh((1 - n / 2) * phi) / Math.cosh((n * phi) / 2);
    const range = E * AREA * ALPHA * (largest() - smallest()) * share;
    expect(connections[0].shearRange / range).toBeCloseTo(1, 9);
    expect(connections[n - 1].shearRange / range).toBeCloseTo(1, 9);
    expect(run('row').governing).toBeOneOf([0, n - 1]);
    const limit = connections[0].checks.find(({ check }) => check === 'shear range');
    expect(limit?.utilisation).toBeCloseTo(range / 5000, 9);
  });

  it('counts a day as a cycle', () => {
    // normals are smooth: one swing a day, and the year's own
    for (const { connections } of result.runs) {
      expect(connections[0].cyclesPerYear).toBeGreaterThanOrEqual(364);
      expect(connections[0].cyclesPerYear).toBeLessThan(400);
    }
  });
});
