import type { DamageTables } from '../damage/damage-table.ts';
import type { Job, Run } from '../model.ts';
import { assessConnections, type RunAssessment } from './assess.ts';
import { type RunRecord, runRecord, sketchOf } from './run-record.ts';

/** What a search for remedies works with. */
export interface Search {
  /** The job, with fixed fasteners checked for uneven friction. */
  readonly job: Job;
  readonly tables: DamageTables;
  /** What the record is to the run, and a sketch of it. */
  readonly record: RunRecord;
  readonly sketch: RunRecord;
}

/** The search for remedies of one run. */
export function searchFor(run: Run, job: Job, tables: DamageTables): Search {
  const record = { ...runRecord(run, job), when: () => '' };
  return { job: { ...job, unevenFriction: true }, tables, record, sketch: sketchOf(record) };
}

/** A changed run that passes every check that was given. */
export interface Candidate {
  readonly assessment: RunAssessment;
  readonly slots: number;
  /** Free play of its slots each way [mm]; 0 without one. */
  readonly travel: number;
  readonly utilisation: number;
}

/**
 * How far over a limit the rough look must find a candidate for it to be dropped unscreened. The look may be off by
 * what the small cycles between the record's hottest and coldest hour do to the slips.
 */
export const CLEARLY_OVER = 1.1;

/** Screens a changed run in full; `null` where a check fails. */
export function tryRun(run: Run, search: Search): RunAssessment | null {
  return lookAt(run, search) && screenInFull(run, search);
}

/** A rough look at a changed run; `null` where it fails a check clearly. */
export function lookAt(run: Run, { job, tables, sketch }: Search): RunAssessment | null {
  const rough = assessConnections(run, job, tables, sketch);
  const over = rough.connections.some(({ checks }) =>
    checks.some(({ status, utilisation }) => status === 'fail' && utilisation! > CLEARLY_OVER),
  );
  return over ? null : rough;
}

/** The whole assessment of a changed run; `null` where a check fails. */
export function screenInFull(run: Run, { job, tables, record }: Search): RunAssessment | null {
  const assessment = assessConnections(run, job, tables, record);
  return assessment.connections.every(({ verdict }) => verdict === 'ok') ? assessment : null;
}

/** The candidate that an assessment makes. */
export function candidateOf(assessment: RunAssessment, travel: number): Candidate {
  const slots = assessment.run.roles.filter((role) => role === 'slotted').length;
  return { assessment, slots, travel, utilisation: utilisationOf(assessment) };
}

/** Largest utilisation of any check of a run that passes or fails. */
export function utilisationOf({
  connections,
  governing,
}: Pick<RunAssessment, 'connections' | 'governing'>): number {
  return connections[governing].governing?.utilisation ?? 0;
}
