import { expect, test } from 'vitest';
import { daysChart } from '../../../src/output/charts/days-chart.ts';
import { zoneChart } from '../../../src/output/charts/zone-chart.ts';
import { fileStems } from '../../../src/output/file-stems.ts';
import { zoneFacts } from '../../../src/verdict/zone-facts.ts';
import { makeResult } from '../make-result.ts';

const { job } = makeResult();
const facts = zoneFacts(job.zones[0], job.axis, null);

test('a zone over the record is a band from each day’s coldest to its warmest value', () => {
  const { name, configuration } = zoneChart(facts, job, 'south-record');
  expect(name).toBe('south-record');
  const [low, high, swing] = configuration.data.datasets.map(({ data }) => data);
  expect(low).toHaveLength(365);
  for (const [d, { x, y }] of low.entries()) {
    const samples = job.zones[0].temperature.slice(24 * d, 24 * d + 24);
    expect(y).toBe(Math.min(...samples));
    expect(high[d].y).toBe(Math.max(...samples));
    expect(swing[d].y).toBeCloseTo(high[d].y - y, 9);
    expect(x).toBe(job.axis.times[24 * d] + 12 * 3_600_000);
  }
  const labels = configuration.options?.plugins?.directLabels?.labels as { y: number }[];
  const all = Array.from(job.zones[0].temperature);
  expect(labels.map(({ y }) => y)).toEqual([Math.max(...all), Math.min(...all)]);
});

test('the days shown are those of the warmest and coldest hour and of the largest swing', () => {
  const { configuration } = daysChart(facts, job, 'south-days');
  const [warm, cold, large] = configuration.data.datasets.map(({ data }) => data.map(({ y }) => y));
  expect(Math.max(...warm)).toBe(facts.warmest.value);
  expect(Math.min(...cold)).toBe(facts.coldest.value);
  // the midnight that ends a day is drawn too
  const day = large.slice(0, 24);
  expect(Math.max(...day) - Math.min(...day)).toBeCloseTo(facts.largestSwing!.value, 9);
  expect(configuration.data.datasets).toHaveLength(3);
});

test('names of zones make names of files, all different', () => {
  const stems = fileStems(['dark south', 'Dark/South', '東', '***', 'dark-south']);
  expect(stems).toEqual(['dark-south', 'Dark-South-2', '東', 'zone', 'dark-south-3']);
});
