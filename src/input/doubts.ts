import type { Member, Run, Zone } from '../model.ts';
import type { Findings } from './findings.ts';
import { WARNINGS } from './warnings.ts';

/** Median temperatures beyond these [°C] are hardly any season's: the unit of the column is likely wrong. */
const LIKELY_MEDIAN = [-20, 45] as const;
/** Radius of gyration over the root of the area: a flat strip of 1 in 100 has 0.03, a thin tube of 1 in 100 2. */
const LIKELY_GYRATION = [0.01, 8] as const;
/** How far outside its zone's temperatures a lock-in temperature may lie without doubt [K]. */
const LOCK_IN_MARGIN = 40;

/** Warns where values that are each possible hardly go together (common practice, no source). */
export function doubtTogether(
  zones: readonly Zone[],
  runs: readonly Run[],
  findings: Findings,
): void {
  for (const zone of zones) doubtZone(zone, findings);
  for (const member of new Set(runs.map((run) => run.member))) doubtMember(member, findings);
  const ranges = new Map(zones.map((zone) => [zone.name, rangeOf(zone)]));
  for (const run of runs) doubtLockIn(run, ranges.get(run.zone.name)!, findings);
}

/** So many of a record's temperatures tell its median well enough, however long it is. */
const SAMPLES = 10_000;

function doubtZone({ name, temperature, constant }: Zone, findings: Findings): void {
  if (constant) return;
  const step = Math.ceil(temperature.length / SAMPLES);
  const some = Float64Array.from(
    { length: Math.ceil(temperature.length / step) },
    (_, i) => temperature[i * step],
  );
  const median = some.sort()[some.length >> 1];
  const [low, high] = LIKELY_MEDIAN;
  if (median >= low && median <= high) return;
  findings.warnings.push(WARNINGS.unlikelyTemperature(name, `${Math.round(median)} °C`));
}

function doubtMember({ id, area, inertia }: Member, findings: Findings): void {
  if (inertia === null) return;
  const radius = Math.sqrt(inertia / area);
  const [low, high] = LIKELY_GYRATION;
  const ratio = radius / Math.sqrt(area);
  if (ratio >= low && ratio <= high) return;
  findings.warnings.push(WARNINGS.unlikelyInertia(id, `${Number(radius.toPrecision(2))} mm`));
}

interface Range {
  readonly low: number;
  readonly high: number;
}

function rangeOf({ temperature }: Zone): Range {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const value of temperature) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return { low, high };
}

function doubtLockIn({ id, zone, lockIn }: Run, { low, high }: Range, findings: Findings): void {
  if (zone.constant) return;
  if (lockIn >= low - LOCK_IN_MARGIN && lockIn <= high + LOCK_IN_MARGIN) return;
  const range = `${Math.round(low)} to ${Math.round(high)} °C`;
  findings.warnings.push(WARNINGS.lockInFar(id, `${Math.round(lockIn)} °C`, range));
}
