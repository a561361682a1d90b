import { describe, expect, it } from 'vitest';
import type { Remedy, RunResult } from '../../src/model.ts';
import { slotLength } from '../../src/output/remedies/slot-length.ts';
import { screen } from '../../src/verdict/screen.ts';
import { LONG_SLOTS_AISC, longSlotEn } from '../reference/long-slots.ts';
import { csvRecord, jobOf } from '../support/temporary-job.ts';

const START = Date.UTC(2031, 0, 1);
const [ALPHA, LOCK_IN] = [23e-6, 10];

interface Recipe {
  /** Hottest and coldest temperature [°C]. */
  readonly hot: number;
  readonly cold: number;
  readonly remedies: string;
  readonly fasteners: string;
  readonly runs: string;
  readonly expansion?: string;
}

/** A week that swings daily between two temperatures, on an aluminium rail. */
async function screened(recipe: Recipe): Promise<readonly RunResult[]> {
  const { hot, cold, remedies, fasteners, runs, expansion = `${ALPHA} / K` } = recipe;
  const middle = (hot + cold) / 2;
  const rail = (hour: number) => middle - ((hot - cold) / 2) * Math.cos((2 * Math.PI * hour) / 24);
  const job = await jobOf({
    'record.csv': csvRecord(START, 168, { 'rail [degC]': rail }),
    'job.yaml': `
record: { file: record.csv }
zones: { rail: { column: rail } }
remedies: ${remedies}
members: [{ id: rail, modulus: 70 GPa, expansion: ${expansion}, area: 450 mm^2 }]
fasteners: [${fasteners}]
runs: [${runs}]
`,
  });
  return screen(job).runs;
}

function found({ remedy }: RunResult): Remedy {
  if (remedy === null || remedy.kind === 'rework') throw new Error(`no remedy: ${remedy?.kind}`);
  return remedy;
}

/** Free play of the slots of a remedy [mm]. */
const travelOf = ({ pieces }: Remedy) =>
  Math.max(
    ...pieces.flatMap(({ run }) =>
      run.fasteners.flatMap(({ freePlay }, i) => (run.roles[i] === 'slotted' ? [freePlay] : [])),
    ),
  );

/** Only the middle fastener of nine at 600 mm may stay fixed: tight, two of them bear far too much. */
const STRICT =
  '{ id: pin, diameter: 12 mm, stiffness: 5 kN/mm, shear_range_limit: 0.1 kN, slotted_grip: 1 N }';
const NINE =
  '{ id: R, member: rail, zone: rail, fastener: pin, count: 9, spacing: 600 mm, lock_in: 10 degC';

describe('the travel of a slotted run', () => {
  it('is that of its free end, and the tolerance, rounded up', async () => {
    const [run] = await screened({
      hot: 60,
      cold: -10,
      remedies: '{ slot_step: 0.5 mm, shortest_piece: 100 m }',
      fasteners: STRICT,
      runs: `${NINE}, setting_tolerance: 1 mm }`,
    });
    const remedy = found(run);
    expect(remedy.pieces[0].run.roles.indexOf('fixed')).toBe(4);
    expect(remedy.slots).toBe(8);
    // free expansion αθL of the half run, but for 1 N of friction a slot
    const slip = ALPHA * (60 - LOCK_IN) * 2400;
    expect(remedy.pieces[0].connections[0].slipPeak).toBeCloseTo(slip, 2);
    expect(travelOf(remedy)).toBe(Math.ceil((slip + 1) / 0.5) * 0.5);
    expect(run.connections[0]).toMatchObject({ verdict: 'slot', change: { slot: 4 } });
    expect(run.connections[4]).toMatchObject({ verdict: 'ok', change: null });
  });

  it("is steel's 0.78 in for 100 ft and 100 °F", async () => {
    // common practice, no source: 6.5e-6 a °F × 1200 in × 100 °F
    const [run] = await screened({
      hot: 10 + (100 * 5) / 9,
      cold: 10,
      remedies: '{}',
      fasteners:
        '{ id: pin, stiffness: 5 kN/mm }, { id: slot, stiffness: 5 kN/mm, free_play: 1 in, grip: 1 N }',
      runs: '{ id: R, member: rail, zone: rail, fastener: pin, fixed: first, slotted: slot, count: 11, spacing: 10 ft, lock_in: 10 degC }',
      expansion: '6.5e-6 / degF',
    });
    const check = run.connections[10].checks.find((one) => one.check === 'slot travel')!;
    expect(check.demand! / 25.4).toBeCloseTo(0.78, 3);
    expect(run.ends.right.outward.value / 25.4).toBeCloseTo(0.78, 3);
  });

  it.each(LONG_SLOTS_AISC.slice(0, 3))(
    'comes in the long slot of an M%i',
    async (diameter, length) => {
      const travel = (length - diameter) / 2;
      const [run] = await screened({
        hot: 60,
        cold: -10,
        remedies: `{ slot_travels: [0.5 mm, ${travel} mm], longest_travel: 40 mm, shortest_piece: 100 m }`,
        fasteners: STRICT.replace('12 mm', `${diameter} mm`),
        runs: `${NINE} }`,
      });
      const { run: drawn } = found(run).pieces[0];
      expect(slotLength(drawn.fasteners[0])).toBeCloseTo(length, 9);
    },
  );

  it('of ±9 mm is the long slot of an M12', () => {
    const [, length] = LONG_SLOTS_AISC[0];
    expect(length).toBe(longSlotEn(12));
    expect(slotLength({ diameter: 12, freePlay: 9 } as never)).toBe(length);
  });
});

