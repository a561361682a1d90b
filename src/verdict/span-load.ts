import { minerDamage, type SeriesUse } from '../damage/miner.ts';
import { bucklingResistance } from '../mechanics/buckling.ts';
import type { Damage, Demand, Member, Spectrum } from '../model.ts';
import { withExtremesCycle } from './extremes-cycle.ts';
import type { RunScene } from './run-scene.ts';
import { scaleSpectrum } from './scale-spectrum.ts';

/** What the member bears in one span, unfactored. */
export interface SpanLoad {
  /** From 0 at the left. */
  readonly index: number;
  readonly damage: Damage;
  /** max − min of σ in the counted pass [MPa]. */
  readonly stressRange: Demand;
  /** Largest compression from lock-in on and at the extremes [N], and the flexural resistance [N]. */
  readonly compression: Demand & { readonly resistance: number | null };
}

/** Counted stress ranges of span j [MPa]. */
export function spanSpectrum(scene: RunScene, j: number): Spectrum {
  const { run, job, counters, noise } = scene;
  const counted = counters.spans[j].finish(job.counting.residue, noise);
  const whole = withExtremesCycle(counted, scene, ({ spans }) => spans[j]);
  return scaleSpectrum(whole, stressOf(run.member));
}

/** How the member's stress ranges are turned to damage. */
export function memberUse({ run, job, tables }: RunScene): SeriesUse {
  const { member } = run;
  const { curve } = member;
  const { limits, counting } = job;
  const factor = limits.loadFactor * limits.memberFactor;
  return {
    table: curve === null ? null : tables.of(curve, factor, member.thickness),
    scale: 1,
    gate: counting.stressGate,
  };
}

/** Loads of span j. */
export function assessSpan(scene: RunScene, j: number): SpanLoad {
  const { run, history, noise, when } = scene;
  const scale = stressOf(run.member);
  const { countedSpans, allSpans } = history;
  const range = countedSpans.max[j] - countedSpans.min[j];
  const compression = Math.max(0, -allSpans.min[j]);
  return {
    index: j,
    damage: minerDamage(spanSpectrum(scene, j), memberUse(scene)),
    stressRange: {
      value: range > noise ? scale * range : 0,
      when: rangeText(when, countedSpans.maxMark[j], countedSpans.minMark[j]),
    },
    compression: {
      value: compression > noise ? compression : 0,
      when: when(allSpans.minMark[j]),
      resistance: resistanceOf(run.member, run.positions[j + 1] - run.positions[j]),
    },
  };
}

/** The worse of the spans beside connection i: larger damage, then larger range; `null` where there is none. */
export function worseSpan(spans: readonly SpanLoad[], i: number): SpanLoad | null {
  const [left, right] = [spans[i - 1], spans[i]];
  if (left === undefined || right === undefined) return left ?? right ?? null;
  const [leftSum, rightSum] = [left.damage.sum ?? 0, right.damage.sum ?? 0];
  if (leftSum !== rightSum) return leftSum > rightSum ? left : right;
  return left.stressRange.value >= right.stressRange.value ? left : right;
}

/** Words for a range: when its two ends were, the earlier first. */
export function rangeText(when: (mark: number) => string, oneMark: number, other: number): string {
  const [first, last] = oneMark <= other ? [oneMark, other] : [other, oneMark];
  return `${when(first)} to ${when(last)}`;
}

/** Member stress per unit of span force [1/mm²]: the stress factor over net or gross area, as the curve says. */
function stressOf({ curve, area, netArea, stressFactor }: Member): number {
  return stressFactor / (curve?.on === 'gross' ? area : netArea);
}

function resistanceOf(member: Member, length: number): number | null {
  const { buckling, yield: strength, inertia, modulus, area, bucklingFactor } = member;
  if (buckling === null || strength === null || inertia === null) return null;
  const strut = { modulus, yield: strength, area, inertia, length };
  return bucklingFactor * bucklingResistance(strut, buckling);
}
