import type { Overhangs, Run } from '../model.ts';
import { coveredHours, isInGap } from '../temperature/gaps.ts';
import { type Findings, report } from './findings.ts';
import { jointOf } from './joint.ts';
import { RUN_KEYS } from './keys.ts';
import { lookUp, uniqueIds } from './library.ts';
import { lockInOf, lockInTime, noteLockIn, structureOf } from './lock-in.ts';
import { readKeys } from './read-keys.ts';
import { rolesOf } from './run-fasteners.ts';
import { checkLength } from './run-length.ts';
import type { Clock, RunParts, RunValues } from './run-parts.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import { WARNINGS } from './warnings.ts';

/** The job's runs in file order; a run with a fault is reported and left out. */
export function readRuns(rows: readonly SourceMap[], parts: RunParts, findings: Findings): Run[] {
  const ids = uniqueIds(rows, 'run', findings);
  checkCase(ids, rows, findings);
  return rows.map((row) => readRun(row, parts, findings)).filter((run) => run !== null);
}

function readRun(row: SourceMap, parts: RunParts, findings: Findings): Run | null {
  const prefix = `runs ${givenText(row, 'id') ?? '?'}: `;
  const { complete, values } = readKeys(RUN_KEYS, row, prefix, findings);
  const before = findings.issues.length;
  const member = lookUp(parts.members, row, 'member', findings);
  const zone = lookUp(parts.zones, row, 'zone', findings);
  const fixed = lookUp(parts.fasteners, row, 'fastener', findings);
  const slotted = lookUp(parts.fasteners, row, 'slotted', findings);
  const positions = positionsOf(values, row, findings);
  checkFixed(values, positions, row, findings);
  checkLength(values, positions, row, findings);
  const time = lockInTime(values, row, parts.clock, findings);
  const lockIn = lockInOf(values, zone, time, parts.clock);
  const structure = structureOf(row, values, { ...parts, time, prefix }, findings);
  if (!complete || findings.issues.length > before) return null;
  if (!member || !zone || !fixed || !positions || lockIn === null) return null;
  if (values.structure_zone !== null && structure === null) return null;
  const joint = jointOf(values, row, findings);
  const roles = rolesOf(values.fixed, positions);
  const fasteners = roles.map((role) => (role === 'fixed' ? fixed : slotted));
  if (joint === null || !fasteners.every((fastener) => fastener !== null)) return null;
  if (roles.includes('slotted') && slotted?.freePlay === 0) {
    const expected = `a fastener with free play, which ${slotted.id} has not`;
    return report(findings, placeOf(row, 'slotted'), { found: slotted.id, expected });
  }
  const run: Run = {
    id: values.id,
    member,
    positions,
    roles,
    fasteners,
    fixedType: fixed,
    slottedType: slotted,
    zone,
    lockIn,
    structure,
    overhangs: overhangsOf(values),
    line: values.line,
    gap: values.gap,
    joint,
    settingTolerance: values.setting_tolerance,
    addedTension: values.added_tension,
    addedShear: values.added_shear,
  };
  if (isNeverCovered(run, parts)) {
    const expected = 'a member and a structure zone that are covered together at some time';
    return report(findings, placeOf(row, 'zone'), { found: run.zone.name, expected });
  }
  noteLockIn(run, row, values, findings);
  warnOfGap(run, time, parts.clock, findings);
  return run;
}

/** Whether every hour of the record is a long gap for the run, so that no damage a year can be reckoned. */
function isNeverCovered({ zone, structure }: Run, { clock }: RunParts): boolean {
  const zones = structure === null ? [zone] : [zone, structure.zone];
  return clock !== null && coveredHours(clock.axis, zones) === 0;
}

/** `positions` are measured from the member's left end, so the first of them is the overhang there unless it is 0. */
function overhangsOf({ left_overhang: left, overhang, positions }: RunValues): Overhangs {
  const first = positions?.[0] ?? 0;
  return { left: left ?? (first > 0 ? first : overhang), right: overhang };
}

/** A temperature read where the record has a long gap is a guess. */
function warnOfGap(run: Run, time: number | null, clock: Clock | null, findings: Findings): void {
  if (time === null || clock === null) return;
  const zones = run.structure === null ? [run.zone] : [run.zone, run.structure.zone];
  for (const zone of zones) {
    if (!zone.constant && isInGap(zone, clock.axis, time)) {
      findings.warnings.push(WARNINGS.lockInInGap(run.id, zone.name));
    }
  }
}

/** Ids stand in file names, and some file systems do not tell `r1` from `R1`. */
function checkCase(ids: readonly string[], rows: readonly SourceMap[], findings: Findings): void {
  const seen = new Map<string, string>();
  for (const id of ids) {
    const other = seen.get(id.toLowerCase());
    const row = rows.find((one) => givenText(one, 'id') === id);
    if (other !== undefined && row !== undefined) {
      const expected = `a name that differs from ${other} by more than capitals`;
      report(findings, placeOf(row, 'id'), { found: id, expected });
    }
    seen.set(id.toLowerCase(), id);
  }
}

/** Positions of the fasteners [mm], from a count and a spacing or as given. */
function positionsOf(
  values: Partial<RunValues>,
  row: SourceMap,
  findings: Findings,
): Float64Array | null {
  const given = ['count', 'spacing', 'positions'].filter((key) => givenValue(row, key));
  const lone = values.count === 1 && !given.includes('spacing');
  if (
    given.join() !== 'positions' &&
    given.join() !== 'count,spacing' &&
    !(lone && given.length === 1)
  ) {
    return report(findings, row.place, {
      found: given.length === 0 ? 'neither' : given.join(' and '),
      expected: 'either count and spacing, or positions',
    });
  }
  if (values.positions) return Float64Array.from(values.positions);
  const { count, spacing } = values;
  if (count == null || spacing === undefined) return null;
  return Float64Array.from({ length: count }, (_, i) => i * (spacing ?? 0));
}

function checkFixed(
  { fixed }: Partial<RunValues>,
  positions: Float64Array | null,
  row: SourceMap,
  findings: Findings,
): void {
  if (fixed === undefined || positions === null) return;
  const n = positions.length;
  const beyond = typeof fixed === 'string' ? [] : fixed.filter((number) => number > n);
  if (beyond.length > 0) {
    const expected = `fastener numbers from 1 to ${n}`;
    report(findings, placeOf(row, 'fixed'), { found: beyond.join(' '), expected });
  }
  if (givenValue(row, 'slotted') || !rolesOf(fixed, positions).includes('slotted')) return;
  const expected = 'the fastener that stands where not fixed, since not all are';
  report(findings, placeOf(row, 'slotted'), { expected });
}
