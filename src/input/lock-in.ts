import type { Run, Structure, Zone } from '../model.ts';
import { temperatureAt } from '../temperature/zone.ts';
import { type Findings, report } from './findings.ts';
import type { WrittenTime } from './iso-time.ts';
import { RUN_KEYS } from './keys.ts';
import { lookUp } from './library.ts';
import type { Clock, RunParts } from './run-parts.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import type { KindValues, Values } from './values.ts';
import { WARNINGS } from './warnings.ts';

type RunValues = Partial<Values<typeof RUN_KEYS>>;

/**
 * The time of lock-in on the record's clock [ms], where the user gave a time.
 * @returns `null` where a temperature was given, or the time has a fault, which is reported
 */
export function lockInTime(
  { lock_in: lockIn }: RunValues,
  row: SourceMap,
  clock: Clock | null,
  findings: Findings,
): number | null {
  if (lockIn === undefined || !isTime(lockIn) || clock === null) return null;
  const found = givenText(row, 'lock_in') ?? '';
  const place = placeOf(row, 'lock_in');
  if (lockIn.offset !== null && clock.offset === null) {
    const expected = 'a time without an offset, as the record has none';
    return report(findings, place, { found, expected });
  }
  const time = timeOnClock(lockIn, clock);
  if (time === null) {
    const expected = `a time that the clock of ${clock.zone?.zone} shows once`;
    const hint = 'Give it with its offset from UTC, such as at 2031-10-26T01:30+01:00.';
    return report(findings, place, { found, expected, hint });
  }
  const { times } = clock.axis;
  const [first, last] = [times[0], times[times.length - 1]];
  if (time >= first && time <= last) return time;
  const expected = `a time within the record, from ${written(first)} to ${written(last)}`;
  return report(findings, place, { found, expected });
}

/** A written time on the record's clock [ms]; `null` where the zone's clock shows it twice or never. */
function timeOnClock({ local, offset }: WrittenTime, clock: Clock): number | null {
  if (offset === null && clock.zone !== null) {
    const { first, second, exists } = clock.zone.read(local);
    return exists && first === second ? first : null;
  }
  return local - (offset ?? clock.offset ?? 0) + (clock.offset ?? 0);
}

function isTime(lockIn: KindValues['temperature or time']): lockIn is WrittenTime {
  return typeof lockIn === 'object' && 'local' in lockIn;
}

/** The member's lock-in temperature [°C]: as given, the middle of a range, or its zone's at the time given. */
export function lockInOf(
  { lock_in: lockIn }: RunValues,
  zone: Zone | null,
  time: number | null,
  clock: Clock | null,
): number | null {
  if (typeof lockIn === 'number') return lockIn;
  if (lockIn !== undefined && !isTime(lockIn)) return (lockIn.from + lockIn.to) / 2;
  return zone && clock && time !== null ? temperatureAt(zone, clock.axis, time) : null;
}

/** Notes where the lock-in temperature is worked out, and warns where nothing was given at all. */
export function noteLockIn(run: Run, row: SourceMap, values: RunValues, findings: Findings): void {
  const { lock_in: lockIn } = values;
  if (lockIn === undefined || typeof lockIn === 'number') return;
  const how = isTime(lockIn)
    ? `zone ${run.zone.name} at the time given`
    : `the middle of ${lockIn.text}`;
  const key = `runs ${run.id}: lock_in`;
  findings.derived.push({ key, value: run.lockIn, quantity: 'temperature', how });
  if (!givenValue(row, 'lock_in')) findings.warnings.push(WARNINGS.lockInAssumed(run.id));
}

interface StructureParts extends RunParts {
  /** The time of lock-in, where one was given [ms]. */
  readonly time: number | null;
  /** Stands before a key where a default is noted. */
  readonly prefix: string;
}

/** The structure behind a run; `null` for none or one with a fault, which is reported. */
export function structureOf(
  row: SourceMap,
  values: RunValues,
  parts: StructureParts,
  findings: Findings,
): Structure | null {
  if (!givenValue(row, 'structure_zone')) {
    checkAlone(row, findings);
    return null;
  }
  const zone = lookUp(parts.zones, row, 'structure_zone', findings);
  const { structure_expansion: expansion } = values;
  if (expansion === null) {
    const expected = `a value, such as ${RUN_KEYS.structure_expansion.example}, with structure_zone`;
    report(findings, placeOf(row, 'structure_expansion'), { expected });
  }
  const lockIn = structureLockIn(row, values, zone, { ...parts, findings });
  if (zone === null || expansion == null || lockIn === null) return null;
  return { zone, expansion, lockIn };
}

/** Keys of a structure mean nothing without its zone. */
function checkAlone(row: SourceMap, findings: Findings): void {
  for (const key of ['structure_expansion', 'structure_lock_in']) {
    if (!givenValue(row, key)) continue;
    const found = givenText(row, key) ?? '';
    report(findings, placeOf(row, key), { found, expected: 'nothing without structure_zone' });
  }
}

/** The structure's lock-in temperature [°C]: as given, else its own at the time, else its constant. */
function structureLockIn(
  row: SourceMap,
  values: RunValues,
  zone: Zone | null,
  { clock, time, prefix, findings }: StructureParts & { readonly findings: Findings },
): number | null {
  const { structure_lock_in: given, lock_in: lockIn } = values;
  if (given !== null) return given ?? null;
  if (zone === null || clock === null) return null;
  const note = (value: string) =>
    findings.defaults.push({ key: `${prefix}structure_lock_in`, value });
  if (zone.constant) {
    note(`the constant of zone ${zone.name}`);
    return zone.temperature[0];
  }
  if (time !== null) {
    note(`zone ${zone.name} at the time of lock_in`);
    return temperatureAt(zone, clock.axis, time);
  }
  if (lockIn === undefined || isTime(lockIn)) return null;
  return report(findings, placeOf(row, 'structure_lock_in'), {
    expected: 'a temperature, such as 18 degC, since lock_in is no time',
  });
}

function written(time: number): string {
  return new Date(time).toISOString().slice(0, 16);
}
