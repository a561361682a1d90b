import type { Result } from '../../model.ts';
import { amount } from '../names.ts';
import { grouped, shortNumber } from '../number-text.ts';
import { bullet, wrap } from './text-layout.ts';

/** Under this many covered days a record is not called a whole year. */
const WHOLE_YEAR_DAYS = 350;

/** What the results leave out or assume, one entry a point. */
export function notes(result: Result): string[] {
  const points = [
    ...walking(result),
    ...record(result),
    ...gated(result),
    'Left out: bending of the member from fasteners off its axis.',
    'Left out: torsional, local and distortional buckling.',
    'Forces, stresses and ranges are unfactored; damage and static checks carry the factors of the job.',
  ];
  return points.map(bullet);
}

/** What reading the job warned of. */
export function warnings({ job }: Result): string[] {
  return job.warnings.map(bullet);
}

export const CAUTION = wrap(
  'This is a screening. The code in force where the structure stands and a licensed engineer decide.',
);

function walking({ job, runs }: Result): string[] {
  return runs
    .filter((run) => run.walks)
    .map(({ run, passes, driftPerYear }) => {
      const drift = amount(driftPerYear, 'length', job.units);
      return `${run.id} walks: after ${passes} passes through the record its slips still drift, by up to ${drift} a year. The drift over the design life is added to slot travel.`;
    });
}

function record({ job, runs }: Result): string[] {
  const days = Math.min(...runs.map((run) => run.coveredHours)) / 24;
  const part =
    days < WHOLE_YEAR_DAYS
      ? [`The record covers ${shortNumber(days)} days: the rest of the year is taken to be alike.`]
      : [];
  const peaks =
    job.extremes.length === 0
      ? ['No extremes were given: peak forces and slips are those of this record alone.']
      : [];
  return [...part, ...peaks];
}

function gated({ runs }: Result): string[] {
  let cycles = 0;
  let damage = 0;
  for (const { connections } of runs) {
    for (const { fastenerDamage, memberDamage } of connections) {
      cycles = Math.max(cycles, fastenerDamage.gatedCycles, memberDamage.gatedCycles);
      damage = Math.max(damage, fastenerDamage.gatedDamage, memberDamage.gatedDamage);
    }
  }
  if (cycles === 0) return [];
  return [
    `The gate dropped up to ${grouped(cycles)} cycles of a series. They would have added at most ${shortNumber(damage)} to a damage sum of the record.`,
  ];
}
