import type { DamageTables } from '../damage/damage-table.ts';
import { rangeBins } from '../damage/range-bins.ts';
import type { Chain } from '../mechanics/chain.ts';
import { followRecord, type History, type PassCounter } from '../mechanics/history.ts';
import { traceConnection } from '../mechanics/trace.ts';
import type { FilledShare, Job, Run, RunResult, Trace, YearDamage } from '../model.ts';
import { scaledFrom } from '../temperature/short-season.ts';
import { assessConnection, fastenerSpectrum, fastenerUse } from './connection.ts';
import { extremesCycle } from './extremes-cycle.ts';
import { filledShares } from './filled-shares.ts';
import { governingConnection } from './governing-connection.ts';
import { createPassCounters } from './pass-counters.ts';
import { runChain } from './run-chain.ts';
import { type RunRecord, runRecord } from './run-record.ts';
import type { RunScene } from './run-scene.ts';
import { assessSpan, memberUse, type SpanLoad, spanSpectrum, worseSpan } from './span-load.ts';
import { yearByYear } from './year-by-year.ts';

const UNCOUNTED: PassCounter = { begin() {}, take() {} };

/** A force under this share of EA times the largest strain is rounding. */
const NOISE = 1e-9;

/** A run's demands, checks and verdicts, without the bins and the trace that only tables and charts show. */
export interface RunAssessment
  extends Omit<
    RunResult,
    'fastenerBins' | 'memberBins' | 'trace' | 'yearByYear' | 'filledShares' | 'remedy'
  > {
  /** All that the record does to the run. */
  readonly history: History;
}

/**
 * Takes one run through mechanics, counting, damage and checks, and adds the counted ranges in bins and the trace of
 * its governing connection.
 *
 * @param run the run
 * @param job limits, counting settings, extremes and the record's axis
 * @param tables damage tables shared by all runs of the job
 */
export function assessRun(run: Run, job: Job, tables: DamageTables): RunResult {
  const { assessment, scene, spans, chain, record } = followRun(run, job, tables);
  const { history: _, ...facts } = assessment;
  const { governing } = facts;
  let trace: Trace | null = null;
  let years: readonly YearDamage[] | null = null;
  let shares: readonly FilledShare[] | null = null;
  return {
    ...facts,
    ...binsOf(scene, spans, governing),
    remedy: null,
    trace: () => {
      trace ??= traceOf(chain, record.strain, scene, spans, governing);
      return trace;
    },
    yearByYear: () => {
      years ??= yearByYear(scene, chain, record.path);
      return years;
    },
    filledShares: () => {
      shares ??= filledShares(scene, spans, facts.connections, { chain, path: record.path });
      return shares;
    },
  };
}

/**
 * Takes one run through mechanics, counting, damage and checks: the light form of `assessRun`, with the same values,
 * for comparing many changed runs.
 *
 * @param run the run
 * @param job limits, counting settings, extremes and the record's axis
 * @param tables damage tables shared by all runs of the job
 * @param record what the record is to the run, where it is known already
 */
export function assessConnections(
  run: Run,
  job: Job,
  tables: DamageTables,
  record?: RunRecord,
): RunAssessment {
  return followRun(run, job, tables, record).assessment;
}

/** An assessment and what it was made from. */
interface FollowedRun {
  readonly assessment: RunAssessment;
  readonly scene: RunScene;
  readonly spans: readonly SpanLoad[];
  readonly chain: Chain;
  readonly record: RunRecord;
}

function followRun(
  run: Run,
  job: Job,
  tables: DamageTables,
  record = runRecord(run, job),
): FollowedRun {
  const chain = runChain(run);
  const counters = createPassCounters(chain.count, run.member.curve?.compressionShare ?? 1);
  const options = {
    extremes: record.extremes.map((extreme) => extreme.strain),
    residue: job.counting.residue,
  };
  const history = followRecord(chain, record.path, options, record.counted ? counters : UNCOUNTED);
  const noise = NOISE * chain.axialStiffness * record.largestStrain;
  const { years, coveredHours, when } = record;
  const cycle = wantsExtremesCycle(job, record) ? extremesCycle(run, record.extremes) : null;
  const scene: RunScene = {
    run,
    job,
    tables,
    history,
    counters,
    years,
    coveredHours,
    extremesCycle: cycle,
    noise,
    when,
  };
  const spans = counters.spans.map((_, j) => assessSpan(scene, j));
  return { assessment: assessmentOf(scene, spans), scene, spans, chain, record };
}

/** A record of less than a year does not hold the year's own swing. */
function wantsExtremesCycle({ counting }: Job, record: RunRecord): boolean {
  const { extremesCycle: wanted } = counting;
  return wanted === 'yes' || (wanted === 'short' && scaledFrom(record) !== null);
}

function assessmentOf(scene: RunScene, spans: readonly SpanLoad[]): RunAssessment {
  const { run, history, years, coveredHours, extremesCycle: cycle } = scene;
  const connections = run.roles.map((_, i) => assessConnection(scene, spans, i));
  return {
    run,
    history,
    passes: history.passes,
    walks: history.walks,
    driftPerYear: history.walks ? largest(history.drift) / years : 0,
    years,
    coveredHours,
    extremesCycle: cycle === null ? null : { hot: cycle.hot, cold: cycle.cold },
    connections,
    ends: endsOf(scene),
    governing: governingConnection(connections),
    largestSpanForce: Math.max(
      largest(history.countedSpans.max),
      largest(history.countedSpans.min),
    ),
  };
}

function endsOf({ history: { allEnds }, when }: RunScene): RunResult['ends'] {
  const { max, maxMark, min, minMark } = allEnds;
  const right = (i: number) => ({ value: Math.max(0, max[i]), when: when(maxMark[i]) });
  const left = (i: number) => ({ value: Math.max(0, -min[i]), when: when(minMark[i]) });
  return {
    left: { outward: left(0), inward: right(0) },
    right: { outward: right(1), inward: left(1) },
  };
}

function binsOf(
  scene: RunScene,
  spans: readonly SpanLoad[],
  i: number,
): Pick<RunResult, 'fastenerBins' | 'memberBins'> {
  const span = worseSpan(spans, i);
  return {
    fastenerBins: rangeBins(fastenerSpectrum(scene, i), fastenerUse(scene, i)),
    memberBins: span === null ? [] : rangeBins(spanSpectrum(scene, span.index), memberUse(scene)),
  };
}

function traceOf(
  chain: Chain,
  strain: Float64Array,
  scene: RunScene,
  spans: readonly SpanLoad[],
  i: number,
): Trace {
  const { shear, spanForce, slip } = traceConnection(
    chain,
    strain,
    i,
    worseSpan(spans, i)?.index ?? -1,
  );
  const { perConnection } = scene.run.fasteners[i];
  return { shear: shear.map((f) => f / perConnection), spanForce, slip };
}

function largest(values: Float64Array): number {
  return values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
}
