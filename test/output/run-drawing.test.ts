import { describe, expect, it } from 'vitest';
import type { Run } from '../../src/model.ts';
import { runDrawing } from '../../src/output/run-drawing.ts';

/** A run of these positions, fixed where a letter is an f. */
function draw(
  positions: readonly number[],
  roles: string,
  ends: readonly [number, number],
): string {
  const run = {
    positions: Float64Array.from(positions),
    roles: [...roles].map((role) => (role === 'f' ? 'fixed' : 'slotted')),
    overhangs: { left: ends[0], right: ends[1] },
  };
  return runDrawing(run as unknown as Run, 41);
}

const even = (count: number, spacing: number) =>
  Array.from({ length: count }, (_, i) => i * spacing);

describe('a run in one line', () => {
  it('is to scale', () => {
    expect(draw([0, 600, 1200], 'sfs', [150, 150])).toBe('─○───■───○─');
    expect(draw([100, 500, 1300], 'fff', [100, 0])).toBe('─■───■───────■');
    expect(draw(even(11, 600), 'fffffffffff', [0, 0])).toMatch(/^■(?:─{2}■){10}$/);
  });

  it('is no longer than asked, however many fasteners there are', () => {
    for (const count of [1, 2, 12, 41, 42, 150, 500]) {
      for (const overhang of [0, 5000]) {
        const line = draw(even(count, 100), 's'.repeat(count), [overhang, overhang]);
        expect(line.length).toBeLessThanOrEqual(41);
        expect(line).toContain('○');
      }
    }
  });

  it('shows a fixed fastener among slotted ones that fall on the same character', () => {
    const roles = `${'s'.repeat(250)}f${'s'.repeat(249)}`;
    expect(draw(even(500, 100), roles, [0, 0]).match(/■/g)).toHaveLength(1);
  });

  it('draws a single fastener', () => expect(draw([0], 'f', [0, 0])).toBe('■'));
});
