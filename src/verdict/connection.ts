import { minerDamage, type SeriesUse } from '../damage/miner.ts';
import type { Connection, Damage, Demand, Spectrum } from '../model.ts';
import { scaledFrom } from '../temperature/short-season.ts';
import { type ConnectionDemands, checksOf } from './checks.ts';
import { withExtremesCycle } from './extremes-cycle.ts';
import { judge } from './judge.ts';
import type { RunScene } from './run-scene.ts';
import { scaleSpectrum } from './scale-spectrum.ts';
import { rangeText, type SpanLoad, worseSpan } from './span-load.ts';
import { unevenFriction } from './uneven-friction.ts';

/** Counted shear ranges of one fastener of connection i [N]. */
export function fastenerSpectrum(scene: RunScene, i: number): Spectrum {
  const { run, job, counters, noise } = scene;
  const counted = counters.fasteners[i].finish(job.counting.residue, noise);
  const whole = withExtremesCycle(counted, scene, ({ fasteners }) => fasteners[i]);
  return scaleSpectrum(whole, 1 / run.fasteners[i].perConnection);
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
    shearPeak: shearPeakOf(scene, i).value,
    shearRange: demands.shearRange.value,
    fastenerDamage,
    stressRange: span?.stressRange.value ?? 0,
    memberDamage,
    cyclesPerYear: fastenerDamage.cycles / years,
    fastenerDamagePerYear,
    memberDamagePerYear,
    life: lifeOf([memberDamagePerYear, fastenerDamagePerYear], job.limits.damage),
    slipPeak: history.slipPeak[i],
    slidingPerYear: history.slid[i] / years,
    bucklingUtilisation: checks.find(({ check }) => check === 'buckling')?.utilisation ?? null,
    ...judge(checks),
    change: null,
  };
}

function demandsOf(
  scene: RunScene,
  spans: readonly SpanLoad[],
  i: number,
  damages: Pick<ConnectionDemands, 'memberDamagePerYear' | 'fastenerDamagePerYear'>,
): ConnectionDemands {
  const { run, job, history, noise, when } = scene;
  const { countedShear } = history;
  const range = countedShear.max[i] - countedShear.min[i];
  const drift = history.walks
    ? (Math.abs(history.drift[i]) / scene.years) * job.limits.designLife
    : 0;
  const days = scaledFrom(scene);
  return {
    ...damages,
    damageFrom: days === null ? '' : `scaled from ${Math.round(days)} days`,
    role: run.roles[i],
    shearRange: {
      value: range > noise ? range / run.fasteners[i].perConnection : 0,
      when: rangeText(when, countedShear.maxMark[i], countedShear.minMark[i]),
    },
    shearPeak: unevenOr(scene, i, shearPeakOf(scene, i)),
    stressRange: largestStressRange(spans, i),
    slip: { value: history.slipPeak[i] + drift, when: when(history.slipPeakMark[i]) },
    compression: weakerSpan(spans, i)?.compression ?? null,
    settingTolerance: run.settingTolerance,
    addedTension: run.addedTension,
    addedShear: run.addedShear,
  };
}

/** The larger stress range of the two sides of connection i, whichever does more damage [MPa]. */
function largestStressRange(spans: readonly SpanLoad[], i: number): Demand {
  const none: Demand = { value: 0, when: '' };
  const [left, right] = [spans[i - 1]?.stressRange ?? none, spans[i]?.stressRange ?? none];
  return left.value >= right.value ? left : right;
}

/** Largest |f| of one fastener of connection i from lock-in on and at the extremes [N]. */
function shearPeakOf({ run, history, noise, when }: RunScene, i: number): Demand {
  const { max, maxMark, min, minMark } = history.allShear;
  const pulls = max[i] >= -min[i];
  const peak = pulls ? max[i] : -min[i];
  return {
    value: peak > noise ? peak / run.fasteners[i].perConnection : 0,
    when: when(pulls ? maxMark[i] : minMark[i]),
  };
}

/** The peak shear of connection i, or what uneven friction may put on a fixed one where that is more. */
function unevenOr({ run, job }: RunScene, i: number, peak: Demand): Demand {
  if (!job.unevenFriction || run.roles[i] !== 'fixed' || !run.roles.includes('slotted'))
    return peak;
  const friction = unevenFriction(run, i, job.remedies.gripSpread);
  const value = friction / run.fasteners[i].perConnection;
  return value > peak.value ? { value, when: 'uneven friction' } : peak;
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
export function lifeOf(damages: readonly (number | null)[], allowed: number): number | null {
  const given = damages.filter((damage) => damage !== null);
  return given.length === 0 ? null : allowed / Math.max(...given);
}
