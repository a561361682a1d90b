import type { Job, Result, RunResult, WarmedRun } from '../../model.ts';
import { shortestLife } from '../life-text.ts';
import { amount, connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { runFails } from '../run-fails.ts';
import { bullet, table } from './text-layout.ts';

/** What the zones were warmed by, as a heading; blank where the job asks for none. */
export function warmingTitle({ warming, units }: Job): string {
  if (warming === null) return '';
  const { add, dailySwing } = warming;
  const parts = [
    ...(add === 0 ? [] : [`${amount(add, 'temperature difference', units)} added`]),
    ...(dailySwing === 1 ? [] : [`daily swing times ${shortNumber(dailySwing)}`]),
  ];
  return `What if: ${parts.length === 0 ? 'nothing changed' : parts.join(', ')}`;
}

/** One line a run: what governs and the shortest life, with the record as it is and in warmer zones. */
export function warmingTable({ job, runs, warmed }: Result): string[] {
  if (warmed === null) return [];
  const header = [
    'run',
    'utilisation',
    'warmer',
    'governing check, warmer',
    'at',
    'shortest life',
    'warmer',
  ];
  const rows = warmed.map((warm, r) => {
    const { connections, governing } = warm;
    return [
      warm.run.id,
      useOf(runs[r]),
      useOf(warm),
      connections[governing].governing?.check ?? 'nothing to check',
      connectionName(connections[governing]),
      shortestLife(runs[r].connections),
      shortestLife(connections),
    ];
  });
  const kept =
    job.extremes.length === 0
      ? 'Lock-in temperatures and constant zones stay as they are.'
      : 'Lock-in temperatures, constant zones and extremes stay as they are.';
  const failing = (some: readonly Pick<RunResult, 'connections'>[]) => some.filter(runFails).length;
  const count = `A check fails in ${failing(warmed)} of ${runs.length} runs in warmer zones, in ${failing(runs)} as the record is.`;
  return [table([header, ...rows], [1, 2, 5, 6]), bullet(count), bullet(kept)];
}

function useOf({ connections, governing }: Pick<WarmedRun, 'connections' | 'governing'>): string {
  return connections[governing].governing?.utilisation?.toFixed(2) ?? '';
}
