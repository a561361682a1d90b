import { expect, test } from 'vitest';
import type { Check } from '../../../src/model.ts';
import { alongChart } from '../../../src/output/charts/along-chart.ts';
import type { Chart, Point } from '../../../src/output/charts/chart.ts';
import { chooseCharts } from '../../../src/output/charts/choose-charts.ts';
import { curveChart } from '../../../src/output/charts/curve-chart.ts';
import { historyChart } from '../../../src/output/charts/history-chart.ts';
import { overviewChart } from '../../../src/output/charts/overview-chart.ts';
import { makeResult } from '../make-result.ts';

const result = makeResult();
const { job, runs } = result;

const setsOf = ({ configuration }: Chart, label: string): Point[][] =>
  configuration.data.datasets.filter((set) => set.label === label).map(({ data }) => data);
const setOf = (chart: Chart, label: string): Point[] => setsOf(chart, label)[0];
const axisTitles = ({ configuration }: Chart): string[] =>
  Object.values(configuration.options?.scales ?? {}).map((scale) =>
    String((scale as { title?: { text?: string } }).title?.text ?? ''),
  );
const titleOf = ({ configuration }: Chart) => String(configuration.options?.plugins?.title?.text);
const subtitleOf = ({ configuration }: Chart) =>
  String(configuration.options?.plugins?.subtitle?.text);
const labelsOf = ({ configuration }: Chart) =>
  (configuration.options?.plugins?.directLabels?.labels ?? []).map((label) => label?.text);

test('every configuration is plain data with finite numbers', () => {
  for (const units of ['SI', 'US'] as const) {
    for (const chart of chooseCharts(makeResult({ units }), 'all')) {
      expect(JSON.parse(JSON.stringify(chart)), chart.name).toEqual(chart);
      const points = chart.configuration.data.datasets.flatMap(({ data }) => data);
      expect(points.length, chart.name).toBeGreaterThan(0);
      expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
    }
  }
});

test('governing draws one run and the overview, all draws every run, none draws nothing', () => {
  const names = (choice: 'governing' | 'all' | 'none') =>
    chooseCharts(result, choice).map(({ name }) => name);
  expect(names('governing')).toEqual(['overview', 'R2-history', 'R2-curve', 'R2-along']);
  expect(names('all')).toHaveLength(10);
  expect(names('none')).toEqual([]);
});

test('the history keeps the largest and smallest of the trace, thinned to the pixels', () => {
  const chart = historyChart(runs[1], job);
  const shear = setOf(chart, 'Shear');
  const { run } = runs[1];
  const trace = runs[1].trace();
  expect(shear.length).toBeLessThan(trace.shear.length / 4);
  expect(Math.max(...shear.map(({ y }) => y))).toBeCloseTo(Math.max(...trace.shear) / 1000, 12);
  expect(Math.min(...shear.map(({ y }) => y))).toBeCloseTo(Math.min(...trace.shear) / 1000, 12);
  const south = setOf(chart, 'south');
  expect(Math.max(...south.map(({ y }) => y))).toBe(Math.max(...run.zone.temperature));
  expect(setsOf(chart, 'deck')).toHaveLength(1);
});

test('the history names units, finding and zones', () => {
  const chart = historyChart(runs[1], job);
  expect(axisTitles(chart)).toEqual(
    expect.arrayContaining(['Temperature [°C]', 'Shear [kN]', 'Span force [kN]']),
  );
  expect(titleOf(chart)).toBe("R2/1: one fastener's shear ranges over 4.84 kN in the record");
  expect(labelsOf(chart)).toEqual(expect.arrayContaining(['member: south', 'structure: deck']));
});

test('the history of a US job is in Fahrenheit and kip', () => {
  const us = makeResult({ units: 'US' });
  const chart = historyChart(us.runs[0], us.job);
  expect(axisTitles(chart)).toEqual(
    expect.arrayContaining(['Temperature [°F]', 'Shear [kip]', 'Span force [kip]']),
  );
  // 0 °C = 32 °F and 100 °C = 212 °F, by definition.
  const hottest = Math.max(...us.runs[0].run.zone.temperature);
  const drawn = Math.max(...setOf(chart, 'south').map(({ y }) => y));
  expect(drawn).toBeCloseTo(32 + 1.8 * hottest, 9);
});

test('along a run stand every shear range, its limit and each check', () => {
  const { connections } = runs[1];
  const chart = alongChart(runs[1], job);
  expect(setOf(chart, 'shear range').map(({ y }) => y)).toEqual(
    connections.map(({ shearRange }) => shearRange / 1000),
  );
  expect(setOf(chart, 'limit of the shear range').every(({ y }) => y === 3)).toBe(true);
  expect(setOf(chart, 'fixed')).toHaveLength(21);
  expect(setOf(chart, 'peak shear').map(({ y }) => y)).toEqual(
    connections.map(
      ({ checks }) => checks.find(({ check }) => check === 'peak shear')!.utilisation,
    ),
  );
  expect(setsOf(chart, 'buckling')).toEqual([]);
  expect(axisTitles(chart)).toEqual(
    expect.arrayContaining(['Shear range [kN]', "Position from the member's left end [mm]"]),
  );
  expect(titleOf(chart)).toBe('R2: shear range fails at R2/1, 1.61 times its limit');
});

