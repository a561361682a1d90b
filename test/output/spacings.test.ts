import { fileURLToPath } from 'node:url';
import { parse } from 'csv-parse/sync';
import { beforeAll, describe, expect, it } from 'vitest';
import { readJob } from '../../src/input/job.ts';
import type { Job } from '../../src/model.ts';
import type { Chart, Point } from '../../src/output/charts/chart.ts';
import { spacingsCharts } from '../../src/output/charts/spacings-charts.ts';
import { answerText } from '../../src/output/spacings-answer-text.ts';
import { spacingsCsv } from '../../src/output/spacings-csv.ts';
import { spacingsText } from '../../src/output/spacings-text.ts';
import { spacingAnswer } from '../../src/verdict/spacing-answer.ts';
import { compareSpacings, type SpacingQuestion } from '../../src/verdict/spacings.ts';

/** Exact by definition: the inch (25.4 mm) and the pound-force (4.4482216152605 N). */
const INCH = 25.4;
const KIP = 4448.2216152605;

const QUESTION: Omit<SpacingQuestion, 'runs'> = {
  spacings: [300, 600, 1000, 1200],
  arrangements: null,
  cuts: [{ pieces: 1 }],
};

let job: Job;
beforeAll(async () => {
  job = await readJob(fileURLToPath(new URL('../jobs/spacings/job.yaml', import.meta.url)));
});

const compare = (question: Partial<SpacingQuestion> = {}, units: Job['units'] = 'SI') =>
  compareSpacings({ ...job, units }, { runs: job.runs, ...QUESTION, ...question });
const only = (...ids: string[]) => ({ runs: job.runs.filter(({ id }) => ids.includes(id)) });
const rowsOf = (text: string) => parse(text, { columns: true }) as Record<string, string>[];

describe('spacings.csv', () => {
  it('has a row for every run, arrangement, cut and spacing', () => {
    const question = {
      ...only('slide'),
      arrangements: ['all', 'middle'],
      cuts: [{ pieces: 1 }, { pieces: 2 }, { longest: 4000 }],
    } as const;
    const rows = rowsOf(spacingsCsv(compare(question)));
    expect(rows).toHaveLength(2 * 3 * 4);
    expect(new Set(rows.map((row) => `${row.fixed} ${row.pieces}`))).toEqual(
      new Set(['all 1', 'all 2', 'all 4', 'middle 1', 'middle 2', 'middle 4']),
    );
    for (const row of rows) {
      expect(Number(row['spacing [mm]'])).toBeLessThanOrEqual(Number(row['spacing_asked [mm]']));
      if (row.pieces === '4') expect(Number(row['longest_piece [mm]'])).toBeLessThanOrEqual(4000);
    }
  });

  it('says what governs, and where no limit was given nothing', () => {
    const rows = rowsOf(spacingsCsv(compare(only('row', 'bare'))));
    const [row] = rows.filter(({ run }) => run === 'row');
    expect(row).toMatchObject({
      count: '41',
      governing_check: 'shear range',
      connection: 'row/1',
      'position [mm]': '0',
      utilisation: row.shear_range_utilisation,
      yield_range_utilisation: '',
      verdict: 'ok',
    });
    expect(Number(row['shear_range_max [kN]']) / 9).toBeCloseTo(Number(row.utilisation), 6);
    const bare = rows.filter(({ run }) => run === 'bare');
    for (const one of bare) {
      expect(one).toMatchObject({
        utilisation: '',
        'life [years]': '',
        verdict: 'nothing to check',
      });
      expect(one.not_given).toContain('shear range; peak shear');
    }
    expect(bare).toHaveLength(4);
  });

  it('has the same values in US customary units', () => {
    const si = rowsOf(spacingsCsv(compare(only('row'))));
    const us = rowsOf(spacingsCsv(compare(only('row'), 'US')));
    expect(us).toHaveLength(4);
    for (const [i, row] of us.entries()) {
      const ratio = (key: string, unit: [si: string, us: string]) =>
        Number(si[i][`${key} [${unit[0]}]`]) / Number(row[`${key} [${unit[1]}]`]);
      expect(ratio('spacing', ['mm', 'in'])).toBeCloseTo(INCH, 5);
      expect(ratio('shear_range_max', ['kN', 'kip'])).toBeCloseTo(KIP / 1000, 6);
      expect(ratio('member_force_max', ['kN', 'kip'])).toBeCloseTo(KIP / 1000, 6);
      expect(row.utilisation).toBe(si[i].utilisation);
    }
  });
});

