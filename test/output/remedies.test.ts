import { parse } from 'csv-parse/sync';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Remedy, Result } from '../../src/model.ts';
import { drawingChart } from '../../src/output/charts/drawing-chart.ts';
import { renderPngs } from '../../src/output/png.ts';
import { changeWords } from '../../src/output/remedies/remedy-words.ts';
import { remediesCsv } from '../../src/output/remedies-csv.ts';
import { resultsCsv } from '../../src/output/results-csv.ts';
import { summary } from '../../src/output/summary/summary.ts';
import { screen } from '../../src/verdict/screen.ts';
import { csvRecord, jobOf } from '../support/temporary-job.ts';

/** Four runs: one that is slotted, one that is cut, one that buckles, one that nothing helps. */
const JOB = (units: string) => `
units: ${units}
record: { file: record.csv }
zones: { rail: { column: rail } }
remedies: { longest_travel: 3 mm, shortest_piece: 1.5 m, closest_spacing: 200 mm }
members:
  - { id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2 }
  - { id: strip, modulus: 70 GPa, expansion: 23e-6 / K, area: 120 mm^2, inertia: 90 mm^4, yield: 160 MPa, buckling: EN, buckling_imperfection: 0.34, buckling_plateau: 0.2 }
fasteners:
  - { id: pin, diameter: 12 mm, stiffness: 5 kN/mm, shear_range_limit: 0.1 kN, slotted_grip: 1 N }
  - { id: bare, stiffness: 5 kN/mm, shear_range_limit: 0.5 kN }
  - { id: screw, diameter: 5 mm, stiffness: 3 kN/mm, slotted_grip: 150 N }
  - { id: hard, stiffness: 5 kN/mm, shear_range_limit: 5 kN, may_slot: false }
  - { id: tight slot, stiffness: 5 kN/mm, free_play: 3 mm, grip: 3 kN, shear_range_limit: 5 kN }
runs:
  - { id: S, member: rail, zone: rail, fastener: bare, count: 3, spacing: 600 mm, lock_in: 10 degC }
  - { id: C, member: rail, zone: rail, fastener: pin, count: 10, spacing: 600 mm, lock_in: 10 degC, overhang: 100 mm }
  - { id: B, member: strip, zone: rail, fastener: screw, count: 5, spacing: 400 mm, lock_in: 10 degC }
  - { id: N, member: rail, zone: rail, fastener: hard, slotted: tight slot, fixed: [2], count: 3, spacing: 700 mm, lock_in: 10 degC }
`;

const RECORD = csvRecord(Date.UTC(2031, 0, 1), 168, {
  'rail [degC]': (hour) => 25 - 35 * Math.cos((2 * Math.PI * hour) / 24),
});

const screened = async (units: 'SI' | 'US') =>
  screen(await jobOf({ 'record.csv': RECORD, 'job.yaml': JOB(units) }));

let si: Result;
let us: Result;
beforeAll(async () => {
  si = await screened('SI');
  us = await screened('US');
});

const rowsOf = (result: Result): Record<string, string>[] =>
  parse(remediesCsv(result)!, { columns: true });

function found(result: Result, id: string): Remedy {
  const remedy = result.runs.find(({ run }) => run.id === id)?.remedy;
  if (!remedy || remedy.kind === 'rework') throw new Error(`${id}: no remedy`);
  return remedy;
}

describe('remedies.csv', () => {
  it('has a row for each run to be changed, and one for each piece of a cut one', () => {
    const rows = rowsOf(si);
    expect(rows.map(({ run, piece, remedy }) => [run, piece, remedy])).toEqual([
      ['S', '', 'slots'],
      ['C', '', 'joints'],
      ['C', 'C.1', 'joints'],
      ['C', 'C.2', 'joints'],
      ['B', '', 'spacing'],
      ['N', '', 'rework'],
    ]);
  });

  it('holds what the remedies hold, in either system of units', () => {
    for (const [result, unit, size] of [
      [si, 'mm', 1],
      [us, 'in', 25.4],
    ] as const) {
      const rows = rowsOf(result);
      const cut = found(result, 'C');
      const [whole, left] = rows.filter(({ run }) => run === 'C');
      expect(Number(whole[`gap [${unit}]`]) * size).toBeCloseTo(cut.gap!, 5);
      expect(Number(whole.slots)).toBe(cut.slots);
      expect(Number(whole.joints)).toBe(1);
      expect(Number(whole.utilisation)).toBeCloseTo(cut.utilisation, 7);
      expect(Number(whole.utilisation_before)).toBeCloseTo(cut.utilisationBefore, 5);
      expect(Number(left.fasteners)).toBe(5);
      const slot = cut.pieces[0].run.fasteners[0];
      // d + 2 · free play
      expect(Number(left[`slot_length [${unit}]`]) * size).toBeCloseTo(12 + 2 * slot.freePlay, 5);
      expect(Number(left[`free_play [${unit}]`]) * size).toBeCloseTo(slot.freePlay, 5);
      expect(Number(left.joint_gap_utilisation)).toBeLessThanOrEqual(1);
    }
  });

  it('leaves out the length of a slot whose bolt has no diameter', () => {
    const [row] = rowsOf(si);
    expect(row['free_play [mm]']).not.toBe('');
    expect(row['slot_length [mm]']).toBe('');
  });

  it('is not written where nothing is to be done', () => {
    expect(
      remediesCsv({ ...si, runs: si.runs.map((run) => ({ ...run, remedy: null })) }),
    ).toBeNull();
  });
});

