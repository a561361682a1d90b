import type { DamageTables } from '../damage/damage-table.ts';
import type { Job, Run, WarmedRun, Warming, Zone } from '../model.ts';
import { scaleDailySwing } from '../temperature/scale-daily-swing.ts';
import { assessConnections } from './assess.ts';
import { withJointGaps } from './joint-gaps.ts';

/**
 * Every run of a job in warmer zones: their daily swing scaled, then the same added to every temperature. Constant
 * zones, lock-in temperatures and extremes stay as they are.
 *
 * @param tables damage tables shared by all runs of the job
 * @returns the runs in the job's order; `null` where the job asks for no warming
 */
export function warmedRuns(job: Job, tables: DamageTables): WarmedRun[] | null {
  const { warming, axis } = job;
  if (warming === null) return null;
  const warmed = new Map(job.zones.map((zone) => [zone, warmedZone(zone, axis.times, warming)]));
  const inWarmth = (zone: Zone) => warmed.get(zone) ?? warmedZone(zone, axis.times, warming);
  const runs = job.runs.map((run): Run => {
    const { structure } = run;
    return {
      ...run,
      zone: inWarmth(run.zone),
      structure: structure === null ? null : { ...structure, zone: inWarmth(structure.zone) },
    };
  });
  return withJointGaps(runs.map((run) => assessConnections(run, job, tables)));
}

function warmedZone(zone: Zone, times: Float64Array, { add, dailySwing }: Warming): Zone {
  if (zone.constant) return zone;
  const scaled =
    dailySwing === 1 ? zone.temperature : scaleDailySwing(times, zone.temperature, dailySwing);
  return { ...zone, temperature: scaled.map((value) => value + add) };
}
