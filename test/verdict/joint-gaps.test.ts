import { describe, expect, it } from 'vitest';
import type { Connection, Joint, Run } from '../../src/model.ts';
import { type JointedRun, withJointGaps } from '../../src/verdict/joint-gaps.ts';
import { screen } from '../../src/verdict/screen.ts';
import { csvRecord, jobOf } from '../support/temporary-job.ts';

/** Movements chosen so that every sum can be worked in the head; no outside source is needed. */
const END = (outward: number, inward: number) => ({
  outward: { value: outward, when: 'hot' },
  inward: { value: inward, when: 'cold' },
});

interface Ended {
  readonly gap: number | null;
  readonly joint?: Joint;
  readonly line?: string;
}

/** A run that moves 5 mm out and 3 mm in at its left, 4 mm out and 6 mm in at its right; setting tolerance 2 mm. */
function runOf({ gap, joint, line = 'south' }: Ended): JointedRun {
  const open: Joint = { cover: { kind: 'open' }, structureMovement: 0 };
  return {
    run: { id: 'R', line, gap, joint: joint ?? open, settingTolerance: 2 } as Run,
    ends: { left: END(5, 3), right: END(4, 6) },
    connections: [
      { checks: [], governing: null, verdict: 'ok', shearRange: 0 } as unknown as Connection,
    ],
    governing: 0,
  };
}

const gapCheck = (runs: readonly JointedRun[]) => withJointGaps(runs)[0].connections[0].checks[0];
const neighbour = runOf({ gap: null });

describe('a joint gap', () => {
  it('that is open must not close by both ends and the tolerance', () => {
    // 4 + 5 + 2
    expect(gapCheck([runOf({ gap: 20 }), neighbour])).toMatchObject({
      check: 'joint gap',
      demand: 11,
      limit: 20,
      status: 'pass',
      when: 'hot',
    });
    expect(gapCheck([runOf({ gap: 10 }), neighbour])).toMatchObject({ status: 'fail' });
  });

  it('takes the movement of a structural joint behind it', () => {
    const joint: Joint = { cover: { kind: 'open' }, structureMovement: 7 };
    expect(gapCheck([runOf({ gap: 20, joint }), neighbour])).toMatchObject({ demand: 18 });
  });

  it('that is lapped must not open further than its lap either', () => {
    const joint: Joint = { cover: { kind: 'lapped', lap: 10 }, structureMovement: 0 };
    // opening 6 + 3 + 2 against the lap of 10; closing 11 against 20
    expect(gapCheck([runOf({ gap: 20, joint }), neighbour])).toMatchObject({
      demand: 11,
      limit: 10,
      status: 'fail',
      when: 'cold',
    });
  });

  it('that is sealed must not strain the sealant of its narrowest setting', () => {
    const joint: Joint = { cover: { kind: 'sealed', movement: 0.5 }, structureMovement: 0 };
    // sealed at its narrowest, 60 − 11 = 49 mm wide, with 11 + 11 mm of movement before it
    expect(gapCheck([runOf({ gap: 60, joint }), neighbour])).toMatchObject({
      demand: 22,
      limit: 24.5,
      status: 'pass',
    });
    expect(gapCheck([runOf({ gap: 50, joint }), neighbour])).toMatchObject({
      demand: 22,
      limit: 19.5,
      status: 'fail',
    });
  });

  it('has its neighbour in its own line, and closes alone where there is none', () => {
    const other = runOf({ gap: null, line: 'north' });
    expect(gapCheck([runOf({ gap: 20 }), other])).toMatchObject({ demand: 6 });
    expect(gapCheck([runOf({ gap: 20 }), other, neighbour])).toMatchObject({ demand: 11 });
  });

  it('is not given between neighbours where no gap is', () => {
    const [left] = withJointGaps([runOf({ gap: null }), neighbour]);
    expect(left.connections[0].checks[0]).toMatchObject({ status: 'not given', limit: null });
  });

  it('is not checked where none is given', () => {
    expect(withJointGaps([neighbour])[0].connections[0].checks).toEqual([]);
  });
});

