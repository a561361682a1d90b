import type { CountingSettings, Limits, RemedySettings, Warming } from '../model.ts';
import type { Findings } from './findings.ts';
import { COUNTING_KEYS, LIMITS_KEYS, REMEDY_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import type { SourceMap } from './source.ts';
import { WARMING_KEYS } from './sun-keys.ts';

/** The job's limits and factors; `null` with a fault, which is reported. */
export function readLimits(map: SourceMap, findings: Findings): Limits | null {
  const { complete, values } = readKeys(LIMITS_KEYS, map, 'limits.', findings);
  if (!complete) return null;
  return {
    designLife: values.design_life,
    damage: values.damage,
    loadFactor: values.load_factor,
    memberFactor: values.member_factor,
    fastenerFactor: values.fastener_factor,
    staticFactor: values.static_factor,
  };
}

/** How cycles are counted; `null` with a fault, which is reported. */
export function readCounting(map: SourceMap, findings: Findings): CountingSettings | null {
  const { complete, values } = readKeys(COUNTING_KEYS, map, 'counting.', findings);
  if (!complete) return null;
  const { residue, force_gate: forceGate, stress_gate: stressGate } = values;
  return { residue, forceGate, stressGate, extremesCycle: values.extremes_cycle };
}

/** What remedies may propose; `null` with a fault, which is reported. */
export function readRemedies(map: SourceMap, findings: Findings): RemedySettings | null {
  const { complete, values } = readKeys(REMEDY_KEYS, map, 'remedies.', findings);
  if (!complete) return null;
  return {
    longestTravel: values.longest_travel,
    slotTravels: values.slot_travels,
    slotStep: values.slot_step,
    shortestPiece: values.shortest_piece,
    widestGap: values.widest_gap,
    gapStep: values.gap_step,
    closestSpacing: values.closest_spacing,
    slottedGripShare: values.slotted_grip_share,
    gripSpread: values.grip_spread,
  };
}

/** The what-if of warmer zones; `null` for none, or with a fault, which is reported. */
export function readWarming(map: SourceMap | null, findings: Findings): Warming | null {
  if (map === null) return null;
  const { complete, values } = readKeys(WARMING_KEYS, map, 'warming.', findings);
  return complete ? { add: values.add, dailySwing: values.daily_swing } : null;
}