describe('the answer in words', () => {
  const wordsOf = (text: string) => text.replace(/\s+/g, ' ');

  it('names the widest that passes, what stops it, and why more fasteners hardly help', () => {
    const text = wordsOf(spacingsText(compare(only('row'))));
    expect(text).toContain('The widest that passes is 600 mm (21 fasteners)');
    expect(text).toMatch(/Beyond it, at 1,000 mm \(13 fasteners\) shear range fails, 1\.\d+ times/);
    expect(text).toMatch(/More fasteners help little: from 11 to 41 of them/);
    // √(31.5 MN · 1,200 mm / 2 kN/mm)
    expect(text).toContain('the lag length √(EA·s/k), over which the force builds up (4,347 mm');
  });

  it('says which spacing was asked for where it is another', () => {
    const text = wordsOf(spacingsText(compare({ ...only('row'), spacings: [370] })));
    expect(text).toContain('363.6 mm (34 fasteners; 370 mm asked)');
    expect(text).toContain('One number of fasteners was tried');
  });

  it('never calls a failing limit used 1 times', () => {
    const shear = compare({ ...only('row'), spacings: [300] }).cases[0].rows[0].shearRange;
    const [run] = only('row').runs;
    const fixedType = { ...run.fixedType, shearRangeLimit: shear / 1.0004 };
    const text = spacingsText(compare({ runs: [{ ...run, fixedType }], spacings: [300] }));
    expect(wordsOf(text)).toContain('shear range fails, 1.0004 times its limit');
  });

  it('lists what was not compared and what was not given', () => {
    const text = spacingsText(compare({ arrangements: ['all', 'middle'] }));
    expect(text).toContain('  - lone has one fastener, so it has no spacing.');
    expect(text).toContain('  - row, middle fixed: the job names no slotted fastener for it.');
    expect(wordsOf(spacingsText(compare(only('listed', 'row'))))).toContain(
      'listed: its fixed fasteners are given by their numbers',
    );
    expect(text).toMatch(
      /Not given, so neither passed nor failed\n(.*\n)* {2}shear range +strut, bare/,
    );
    for (const line of text.split('\n')) expect(line.length).toBeLessThanOrEqual(100);
  });

  it('names closer spacings that fail', () => {
    const [{ rows, answer, ...of }] = compare({ ...only('row'), spacings: [300, 600] }).cases;
    const [closer, wider] = rows;
    const failing = { ...closer, passes: false };
    const one = {
      ...of,
      rows: [failing, wider],
      answer: spacingAnswer([failing, wider], of.run, 'all'),
    };
    expect(one.answer).toMatchObject({ widest: wider, failingBelow: [failing], stop: null });
    expect(answerText(one, 'SI')).toContain('Closer, at 300 mm (41 fasteners) shear range fails');
    expect(answer.failingBelow).toEqual([]);
  });
});

const setOf = ({ configuration }: Chart, label: string): Point[] =>
  configuration.data.datasets.find((set) => set.label === label)?.data ?? [];

describe('charts of spacings', () => {
  it('are two a case, one where nothing is checked, plain data with finite numbers, names apart', () => {
    for (const units of ['SI', 'US'] as const) {
      const comparison = compare(
        { cuts: [{ pieces: 1 }, { pieces: 2 }, { longest: 4000 }] },
        units,
      );
      const charts = spacingsCharts(comparison);
      const unchecked = comparison.cases.filter(({ run }) => run.id === 'bare');
      expect(unchecked.length).toBeGreaterThan(0);
      expect(charts).toHaveLength(2 * comparison.cases.length - unchecked.length);
      expect(new Set(charts.map(({ name }) => name)).size).toBe(charts.length);
      for (const chart of charts) {
        expect(JSON.parse(JSON.stringify(chart)), chart.name).toEqual(chart);
        const points = chart.configuration.data.datasets.flatMap(({ data }) => data);
        expect(points.length, chart.name).toBeGreaterThan(0);
        expect(points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y))).toBe(true);
      }
    }
  });

  it('draw the utilisation of each check, and shade what passes', () => {
    const comparison = compare({ ...only('row'), spacings: [600, 720, 1000, 1010] });
    const [chart] = spacingsCharts(comparison);
    expect(chart.name).toBe('row-all-utilisation');
    // 1010 mm comes to the fasteners of 1000 mm
    const { rows } = comparison.cases[0];
    expect(setOf(chart, 'shear range')).toEqual(
      rows.slice(0, 3).map(({ spacing, worst }) => ({ x: spacing, y: worst[0].check.utilisation })),
    );
    const [from, to] = setOf(chart, 'passes').map(({ x }) => x);
    expect(from).toBeLessThan(600);
    expect(to).toBeGreaterThan(705);
    expect(to).toBeLessThan(715);
    expect(String(chart.configuration.options?.plugins?.title?.text)).toBe(
      'row, all fixed: 705.9 mm is the widest that passes; shear range stops it at 1,000 mm',
    );
  });

  it('draw shear range with its limit, and member force', () => {
    const comparison = compare(only('row'), 'US');
    const [, chart] = spacingsCharts(comparison);
    const { rows } = comparison.cases[0];
    const inKip = (force: number) => force / KIP;
    setOf(chart, 'shear range').forEach(({ x, y }, i) => {
      expect(x).toBeCloseTo(rows[i].spacing / INCH, 9);
      expect(y).toBeCloseTo(inKip(rows[i].shearRange), 9);
    });
    expect(setOf(chart, 'member force').map(({ y }) => y)).toHaveLength(4);
    expect(setOf(chart, 'limit of the shear range')[0].y).toBeCloseTo(inKip(9000), 9);
  });
});
