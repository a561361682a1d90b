import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import { readJob } from '../../src/input/job.ts';
import { bucklingResistance } from '../../src/mechanics/buckling.ts';
import type { CheckName, Job, Run } from '../../src/model.ts';
import { type Arrangement, arrangementOf } from '../../src/verdict/arrangement.ts';
import { assessRun } from '../../src/verdict/assess.ts';
import { type Cut, evenPieces } from '../../src/verdict/even-pieces.ts';
import type { SpacingRow } from '../../src/verdict/spacing-row.ts';
import { compareSpacings, type SpacingCase } from '../../src/verdict/spacings.ts';

const EA = 70_000 * 450;
const ALPHA = 23e-6;
const K = 2000;
/** Of the record, which ends where it began or colder; the extreme is hotter than both [K]. */
const RANGE = 55 - -10;
const FURTHEST = 70 - 15;

const WHOLE: Cut = { pieces: 1 };
const SPACINGS = [300, 400, 500, 600, 700, 800, 900, 1000, 1100, 1200];

let job: Job;
beforeAll(async () => {
  job = await readJob(fileURLToPath(new URL('../jobs/spacings/job.yaml', import.meta.url)));
});

const runOf = (id: string): Run => {
  const found = job.runs.find((run) => run.id === id);
  if (found === undefined) throw new Error(`no run ${id}`);
  return found;
};
interface Asked {
  readonly spacings?: readonly number[];
  readonly arrangements?: readonly Arrangement[];
  readonly cuts?: readonly Cut[];
}
const compare = (id: string, asked: Asked = {}) =>
  compareSpacings(job, {
    runs: [runOf(id)],
    spacings: asked.spacings ?? SPACINGS,
    arrangements: asked.arrangements ?? null,
    cuts: asked.cuts ?? [WHOLE],
  });
const caseOf = (id: string, asked: Asked = {}): SpacingCase => {
  const { cases } = compare(id, asked);
  expect(cases).toHaveLength(1);
  return cases[0];
};
const useOf = ({ worst }: SpacingRow, name: CheckName) =>
  worst.find(({ check }) => check.check === name)?.check.utilisation ?? null;

/**
 * Force of the end and of the middle span of n equal elastic fasteners at spacing s, over EAε: 1 − cosh((j − n/2)φ) /
 * cosh(nφ/2), cosh φ = 1 + ks/(2EA): the closed form of the difference equation of a uniform row with free ends
 * (Volkersen's shear lag at discrete fasteners; derivation, no source).
 */
function rowShares(count: number, spacing: number) {
  const phi = Math.acosh(1 + (K * spacing) / EA / 2);
  const share = (j: number) => 1 - Math.cosh((j - count / 2) * phi) / Math.cosh((count * phi) / 2);
  return { end: share(1), middle: share(Math.floor(count / 2)) };
}