test('along a run the chart says where there is no limit and which role is which', () => {
  expect(labelsOf(alongChart(runs[2], job))).toContain('no limit was given');
  expect(labelsOf(alongChart(runs[1], job))).not.toContain('no limit was given');
  expect(subtitleOf(alongChart(runs[2], job))).toContain(
    'Filled points are fixed, open squares slotted.',
  );
  expect(subtitleOf(alongChart(runs[1], job))).not.toContain('slotted');
});

test('along a run each check has a look of its own without its colour', () => {
  const looks = alongChart(runs[2], job)
    .configuration.data.datasets.filter(({ yAxisID }) => yAxisID === 'use')
    .map((set) => `${set.pointStyle} ${set.borderDash}`);
  expect(looks.length).toBeGreaterThan(3);
  expect(new Set(looks).size).toBe(looks.length);
});

test('counted ranges stand at their factored mid-range and their cycles in the design life', () => {
  const chart = curveChart(runs[0], job);
  const drawn = [...setOf(chart, 'ranges that do damage'), ...setOf(chart, 'ranges that do none')];
  const bins = runs[0].fastenerBins.map(({ from, to, count }) => ({
    // Load factor 1 and fastener factor 1.35; 50 years of a one-year record.
    x: count * 50,
    y: (((from + to) / 2) * 1.35) / 1000,
  }));
  expect(drawn).toHaveLength(bins.length);
  for (const bin of bins) {
    expect(drawn.some(({ x, y }) => x === bin.x && Math.abs(y - bin.y) < 1e-9)).toBe(true);
  }
});

test('the drawn curve goes through the points that the user entered', () => {
  const curve = setsOf(curveChart(runs[0], job), 'curve')[0];
  for (const [cycles, range] of [
    [1e5, 10.1],
    [1e6, 6.4],
    [5e6, 4.6],
  ]) {
    const nearest = curve.find(({ y }) => Math.abs(y - range) < 1e-9)!;
    expect(nearest.x / cycles).toBeCloseTo(1, 9);
  }
  expect(curve[curve.length - 1]).toEqual({ x: 1e9, y: 4.6 });
});

test('the shares of damage add up to all of it', () => {
  const shares = setsOf(curveChart(runs[0], job), 'share of damage').map(([, end]) => end.x);
  expect(shares.length).toBeGreaterThan(3);
  expect(shares.reduce((a, b) => a + b)).toBeCloseTo(100, 9);
});

test('where no curve was given the chart says so and shows no shares', () => {
  const chart = curveChart(runs[1], job);
  expect(titleOf(chart)).toBe('R2/1: no curve was given, so damage is not judged');
  expect(labelsOf(chart)).toContain('member: no curve was given');
  expect(axisTitles(chart)).not.toContain('Share of the damage [%]');
  expect(axisTitles(chart)).toEqual(
    expect.arrayContaining(['Shear range [kN]', 'Stress range [MPa]', 'Cycles in 50 years']),
  );
});

test('the overview shows each run once, on its side of the limit', () => {
  const chart = overviewChart(result);
  const at = (label: string) => setOf(chart, label);
  expect(at('fails')).toEqual([{ x: runs[1].connections[0].governing!.utilisation, y: 1 }]);
  expect(at('ok').map(({ y }) => y)).toEqual([0, 2]);
  expect(at('ok').every(({ x }) => x <= 1)).toBe(true);
  expect(setOf(chart, 'limit').map(({ x }) => x)).toEqual([1, 1]);
  expect(titleOf(chart)).toBe('1 of 3 runs fails; R2 is used most, 1.61 times its limit');
  expect(labelsOf(chart)).toContain('shear range, R2/1, fails');
});

test('of many runs the overview shows the ones that are used most', () => {
  const many = makeResult({
    hours: 48,
    runs: Array.from({ length: 45 }, (_, i) => ({
      id: `R${i}`,
      count: 3 + i,
      shearRangeLimit: 900,
    })),
  });
  const chart = overviewChart(many);
  expect(setOf(chart, 'ok').length + setOf(chart, 'fails').length).toBe(30);
  expect(subtitleOf(chart)).toContain('30 of 45 runs');
});

test('an infinite utilisation is drawn at the edge and told in words', () => {
  const [run] = makeResult({ runs: [{ id: 'R1', count: 2, shearRangeLimit: 900 }] }).runs;
  const endless = (check: Check): Check => ({ ...check, utilisation: Infinity, status: 'fail' });
  const connections = run.connections.map((c) => ({
    ...c,
    verdict: 'fails' as const,
    governing: endless(c.governing!),
    checks: c.checks.map((check) => (check.check === 'shear range' ? endless(check) : check)),
  }));
  const odd = { ...result, runs: [{ ...run, connections }], governing: 0 };
  for (const chart of [overviewChart(odd), alongChart(odd.runs[0], job)]) {
    const points = chart.configuration.data.datasets.flatMap(({ data }) => data);
    expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
  }
  expect(titleOf(overviewChart(odd))).toContain('infinite');
});