describe('results.csv', () => {
  it('says at each connection what to do', () => {
    const rows: Record<string, string>[] = parse(resultsCsv(si), { columns: true });
    const verdicts = (id: string) => rows.filter(({ run }) => run === id).map((row) => row.verdict);
    expect(verdicts('C')[4]).toBe('joint');
    expect(rows.find(({ run, connection }) => run === 'C' && connection === '5')?.remedy).toContain(
      `joint of ${found(si, 'C').gap} mm to the right`,
    );
    expect(new Set(verdicts('C'))).toEqual(new Set(['ok', 'slot', 'joint']));
    expect(verdicts('B')).toContain('rework');
    expect(verdicts('N')).toEqual(['rework', 'ok', 'rework']);
  });
});

describe('the summary', () => {
  it('says what to draw, and what the remedies assume', () => {
    const text = summary(si).replace(/\s+/g, ' ');
    const uses = ({ utilisationBefore, utilisation }: Remedy) =>
      [utilisationBefore, utilisation].map((use) => String(Number(use.toPrecision(3))));
    const [before, after] = uses(found(si, 'C'));
    expect(text).toContain(
      `C: one joint of ${found(si, 'C').gap} mm between C/5 and C/6, slot 8 of 10 fasteners`,
    );
    expect(text).toContain(`utilisation ${before} → ${after}`);
    expect(text).toMatch(/B: (\d+) fasteners at [\d.]+ mm in place of 5 fasteners at 400 mm/);
    expect(text).toContain(
      'A changed drawing passes for 3 of them, see below. N must be reworked.',
    );
    expect(text).toContain(
      'No grip in a slot was given for bare: such slots were taken as frictionless but for 1 N.',
    );
    expect(text).toContain('Grips may lie 50 % above or below their value');
    expect(text).toContain('No slot longer than ±3 mm, no piece shorter than 1,500 mm');
  });

  it('says what stays in the way, and which single change would pass, to the safe side', () => {
    const text = summary(si).replace(/\s+/g, ' ');
    expect(text).toMatch(/N: rework\. .*shear range at N\/1 stays 1\.\d+ times its limit/);
    expect(text).toMatch(/grip at most (0|1|2)\.\d+ kN/);
    const change = { quantity: 'grip', bound: 'at most', value: 2528.1 } as const;
    expect(changeWords(change, 'SI')).toBe('grip at most 2.52 kN');
    expect(changeWords({ ...change, bound: 'at least' }, 'SI')).toBe('grip at least 2.53 kN');
    expect(changeWords({ ...change, quantity: 'member area', value: 1234.5 }, 'SI')).toBe(
      'member area at most 1230 mm^2',
    );
  });

  it('proposes nothing where no remedy was looked for', async () => {
    const job = await jobOf({ 'record.csv': RECORD, 'job.yaml': JOB('SI') });
    const text = summary(screen(job, { remedies: false }));
    expect(text).not.toContain('What to do');
    expect(text).not.toContain('What the remedies assume');
  });
});

describe('the drawing of a run', () => {
  const drawn = (result: Result, id: string) => {
    const run = result.runs.find((one) => one.run.id === id)!;
    return drawingChart(run, found(result, id), result.job);
  };

  it('is to scale: members, fasteners and roles lie where the runs have them', () => {
    const { configuration, name } = drawn(si, 'C');
    expect(name).toBe('C-drawing');
    const [before, after] = configuration.options!.plugins!.drawingMarks!.runs!;
    const run = si.job.runs.find(({ id }) => id === 'C')!;
    expect(before!.pieces).toMatchObject([{ from: -100, to: 5500 }]);
    expect(before!.pieces![0]!.fasteners!.map((one) => one!.x)).toEqual([...run.positions]);
    const pieces = found(si, 'C').pieces;
    expect(after!.pieces!.map((piece) => piece!.fasteners!.map((one) => one!.role))).toEqual(
      pieces.map((piece) => piece.run.roles),
    );
    // the gap lies between the two pieces
    const [left, right] = after!.pieces!;
    expect(right!.from! - left!.to!).toBeCloseTo(found(si, 'C').gap!, 9);
  });

  it('shows the utilisation of every connection', () => {
    const { configuration } = drawn(si, 'C');
    const lines = configuration.data.datasets.filter(({ data }) => data.length > 2);
    const remedy = found(si, 'C');
    const run = si.runs.find((one) => one.run.id === 'C')!;
    const top = (configuration.options!.scales!.afterUse as { max: number }).max;
    const uses = [run, ...remedy.pieces].map(({ connections }) =>
      connections.map(({ position, governing }) => ({
        x: position,
        y: Math.min(top, Math.max(0.05, governing!.utilisation!)),
      })),
    );
    expect(lines.map(({ data }) => data)).toEqual(uses);
  });

  it.each(['S', 'C', 'B'])('of %s is a picture', (id) => {
    for (const result of [si, us]) {
      const [{ content }] = renderPngs([drawn(result, id)]);
      const png = Buffer.from(content);
      expect([png.readUInt32BE(16), png.readUInt32BE(20)]).toEqual([1200, 675]);
      expect(png.length).toBeGreaterThan(20_000);
    }
  });
});