describe('a row of tight elastic fasteners at each spacing', () => {
  it('keeps its fastened length, evenly and never wider than asked', () => {
    const { rows } = caseOf('row');
    expect(rows.map(({ asked }) => asked)).toEqual(SPACINGS);
    for (const { asked, spacing, count } of rows) {
      expect(spacing).toBeLessThanOrEqual(asked * (1 + 1e-12));
      expect(spacing * (count - 1)).toBeCloseTo(12_000, 6);
      // one fastener fewer would be too wide
      expect(12_000 / (count - 2)).toBeGreaterThan(asked);
    }
    expect(rows.map(({ count }) => count)).toEqual([41, 31, 25, 21, 19, 16, 15, 13, 12, 11]);
  });

  it('has the shear range and the member force of the closed form', () => {
    for (const { spacing, count, shearRange, memberForce, worst } of caseOf('row').rows) {
      const { end, middle } = rowShares(count, spacing);
      const range = EA * ALPHA * RANGE * end;
      expect(shearRange / range).toBeCloseTo(1, 9);
      expect(memberForce / (EA * ALPHA * FURTHEST * middle)).toBeCloseTo(1, 9);
      const [check] = worst;
      expect(check.check.check).toBe('shear range');
      expect(check.check.utilisation).toBeCloseTo(range / 9000, 9);
      expect(check.connection.number).toBe(1);
    }
  });

  it('takes more shear and less force the wider its spacing', () => {
    const { rows } = caseOf('row');
    for (let i = 1; i < rows.length; i++) {
      expect(rows[i].shearRange).toBeGreaterThan(rows[i - 1].shearRange);
      expect(rows[i].memberForce).toBeLessThan(rows[i - 1].memberForce);
    }
  });

  it('passes up to the last spacing whose closed form is within the limit', () => {
    const within = (spacing: number) => {
      const spans = Math.ceil(12_000 / spacing);
      return EA * ALPHA * RANGE * rowShares(spans + 1, 12_000 / spans).end <= 9000;
    };
    const passing = SPACINGS.filter(within);
    expect(passing.length).toBeGreaterThan(0);
    expect(passing.length).toBeLessThan(SPACINGS.length);
    const { answer, rows } = caseOf('row');
    expect(rows.filter(({ passes }) => passes).map(({ asked }) => asked)).toEqual(passing);
    expect(answer.widest?.asked).toBe(passing[passing.length - 1]);
    expect(answer.stop?.asked).toBe(SPACINGS[passing.length]);
    expect(answer.stop?.governing?.check.check).toBe('shear range');
    expect(answer.failingBelow).toEqual([]);
  });

  it('is at its own spacing what screening the run gives', () => {
    for (const id of ['row', 'slide', 'clamp', 'strut']) {
      const [row] = caseOf(id, { spacings: [600] }).rows;
      const screened = assessRun(runOf(id), job, createDamageTables());
      const governing = screened.connections[screened.governing];
      expect(row.count).toBe(screened.connections.length);
      expect(row.shearRange).toBe(Math.max(...screened.connections.map((c) => c.shearRange)));
      expect(row.governing?.check.check).toBe(governing.governing?.check);
      expect(row.governing?.check.utilisation).toBe(governing.governing?.utilisation);
      for (const { check } of row.worst) {
        const uses = screened.connections.flatMap(({ checks }) =>
          checks.filter((one) => one.check === check.check).map((one) => one.utilisation ?? 0),
        );
        expect(check.utilisation).toBe(Math.max(...uses));
      }
    }
  });

  it('is the same at spacings that come to the same number of fasteners', () => {
    const { rows, answer } = caseOf('short', { spacings: [300, 350, 420, 450] });
    expect(rows.map(({ count }) => count)).toEqual([4, 4, 4, 3]);
    expect(rows[1]).toEqual({ ...rows[0], asked: 350 });
    expect(answer.widest?.asked).toBe(450);
  });

  it('is made even where it was not', () => {
    const [row] = caseOf('uneven', { spacings: [800] }).rows;
    expect(row).toMatchObject({ count: 4, spacing: 800, pieces: 1 });
    const range = EA * ALPHA * RANGE * rowShares(4, 800).end;
    expect(row.shearRange / range).toBeCloseTo(1, 9);
  });
});

describe('pieces between joints', () => {
  it('are rows of their own, by the closed form of the longest', () => {
    for (const pieces of [1, 2, 3, 5]) {
      const [row] = caseOf('row', { spacings: [600], cuts: [{ pieces }] }).rows;
      expect(row).toMatchObject({ pieces, count: 21 });
      const count = Math.ceil(21 / pieces);
      const range = EA * ALPHA * RANGE * rowShares(count, 600).end;
      expect(row.shearRange / range).toBeCloseTo(1, 9);
    }
  });

  it('overhang a cut by half a span and are as equal as fasteners allow', () => {
    const even = evenPieces(runOf('row'), 600, 'all', { pieces: 3 });
    expect(even?.runs.map(({ id }) => id)).toEqual(['row.1', 'row.2', 'row.3']);
    expect(even?.runs.map(({ positions }) => positions.length)).toEqual([7, 7, 7]);
    expect(even?.runs.map(({ overhangs }) => overhangs)).toEqual([
      { left: 150, right: 300 },
      { left: 300, right: 300 },
      { left: 300, right: 150 },
    ]);
    expect(even?.longest).toBe(6 * 600 + 2 * 300);
  });

  it('are as few as keep them no longer than asked', () => {
    for (const longest of [12_300, 12_000, 6300, 5000, 3300]) {
      const even = evenPieces(runOf('row'), 600, 'all', { longest });
      if (even === null) throw new Error('no pieces');
      expect(even.longest).toBeLessThanOrEqual(longest);
      if (even.runs.length === 1) continue;
      const fewer = evenPieces(runOf('row'), 600, 'all', { pieces: even.runs.length - 1 });
      expect(fewer?.longest).toBeGreaterThan(longest);
    }
  });

  it('have a fixed point each', () => {
    const even = evenPieces(runOf('slide'), 600, 'middle', { pieces: 3 });
    for (const { roles } of even?.runs ?? []) {
      expect(roles.indexOf('fixed')).toBe(3);
      expect(roles.lastIndexOf('fixed')).toBe(3);
    }
    expect(even?.runs).toHaveLength(3);
  });

  it('need two fasteners each', () => {
    const { cases, notCompared } = compare('short', {
      spacings: [150, 300, 450],
      cuts: [{ pieces: 2 }],
    });
    expect(cases[0].rows.map(({ asked }) => asked)).toEqual([150, 300]);
    expect(notCompared).toEqual([
      {
        run: runOf('short'),
        why: 'too few fasteners for the pieces',
        cut: { pieces: 2 },
        spacings: [450],
      },
    ]);
    expect(evenPieces(runOf('short'), 300, 'all', { longest: 100 })).toBeNull();
  });
});