describe('a run cut in two', () => {
  it('has the gap that both halves close, and the tolerance, rounded up', async () => {
    const [run] = await screened({
      hot: 60,
      cold: -10,
      remedies: '{ longest_travel: 3 mm, shortest_piece: 2 m, gap_step: 2 mm }',
      fasteners: STRICT,
      runs: `${NINE}, count: 10, overhang: 200 mm, setting_tolerance: 0.5 mm }`.replace(
        'count: 9, ',
        '',
      ),
    });
    const remedy = found(run);
    expect(remedy).toMatchObject({ kind: 'joints', joints: 1, slots: 8 });
    const fixed = remedy.pieces.map((piece) => piece.run.roles.indexOf('fixed'));
    const lengths = remedy.pieces.map(({ run }, p) => {
      const x = Array.from(run.positions, (at) => at - run.positions[0]);
      return p === 0 ? x[4] - x[fixed[0]] + run.overhangs.right : x[fixed[1]] + run.overhangs.left;
    });
    // free expansion of either piece from its fixed point to the joint
    const closing = ALPHA * (60 - LOCK_IN) * (lengths[0] + lengths[1]) + 0.5;
    const gap = remedy.pieces[0].connections.at(-1)!.checks.find((c) => c.check === 'joint gap')!;
    expect(gap.demand).toBeCloseTo(closing, 1);
    expect(remedy.gap).toBe(Math.ceil(closing / 2) * 2);
    // the overhangs at the cut share the span less the gap
    expect(remedy.pieces[0].run.overhangs.right).toBe((600 - remedy.gap!) / 2);
    expect(run.connections.map(({ verdict }) => verdict)[4]).toBe('joint');
  });
});

describe('uneven friction', () => {
  // Five slots beside the fixed end, 2 kN each: Σ 1.5 × 2 on one side and nothing on the other; static factor 1.5.
  const uneven = (fixed: string) =>
    screened({
      hot: 40,
      cold: 0,
      remedies: '{ grip_spread: 0.5 }',
      fasteners:
        '{ id: pin, stiffness: 5 kN/mm, shear_resistance: 1 MN }, { id: slot, stiffness: 5 kN/mm, free_play: 30 mm, grip: 2 kN }',
      runs: `{ id: R, member: rail, zone: rail, fastener: pin, fixed: ${fixed}, slotted: slot, count: 6, spacing: 600 mm, lock_in: 10 degC }`,
    });

  it.each([
    // one side: 5 × 2 kN × 1.5
    ['first', 0, 15_000],
    // 3 × 2 kN × 1.5 less 2 × 2 kN × 0.5
    ['[3]', 2, 7_000],
  ])('on %s is the difference of its two sides at worst', async (fixed, at, friction) => {
    const [run] = await uneven(fixed);
    const peak = run.connections[at].checks.find(({ check }) => check === 'peak shear')!;
    expect(peak.demand).toBeCloseTo(1.5 * friction, 6);
    expect(peak.when).toBe('uneven friction');
  });
});

describe('a run that no remedy helps', () => {
  // A slipping joint cycles between plus and minus its grip: the range is 2 g, so the grip may be half the limit.
  it('says which grip would do', async () => {
    const [run] = await screened({
      hot: 60,
      cold: -10,
      remedies: '{ shortest_piece: 100 m }',
      fasteners:
        '{ id: pin, stiffness: 5 kN/mm, may_slot: false, shear_range_limit: 5 kN }, { id: slot, stiffness: 5 kN/mm, free_play: 30 mm, grip: 3 kN, shear_range_limit: 5 kN }',
      runs: `${NINE}, fixed: middle, slotted: slot }`,
    });
    if (run.remedy?.kind !== 'rework') throw new Error('a remedy was found');
    const { check, at, changes } = run.remedy;
    expect(at).toBe('R/1');
    expect(check).toMatchObject({ check: 'shear range', status: 'fail' });
    expect(check.demand).toBeCloseTo(6000, 0);
    const grip = changes.find(({ quantity }) => quantity === 'grip')!;
    expect(grip.bound).toBe('at most');
    expect(Math.abs(grip.value / 2500 - 1)).toBeLessThan(2e-3);
    expect(grip.value).toBeLessThanOrEqual(2500.001);
    const limit = changes.find(({ quantity }) => quantity === 'shear range limit')!;
    expect(limit.bound).toBe('at least');
    expect(Math.abs(limit.value / 6000 - 1)).toBeLessThan(2e-3);
    expect(run.connections[0].verdict).toBe('rework');
  });
});
