import { type StrainPath, strainPath } from '../mechanics/strain-path.ts';
import type { Job, Run } from '../model.ts';
import { coveredHours, yearsOf } from '../temperature/gaps.ts';
import { momentText } from './moment-text.ts';
import { type RunExtreme, runExtremes, runStrain } from './run-chain.ts';

/** What the record and the extremes are to one run: the same however its fasteners are arranged. */
export interface RunRecord {
  /** Mismatch strain at each sample. */
  readonly strain: Float64Array;
  readonly path: StrainPath;
  readonly extremes: readonly RunExtreme[];
  readonly coveredHours: number;
  /** Years that one pass of the record stands for. */
  readonly years: number;
  /** Largest |ε| of record and extremes. */
  readonly largestStrain: number;
  /** Whether its cycles are worth counting: a sketch has too few to do any damage. */
  readonly counted: boolean;
  /** Words for when a mark of the path was. */
  readonly when: (mark: number) => string;
}

/** What the job's record and extremes are to a run. */
export function runRecord(run: Run, job: Job): RunRecord {
  const strain = runStrain(run);
  const path = strainPath(strain);
  const extremes = runExtremes(run, job.extremes);
  const zones = run.structure === null ? [run.zone] : [run.zone, run.structure.zone];
  const hours = coveredHours(job.axis, zones);
  const reached = [...extremes.map((extreme) => extreme.strain), ...bounds(strain)];
  return {
    strain,
    path,
    extremes,
    coveredHours: hours,
    years: yearsOf(hours, job.represents),
    largestStrain: Math.max(...reached.map(Math.abs)),
    counted: true,
    when: (mark) => momentText(path, mark, job.axis.times, extremes),
  };
}

/**
 * A sketch of a record, that costs next to nothing to follow: it only goes to and fro between the record's largest and
 * smallest mismatch strain. Peaks and ranges come out near the whole record's, and no damage.
 */
export function sketchOf(record: RunRecord): RunRecord {
  const [low, high] = bounds(record.strain);
  const strain = Float64Array.of(high, low, high, low);
  return { ...record, strain, path: strainPath(strain), counted: false, when: () => '' };
}

function bounds(values: Float64Array): [number, number] {
  let low = values[0];
  let high = values[0];
  for (let i = 1; i < values.length; i++) {
    if (values[i] < low) low = values[i];
    if (values[i] > high) high = values[i];
  }
  return [low, high];
}