describe('other arrangements', () => {
  it('let the end of a slotted run travel αθL/2, or αθL from the first fastener', () => {
    const { cases } = compare('slide', {
      spacings: [600, 1200],
      arrangements: ['middle', 'first'],
    });
    expect(cases.map(({ arrangement }) => arrangement)).toEqual(['middle', 'first']);
    // a grip of 1 N squeezes the member by less than a thousandth of its free movement
    const free = ALPHA * FURTHEST * 6000;
    for (const row of cases[0].rows) {
      // slot 10 mm each way, set up to 1 mm off its centre
      expect(((useOf(row, 'slot travel') ?? 0) * 10 - 1) / free).toBeCloseTo(1, 3);
      expect(row.passes).toBe(true);
    }
    // 15 mm are not to be had
    for (const row of cases[1].rows) {
      expect(useOf(row, 'slot travel')).toBeCloseTo(1.1, 9);
      expect(row.passes).toBe(false);
    }
  });

  it('are read from the roles of a run', () => {
    expect(arrangementOf(runOf('row'))).toBe('all');
    expect(arrangementOf(runOf('slide'))).toBe('middle');
    expect(arrangementOf(runOf('listed'))).toBeNull();
    const slide = runOf('slide');
    for (const arrangement of ['first', 'middle', 'none'] as const) {
      const even = evenPieces(slide, 600, arrangement, WHOLE);
      if (even === null) throw new Error('no pieces');
      expect(arrangementOf(even.runs[0])).toBe(arrangement);
    }
    // on two fasteners the middle one is the first
    const two = evenPieces(slide, 12_000, 'middle', WHOLE);
    expect(two === null ? null : arrangementOf(two.runs[0])).toBe('first');
  });

  it('are named where they cannot be tried', () => {
    expect(compare('listed')).toMatchObject({
      cases: [],
      notCompared: [{ run: { id: 'listed' }, why: 'fixed by numbers' }],
    });
    expect(compare('lone')).toMatchObject({
      cases: [],
      notCompared: [{ run: { id: 'lone' }, why: 'one fastener' }],
    });
    const { cases, notCompared } = compare('row', { arrangements: ['all', 'middle'] });
    expect(cases.map(({ arrangement }) => arrangement)).toEqual(['all']);
    expect(notCompared).toMatchObject([{ why: 'no slotted fastener', arrangement: 'middle' }]);
    expect(compare('listed', { arrangements: ['first'] }).cases).toHaveLength(1);
  });
});

