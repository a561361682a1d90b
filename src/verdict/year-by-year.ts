import { minerDamage } from '../damage/miner.ts';
import type { Chain } from '../mechanics/chain.ts';
import { followRecord, type PassCounter } from '../mechanics/history.ts';
import type { StrainPath } from '../mechanics/strain-path.ts';
import type { RecordAxis, YearDamage, Zone } from '../model.ts';
import { coveredHours, yearsOf } from '../temperature/gaps.ts';
import { type RecordYear, recordYears } from '../temperature/record-years.ts';
import { fastenerSpectrum, fastenerUse, lifeOf } from './connection.ts';
import { createPassCounters } from './pass-counters.ts';
import type { RunScene } from './run-scene.ts';
import { memberUse, spanSpectrum } from './span-load.ts';

/** Marks this close below a sample are at it. */
const ROUNDING = 1e-9;

/**
 * Damage of each year of a record as if it stood alone: the forces of the counted pass, cut at the anniversaries of the
 * first sample, and each part counted as a record of its own. A year's large swing between winter and summer counts in
 * every year, so the years do not add up to the whole.
 *
 * @param scene the run with the years and the counters of the whole record
 * @returns none where the record is of one year or less
 */
export function yearByYear(scene: RunScene, chain: Chain, path: StrainPath): YearDamage[] {
  const { run, job } = scene;
  const zones = run.structure === null ? [run.zone] : [run.zone, run.structure.zone];
  const years = recordYears(job.axis.times);
  if (years.length < 2) return [];
  const counters = createPassCounters(chain.count, run.member.curve?.compressionShare ?? 1);
  const found: YearDamage[] = [];
  const splitter = splitPass({
    years,
    path,
    count: chain.count,
    counters,
    begin: () => found.splice(0),
    end: (year) => found.push(damageOfYear({ ...scene, counters }, year, zones)),
  });
  followRecord(chain, path, { extremes: [], residue: job.counting.residue }, splitter);
  splitter.finish();
  return found;
}

interface Split {
  readonly years: readonly RecordYear[];
  readonly path: StrainPath;
  readonly count: number;
  readonly counters: PassCounter;
  readonly begin: () => void;
  /** A year is over, and its forces are in the counters. */
  readonly end: (year: RecordYear) => void;
}

/** Hands the forces of a pass on year by year; the way between two turns belongs to the year of the later one. */
function splitPass({ years, path, count, counters, begin, end }: Split) {
  let year = 0;
  const close = () => {
    end(years[year]);
    counters.begin();
  };
  const yearOf = (mark: number) => {
    const sample = path.turns[Math.max(0, Math.ceil(mark - ROUNDING) - 1)];
    let k = year;
    while (sample >= years[k].to) k++;
    return k;
  };
  return {
    begin() {
      begin();
      counters.begin();
      year = 0;
    },
    take(shears: Float64Array, spans: Float64Array, rows: number, marks: Float64Array) {
      let from = 0;
      // the way back from the last sample to the first is of no year
      while (from < rows && marks[from] < 1 - ROUNDING) from++;
      while (from < rows) {
        const here = yearOf(marks[from]);
        while (year < here) {
          close();
          year++;
        }
        let to = from + 1;
        while (to < rows && yearOf(marks[to]) === here) to++;
        const part = (values: Float64Array, columns: number) =>
          values.subarray(from * columns, to * columns);
        counters.take(part(shears, count), part(spans, count - 1), to - from, marks);
        from = to;
      }
    },
    /** The last year is over. */
    finish: close,
  };
}

function damageOfYear(
  scene: RunScene,
  { from, to }: RecordYear,
  zones: readonly Zone[],
): YearDamage {
  const { run, job } = scene;
  const { axis } = job;
  const hours = coveredHours(
    axisPart(axis, from, to),
    zones.map((zone) => ({ ...zone, standing: zone.standing.subarray(from, to) })),
  );
  const years = Math.min(1, yearsOf(hours, null));
  const alone = { ...scene, years };
  const spans = scene.counters.spans.map(
    (_, j) => minerDamage(spanSpectrum(alone, j), memberUse(alone)).sum,
  );
  const perYear = (sum: number | null) => (sum === null ? null : sum / years);
  const connections = run.roles.map((_, i) => {
    const fastener = perYear(minerDamage(fastenerSpectrum(alone, i), fastenerUse(alone, i)).sum);
    const beside = [spans[i - 1], spans[i]].filter((sum) => sum != null);
    const unstrained = run.member.curve === null ? null : 0;
    const member = perYear(beside.length === 0 ? unstrained : Math.max(...beside));
    return {
      memberDamagePerYear: member,
      fastenerDamagePerYear: fastener,
      life: lifeOf([member, fastener], job.limits.damage),
    };
  });
  const { times } = axis;
  return { from: times[from], to: times[to - 1], coveredHours: hours, years, connections };
}

function axisPart(axis: RecordAxis, from: number, to: number): RecordAxis {
  return {
    times: axis.times.subarray(from, to),
    stepHours: axis.stepHours,
    sampleHours: axis.sampleHours?.subarray(from, to) ?? null,
    filledHoursBefore: axis.filledHoursBefore.subarray(from, to),
  };
}
