import type { Result } from '../../model.ts';
import { scaledFrom } from '../../temperature/short-season.ts';
import { amount, runNames } from '../names.ts';
import { grouped, shortNumber } from '../number-text.ts';
import { bullet, wrap } from './text-layout.ts';

/** What the results leave out or assume, one entry a point. */
export function notes(result: Result): string[] {
  const points = [
    ...walking(result),
    ...record(result),
    ...gated(result),
    ...unevenFriction(result),
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
  const days = scaledFrom(...runs);
  const part =
    days === null
      ? []
      : [
          `The record covers ${shortNumber(days)} days: damage a year and lives are scaled from them, and the rest of the year is taken to be alike.`,
        ];
  const peaks =
    job.extremes.length === 0
      ? ['No extremes were given: peak forces and slips are those of this record alone.']
      : extremesCycleLines({ job, runs });
  return [...part, ...peaks];
}

/** Whether the damage holds a cycle a year between the extremes; nothing to say where no run has two. */
function extremesCycleLines({ job, runs }: Pick<Result, 'job' | 'runs'>): string[] {
  const { extremesCycle: wanted } = job.counting;
  if (wanted === 'no' || (wanted === 'short' && scaledFrom(...runs) === null)) {
    const why = wanted === 'no' ? 'is off' : 'adds one to seasons short of a year only';
    return [
      `Extremes are for peaks and slips only. The damage holds no cycle between them: counting.extremes_cycle ${why}.`,
    ];
  }
  const pairs = new Map<string, string[]>();
  for (const { run, extremesCycle: cycle } of runs) {
    const text =
      cycle === null
        ? 'No cycle between extremes was added, since fewer than two concern'
        : `One cycle a year between the extremes ${cycle.hot} and ${cycle.cold} is added to the damage of`;
    pairs.set(text, [...(pairs.get(text) ?? []), run.id]);
  }
  return [...pairs].map(([text, ids]) => `${text} ${runNames(ids, runs.length)}.`);
}

/** Slots whose fixed fasteners were not checked for what grips may differ by. */
function unevenFriction({ job, runs }: Result): string[] {
  const mixed = runs.filter(({ run: { roles } }) => new Set(roles).size > 1);
  if (job.unevenFriction || mixed.length === 0) return [];
  const ids = runNames(
    mixed.map(({ run }) => run.id),
    runs.length,
  );
  return [
    `Left out: uneven friction of the slots on the fixed fasteners of ${ids}; give remedies.grip_spread to have it checked. Remedies are always checked for it.`,
  ];
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
