import type { CountingSettings, Limits } from '../model.ts';
import type { Findings } from './findings.ts';
import { COUNTING_KEYS, LIMITS_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import type { SourceMap } from './source.ts';

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
  return { residue, forceGate, stressGate };
}
