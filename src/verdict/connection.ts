import { minerDamage, type SeriesUse } from '../damage/miner.ts';
import type { Check, Connection, Damage, Spectrum } from '../model.ts';
import { type ConnectionDemands, checksOf, governingCheck } from './checks.ts';
import type { RunScene } from './run-scene.ts';
import { scaleSpectrum } from './scale-spectrum.ts';
import { rangeText, type SpanLoad, worseSpan } from './span-load.ts';

/** Counted shear ranges of one fastener of connection i [N]. */
export function fastenerSpectrum({ run, job, counters, noise }: RunScene, i: number): Spectrum {
  const counted = counters.fasteners[i].finish(job.counting.residue, noise);
  return scaleSpectrum(counted, 1 / run.fasteners[i].perConnection);
}

/** How a fastener's force ranges are turned to damage. */
export function fastenerUse({ run, job, tables }: RunScene, i: number): SeriesUse {
  const { curve, shearArea } = run.fasteners[i];
  const { limits, counting } = job;
  const factor = limits.loadFactor * limits.fastenerFactor;
  return {
    table: curve === null ? null : tables.of(curve, factor, null),
    scale: curve?.of === 'stress' && shearArea !== null ? 1 / shearArea : 1,
    gate: counting.forceGate,
  };
}

/** Loads, checks and verdict of connection i, given the loads of all spans of its run. */
export function assessConnection(
  scene: RunScene,
  spans: readonly SpanLoad[],
  i: number,
): Connection {
  const { run, job, history, years } = scene;
  const fastener = run.fasteners[i];
  const fastenerDamage = minerDamage(fastenerSpectrum(scene, i), fastenerUse(scene, i));
  const span = worseSpan(spans, i);
  const memberDamage = span?.damage ?? unstrained(run.member.curve !== null);
  const fastenerDamagePerYear = perYear(fastenerDamage, years);
  const memberDamagePerYear = perYear(memberDamage, years);
  const demands = demandsOf(scene, spans, i, { memberDamagePerYear, fastenerDamagePerYear });
  const checks = checksOf(demands, fastener, run.member, job.limits);
  return {
    run: run.id,
    number: i + 1,
    position: run.positions[i],
    fastener,
    role: run.roles[i],
    shearPeak: demands.shearPeak.value,
    shearRange: demands.shearRange.value,
    fastenerDamage,
    stressRange: demands.stressRange.value,
    memberDamage,
    cyclesPerYear: fastenerDamage.cycles / years,
    fastenerDamagePerYear,
    memberDamagePerYear,
    life: lifeOf([memberDamagePerYear, fastenerDamagePerYear], job.limits.damage),
    slipPeak: history.slipPeak[i],
    slidingPerYear: history.slid[i] / years,
    bucklingUtilisation: checks.find(({ check }) => check === 'buckling')?.utilisation ?? null,
    checks,
    governing: governingCheck(checks),
    verdict: checks.some(isFailed) ? 'fails' : 'ok',
    remedy: '',
  };
}

function demandsOf(
  scene: RunScene,
  spans: readonly SpanLoad[],
  i: number,
  damages: Pick<ConnectionDemands, 'memberDamagePerYear' | 'fastenerDamagePerYear'>,
): ConnectionDemands {
  const { run, job, history, noise, when } = scene;
  const { countedShear, allShear } = history;
  const range = countedShear.max[i] - countedShear.min[i];
  const pulls = allShear.max[i] >= -allShear.min[i];
  const peak = pulls ? allShear.max[i] : -allShear.min[i];
  const { perConnection } = run.fasteners[i];
  const each = (force: number) => (force > noise ? force / perConnection : 0);
  const drift = history.walks
    ? (Math.abs(history.drift[i]) / scene.years) * job.limits.designLife
    : 0;
  return {
    ...damages,
    role: run.roles[i],
    shearRange: {
      value: each(range),
      when: rangeText(when, countedShear.maxMark[i], countedShear.minMark[i]),
    },
    shearPeak: {
      value: each(peak),
      when: when(pulls ? allShear.maxMark[i] : allShear.minMark[i]),
    },
    stressRange: worseSpan(spans, i)?.stressRange ?? { value: 0, when: '' },
    slip: { value: history.slipPeak[i] + drift, when: when(history.slipPeakMark[i]) },
    compression: weakerSpan(spans, i)?.compression ?? null,
    settingTolerance: run.settingTolerance,
    addedTension: run.addedTension,
    addedShear: run.addedShear,
  };
}

/** The span beside connection i that uses more of its flexural resistance, or has the larger compression. */
function weakerSpan(spans: readonly SpanLoad[], i: number): SpanLoad | null {
  const [left, right] = [spans[i - 1], spans[i]];
  if (left === undefined || right === undefined) return left ?? right ?? null;
  const use = ({ compression: { value, resistance } }: SpanLoad) => value / (resistance ?? 1);
  return use(left) >= use(right) ? left : right;
}

/** The damage of a member that is never strained, as beside a lone fastener. */
function unstrained(hasCurve: boolean): Damage {
  const nothing = hasCurve ? 0 : null;
  return {
    sum: nothing,
    cycles: 0,
    damagingCycles: 0,
    equivalentRange: null,
    slope: null,
    gatedCycles: 0,
    gatedDamage: 0,
  };
}

function perYear({ sum }: Damage, years: number): number | null {
  return sum === null ? null : sum / years;
}

/** Allowed Miner sum over the larger damage a year [years]. */
function lifeOf(damages: readonly (number | null)[], allowed: number): number | null {
  const given = damages.filter((damage) => damage !== null);
  return given.length === 0 ? null : allowed / Math.max(...given);
}

function isFailed({ status }: Check): boolean {
  return status === 'fail';
}
