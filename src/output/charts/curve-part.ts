import { thicknessFactor } from '../../damage/thickness-factor.ts';
import type { Curve, Damage, Job, RangeBin, RunResult } from '../../model.ts';

/** One member or fastener of the governing connection, with its counted ranges in its curve's terms. */
export interface CurvePart {
  readonly part: 'fastener' | 'member';
  readonly curve: Curve | null;
  readonly measure: 'force' | 'stress';
  readonly damage: Damage;
  /** What a range is multiplied by before the curve, by name and together. */
  readonly factor: number;
  readonly bins: readonly PartBin[];
}

/** Counted ranges of one bin. */
export interface PartBin {
  /** Factored mid-range, N or MPa. */
  readonly range: number;
  /** Cycles in the design life. */
  readonly cycles: number;
  /** Share of the part's damage, 0 … 1. */
  readonly share: number;
}

/** The fastener and the member of a run's governing connection, as far as they have counted ranges. */
export function curveParts(result: RunResult, job: Job): CurvePart[] {
  const { run, connections, governing } = result;
  const connection = connections[governing];
  const { fastener } = connection;
  const { limits } = job;
  const memberCurve = run.member.curve;
  const thickness = memberCurve === null ? 1 : thicknessFactor(memberCurve, run.member.thickness);
  const onArea = fastener.curve?.of === 'stress';
  const lives = limits.designLife / result.years;
  return [
    curvePart(
      {
        part: 'fastener',
        curve: fastener.curve,
        measure: onArea ? 'stress' : 'force',
        damage: connection.fastenerDamage,
        factor: fastener.curve === null ? 1 : limits.loadFactor * limits.fastenerFactor,
      },
      { bins: result.fastenerBins, scale: onArea ? 1 / fastener.shearArea! : 1, lives },
    ),
    curvePart(
      {
        part: 'member',
        curve: memberCurve,
        measure: 'stress',
        damage: connection.memberDamage,
        factor: memberCurve === null ? 1 : limits.loadFactor * limits.memberFactor * thickness,
      },
      { bins: result.memberBins, scale: 1, lives },
    ),
  ];
}

function curvePart(
  part: Omit<CurvePart, 'bins'>,
  counted: { readonly bins: readonly RangeBin[]; readonly scale: number; readonly lives: number },
): CurvePart {
  const total = counted.bins.reduce((sum, { damage }) => sum + (damage ?? 0), 0);
  const bins = counted.bins
    .filter(({ count }) => count > 0)
    .map(({ from, to, count, damage }) => ({
      range: ((from + to) / 2) * counted.scale * part.factor,
      cycles: count * counted.lives,
      share: total === 0 ? 0 : (damage ?? 0) / total,
    }));
  return { ...part, bins };
}