describe('gaps beside remedied runs', () => {
  const screened = async (lockIn: number, joint: string) => {
    const job = await jobOf({
      'record.csv': csvRecord(Date.UTC(2031, 0, 1), 168, {
        'rail [degC]': (hour) => 20 - 20 * Math.cos((2 * Math.PI * hour) / 24),
      }),
      'job.yaml': `
record: { file: record.csv }
zones: { rail: { column: rail } }
remedies: { shortest_piece: 100 m, widest_gap: 20 mm }
members: [{ id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2 }]
fasteners:
  - { id: free, stiffness: 20 kN/mm }
  - { id: pin, stiffness: 20 kN/mm, shear_range_limit: 0.1 kN, slotted_grip: 1 N }
runs:
  - { id: A, member: rail, zone: rail, fastener: free, count: 6, spacing: 600 mm, lock_in: ${lockIn} degC, line: s, gap: 2 mm${joint} }
  - { id: B, member: rail, zone: rail, fastener: pin, count: 6, spacing: 1500 mm, lock_in: ${lockIn} degC, line: s }
`,
    });
    return screen(job).runs;
  };

  it('are widened where a slotted neighbour moves further than it did tight', async () => {
    const [a, b] = await screened(0, '');
    const tight = a.connections.at(-1)!.checks.find(({ check }) => check === 'joint gap')!;
    expect(tight.status).toBe('pass');
    if (a.remedy === null || a.remedy.kind === 'rework') throw new Error('no remedy');
    if (b.remedy === null || b.remedy.kind === 'rework') throw new Error('no remedy');
    // the slotted run moves by αθ from its fixed fastener to its end, the tight one as before
    const roles = b.remedy.pieces[0].run.roles;
    const slotted = 23e-6 * 40 * 1500 * roles.indexOf('fixed');
    const closing = a.ends.right.outward.value + slotted;
    expect(a.remedy).toMatchObject({ kind: 'joints', joints: 0, endGap: Math.ceil(closing) });
    expect(a.connections.at(-1)).toMatchObject({
      verdict: 'joint',
      change: { joint: Math.ceil(closing) },
    });
    expect(a.remedy.utilisation).toBeCloseTo(closing / Math.ceil(closing), 2);
  });

  it('that no wider gap helps are to be reworked', async () => {
    // a lap lets go whatever the gap
    const [a] = await screened(40, ', joint: lapped, lap: 2 mm');
    expect(a.remedy).toMatchObject({ kind: 'rework', at: 'A/6', check: { check: 'joint gap' } });
    expect(a.connections.at(-1)!.verdict).toBe('rework');
  });
});

describe('a slotted run of which only the gap fails', () => {
  it('keeps its slots and gets a wider gap', async () => {
    const job = await jobOf({
      'record.csv': csvRecord(Date.UTC(2031, 0, 1), 48, {
        'rail [degC]': (hour) => 20 - 20 * Math.cos((2 * Math.PI * hour) / 24),
      }),
      'job.yaml': `
record: { file: record.csv }
zones: { rail: { column: rail } }
members: [{ id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2 }]
fasteners:
  - { id: pin, stiffness: 20 kN/mm }
  - { id: slot, stiffness: 20 kN/mm, free_play: 12 mm, grip: 10 N }
runs:
  - { id: A, member: rail, zone: rail, fastener: pin, slotted: slot, fixed: first, count: 6, spacing: 1500 mm, lock_in: 0 degC, gap: 2 mm }
`,
    });
    const [run] = screen(job).runs;
    if (run.remedy === null || run.remedy.kind === 'rework') throw new Error('no remedy');
    // αθL = 23e-6 × 40 × 7500 = 6.9 mm from the fixed end
    expect(run.remedy).toMatchObject({ kind: 'joints', slots: 5, endGap: 7 });
    expect(run.remedy.pieces[0].run.roles).toEqual(run.run.roles);
    expect(run.connections[5]).toMatchObject({ verdict: 'joint', change: { joint: 7 } });
  });
});
