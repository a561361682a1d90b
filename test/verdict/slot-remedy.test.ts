import { describe, expect, it } from 'vitest';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import type { Job, Role, Run } from '../../src/model.ts';
import { assessConnections } from '../../src/verdict/assess.ts';
import { withRoles } from '../../src/verdict/changed-run.ts';
import { screen } from '../../src/verdict/screen.ts';
import { drawnTravel, slotType } from '../../src/verdict/slot-type.ts';
import { randomJobFiles } from '../support/random-job.ts';
import { jobOf } from '../support/temporary-job.ts';

/** What the brute force finds: fewest slots, and of as few the shortest free play [mm]. */
interface Fewest {
  readonly slots: number;
  readonly travel: number;
}

/** Every set of fixed fasteners but the empty one, screened in full, without a look beforehand or a clever order. */
function bruteForce(run: Run, job: Job): Fewest | null {
  const tables = createDamageTables();
  const uneven = { ...job, unevenFriction: true };
  const count = run.roles.length;
  let fewest: Fewest | null = null;
  for (let set = 1; set < 2 ** count; set++) {
    const roles = Array.from(
      { length: count },
      (_, i): Role => (set & (1 << i) ? 'fixed' : 'slotted'),
    );
    const slots = roles.filter((role) => role === 'slotted').length;
    const assess = (travel: number) =>
      assessConnections(withRoles(run, roles, slotType(run, travel, job.remedies)), uneven, tables)
        .connections;
    // so long that no bolt bears at the end of its slot
    const ample = assess(3 * job.remedies.longestTravel);
    if (ample.some(({ verdict }) => verdict !== 'ok')) continue;
    const slips = ample.map(({ role, slipPeak }) => (role === 'slotted' ? slipPeak : 0));
    const needed = slots === 0 ? 0 : Math.max(...slips) + run.settingTolerance;
    const travel = slots === 0 ? 0 : drawnTravel(needed, job.remedies);
    if (travel === null || (slots > 0 && assess(travel).some(({ verdict }) => verdict !== 'ok'))) {
      continue;
    }
    const better =
      fewest === null || slots < fewest.slots || (slots === fewest.slots && travel < fewest.travel);
    if (better) fewest = { slots, travel };
  }
  return fewest;
}

describe('the fewest slots', () => {
  it('are no more than any set of fixed fasteners needs', { timeout: 120_000 }, async () => {
    const found = { remedies: 0, reworks: 0 };
    for (let seed = 1; seed <= 16; seed++) {
      const recipe = { most: 8, runs: 1, shortestPiece: 1e6 };
      const job = await jobOf(randomJobFiles(seed, recipe));
      const [{ run, remedy }] = screen(job).runs;
      if (remedy === null) continue;
      const fewest = bruteForce(run, job);
      if (remedy.kind === 'rework') {
        expect(fewest, `seed ${seed}`).toBeNull();
        found.reworks++;
      } else {
        const [{ run: drawn }] = remedy.pieces;
        const slotted = drawn.fasteners.filter((_, i) => drawn.roles[i] === 'slotted');
        const travel = Math.max(0, ...slotted.map(({ freePlay }) => freePlay));
        expect({ slots: remedy.slots, travel }, `seed ${seed}`).toEqual(fewest);
        found.remedies++;
      }
    }
    // the seeds hold both
    expect(found.remedies).toBeGreaterThan(5);
    expect(found.reworks).toBeGreaterThan(0);
  });
});
