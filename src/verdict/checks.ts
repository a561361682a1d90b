import type {
  Check,
  CheckName,
  CheckStatus,
  CheckUnit,
  Demand,
  Fastener,
  Limits,
  Member,
  Role,
} from '../model.ts';
import { firstLargest } from './first-largest.ts';

/** What one connection must bear: forces of one fastener, unfactored, in N, mm and MPa. */
export interface ConnectionDemands {
  readonly role: Role;
  /** Miner sum a year; `null` without a curve. */
  readonly memberDamagePerYear: number | null;
  readonly fastenerDamagePerYear: number | null;
  /** What the damage a year was scaled from, where the record is no whole year; else blank. */
  readonly damageFrom: string;
  readonly shearRange: Demand;
  readonly shearPeak: Demand;
  readonly stressRange: Demand;
  /** Largest slip, with the drift of a walking run over the design life. */
  readonly slip: Demand;
  /** Largest compression of the worse span, and its flexural resistance (`null` where not given). */
  readonly compression: (Demand & { readonly resistance: number | null }) | null;
  readonly settingTolerance: number;
  readonly addedTension: number;
  readonly addedShear: number;
}

/** A demand may exceed its limit by no more than rounding. */
const ROUNDING = 1e-9;

/** Yield range of EN 1993-1-9 8(1), as a multiple of f_y [from memory]. */
const YIELD_RANGE = 1.5;

/**
 * Every check that applies to a connection, in the order of `CHECKS`. What the user gave no limit for is
 * `not given`; slot travel applies to slotted connections and buckling to connections beside a span.
 */
export function checksOf(
  demands: ConnectionDemands,
  fastener: Fastener,
  member: Member,
  limits: Limits,
): Check[] {
  const checks = [
    damageCheck('member damage', demands.memberDamagePerYear, demands, limits),
    fastenerDamageCheck(demands, fastener, limits),
    shearRangeCheck(demands, fastener),
    peakShearCheck(demands, fastener, limits),
    combinedCheck(demands, fastener, limits),
    yieldRangeCheck(demands, member),
    slotTravelCheck(demands, fastener),
    bucklingCheck(demands, limits),
  ];
  return checks.filter((check) => check !== null);
}

/** The check with the largest utilisation of those that pass or fail, the earlier on a tie; `null` without any. */
export function governingCheck(checks: readonly Check[]): Check | null {
  const judged = checks.filter(({ status }) => status === 'pass' || status === 'fail');
  if (judged.length === 0) return null;
  return judged[firstLargest(judged.map(({ utilisation }) => utilisation ?? 0))];
}

function damageCheck(
  check: CheckName,
  perYear: number | null,
  { damageFrom: when }: ConnectionDemands,
  limits: Limits,
): Check {
  const demand = perYear === null ? null : { value: perYear * limits.designLife, when };
  return compare(check, '1', demand, limits.damage);
}

/** Under the range limit of a rule `exempts` no damage check is owed. */
function fastenerDamageCheck(
  demands: ConnectionDemands,
  fastener: Fastener,
  limits: Limits,
): Check {
  const check = damageCheck('fastener damage', demands.fastenerDamagePerYear, demands, limits);
  return isExempted(demands, fastener) ? { ...check, status: 'exempt' } : check;
}

/** Over the limit of a rule `exempts` the damage decides; without a curve to reckon it, the range fails. */
function shearRangeCheck(demands: ConnectionDemands, fastener: Fastener): Check {
  const check = compare('shear range', 'N', demands.shearRange, fastener.shearRangeLimit);
  const damageDecides =
    check.status === 'fail' &&
    fastener.shearRangeRule === 'exempts' &&
    demands.fastenerDamagePerYear !== null;
  return damageDecides ? { ...check, status: 'exempt' } : check;
}

function isExempted({ shearRange }: ConnectionDemands, fastener: Fastener): boolean {
  const { shearRangeRule, shearRangeLimit } = fastener;
  return (
    shearRangeRule === 'exempts' && shearRangeLimit !== null && shearRange.value <= shearRangeLimit
  );
}

function peakShearCheck(demands: ConnectionDemands, fastener: Fastener, limits: Limits): Check {
  return compare('peak shear', 'N', peakShear(demands, limits), fastener.shearResistance);
}

/** (T/T_Rd)^p + (V/V_Rd)^p against 1. */
function combinedCheck(demands: ConnectionDemands, fastener: Fastener, limits: Limits): Check {
  const { tensionResistance, shearResistance, interaction } = fastener;
  if (tensionResistance === null || shearResistance === null || interaction === null) {
    return compare('combined', '1', null, 1);
  }
  const { value: shear, when } = peakShear(demands, limits);
  const tensionShare = (demands.addedTension / tensionResistance) ** interaction;
  const shearShare = (shear / shearResistance) ** interaction;
  return compare('combined', '1', { value: tensionShare + shearShare, when }, 1);
}

function yieldRangeCheck({ stressRange }: ConnectionDemands, member: Member): Check {
  const limit = member.yield === null ? null : YIELD_RANGE * member.yield;
  return compare('yield range', 'MPa', stressRange, limit);
}

/** Slip stops at the end of the slot, so a bolt that got there fails whatever its slip comes to. */
function slotTravelCheck(demands: ConnectionDemands, fastener: Fastener): Check | null {
  if (demands.role !== 'slotted') return null;
  const { value, when } = demands.slip;
  const travel = { value: value + demands.settingTolerance, when };
  const check = compare('slot travel', 'mm', travel, fastener.freePlay);
  const bears = value >= fastener.freePlay * (1 - ROUNDING);
  return bears ? { ...check, status: 'fail', when: `${when}, where it bears` } : check;
}

function bucklingCheck({ compression }: ConnectionDemands, limits: Limits): Check | null {
  if (compression === null) return null;
  const demand = { value: limits.staticFactor * compression.value, when: compression.when };
  return compare('buckling', 'N', demand, compression.resistance);
}

function peakShear({ shearPeak, addedShear }: ConnectionDemands, limits: Limits): Demand {
  return { value: limits.staticFactor * shearPeak.value + addedShear, when: shearPeak.when };
}

/** A demand against a limit; `not given` where either is missing. */
export function compare(
  check: CheckName,
  unit: CheckUnit,
  demand: Demand | null,
  limit: number | null,
): Check {
  const value = demand === null ? null : demand.value;
  const utilisation = value === null || limit === null ? null : share(value, limit);
  const status: CheckStatus =
    utilisation === null ? 'not given' : utilisation <= 1 + ROUNDING ? 'pass' : 'fail';
  const when = demand === null ? '' : demand.when;
  return { check, demand: value, limit, unit, utilisation, status, when };
}

/** demand / limit, where nothing demanded of nothing is no use of it. */
function share(demand: number, limit: number): number {
  return demand === 0 ? 0 : demand / limit;
}