describe('what more fasteners do', () => {
  it('is little for a long elastic row: its end shear goes with the root of the spacing', () => {
    const { answer, rows } = caseOf('long', { spacings: [150, 600] });
    const [help] = answer.helps;
    expect(help).toMatchObject({ check: 'shear range', effect: 'little' });
    // k·ε·√(EA·s/k), the continuous row (Volkersen 1938, from memory), is the limit of close fasteners
    expect(rows[0].shearRange / (ALPHA * RANGE * Math.sqrt(EA * 150 * K))).toBeCloseTo(1, 1);
    expect(rows[1].shearRange / rows[0].shearRange).toBeLessThan(2);
    expect(rows[1].shearRange / rows[0].shearRange).toBeGreaterThan(1.8);
    if (help?.reason?.why !== 'shear lag') throw new Error('no shear lag');
    expect(help.reason.closeLag).toBeCloseTo(Math.sqrt((EA * 150) / K), 9);
    expect(help.reason.wideLag).toBeCloseTo(2 * help.reason.closeLag, 9);
    expect(help.reason.halfLength).toBe(30_000);
  });

  it('is nothing for a short one: its ends move almost freely', () => {
    const [help] = caseOf('short', { spacings: [90, 300] }).answer.helps;
    expect(help?.effect).toBe('none');
    expect(help?.reason).toMatchObject({ why: 'shear lag', halfLength: 450 });
    // k·ε·L/2, the shear of a fastener at the end of a member that nothing holds
    const free = K * ALPHA * RANGE * 450;
    for (const row of [help?.few, help?.many]) {
      expect((row?.shearRange ?? 0) / free).toBeGreaterThan(0.9);
      expect((row?.shearRange ?? 0) / free).toBeLessThan(1);
    }
  });

  it('is nothing where rigid ends hold the whole run, EAε', () => {
    const { answer, rows } = caseOf('stiff', { spacings: [300, 600, 1200] });
    for (const row of rows) {
      // rigid is a million times the stiffest span
      expect(row.shearRange / (EA * ALPHA * RANGE)).toBeCloseTo(1, 5);
    }
    expect(answer.widest).toBeNull();
    expect(answer.helps[0]).toMatchObject({ effect: 'none', reason: { why: 'rigid fasteners' } });
  });

  it('is nothing where joints slip both ways: twice the grip', () => {
    const { answer, rows } = caseOf('clamp', { spacings: [300, 600] });
    for (const row of rows) expect(row.shearRange).toBeCloseTo(1000, 2);
    expect(answer.helps[0]).toMatchObject({
      effect: 'none',
      reason: { why: 'slips both ways', grip: 500, throughout: true },
    });
  });

  it('is nothing for the travel of a slot', () => {
    const { helps } = caseOf('slide', { arrangements: ['first'], spacings: [300, 600] }).answer;
    const [help] = helps;
    expect(help).toMatchObject({
      check: 'slot travel',
      effect: 'none',
      reason: { why: 'travel from the fixed point' },
    });
  });

  it('is much where a slender span buckles', () => {
    const { answer, rows } = caseOf('strut');
    for (const row of rows) {
      const strut = {
        modulus: 70_000,
        yield: 160,
        area: 450,
        inertia: 12_000,
        length: row.spacing,
      };
      const rule = { rule: 'EN', imperfection: 0.2, plateau: 0.1 } as const;
      const demand = 1.5 * row.memberForce;
      const use = demand / bucklingResistance(strut, rule);
      expect(useOf(row, 'buckling')).toBeCloseTo(use, 9);
    }
    expect(answer.helps[0]).toMatchObject({ check: 'buckling', effect: 'much', reason: null });
  });

  it('is told of every check that governs where nothing passes', () => {
    // a shear range that even a close row exceeds, and a member that buckles between wide ones
    const strut = runOf('strut');
    const fixedType = { ...strut.fixedType, shearRangeLimit: 4000 };
    const runs = [{ ...strut, fixedType }];
    const question = { runs, spacings: [150, 1200], arrangements: null, cuts: [WHOLE] };
    const { answer, rows } = compareSpacings(job, question).cases[0];
    const governing = rows.map((row) => row.governing?.check);
    expect(governing.map((check) => check?.check)).toEqual(['shear range', 'buckling']);
    expect(governing[0]?.utilisation).toBeGreaterThan(1);
    expect(answer.nearest).toBe(rows[0]);
    expect(answer.others).toEqual([rows[1]]);
    expect(answer.helps.map(({ check }) => check)).toEqual(['shear range', 'buckling']);
  });

  it('is not said of a run that nothing is given for', () => {
    const { answer, rows } = caseOf('bare');
    expect(answer).toEqual({
      widest: null,
      failingBelow: [],
      stop: null,
      nearest: null,
      others: [],
      helps: [],
    });
    for (const { passes, governing, notGiven } of rows) {
      expect(passes).toBeNull();
      expect(governing).toBeNull();
      expect(notGiven).toContain('shear range');
    }
  });
});
