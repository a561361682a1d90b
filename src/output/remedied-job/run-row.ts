import type { Fastener, Run } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { exactQuantity } from './exact-quantity.ts';
import type { Row } from './fastener-row.ts';

/**
 * A run as a job's list of runs holds it. What the job had worked out, such as a lock-in temperature from a time, is
 * written as what it came to.
 *
 * @param idOf the name that a type of fastener goes by in the job
 */
export function runRow(run: Run, idOf: (fastener: Fastener) => string, units: UnitSystem): Row {
  const length = (value: number) => exactQuantity(value, 'length', units);
  const { roles, slottedType, overhangs, line, gap } = run;
  const slotted = roles.includes('slotted') && slottedType !== null;
  return {
    id: run.id,
    member: run.member.id,
    zone: run.zone.name,
    fastener: idOf(run.fixedType),
    ...placesOf(run, length),
    fixed: fixedOf(run),
    ...(slotted ? { slotted: idOf(slottedType) } : {}),
    ...(overhangs.left === overhangs.right ? {} : { left_overhang: length(overhangs.left) }),
    overhang: length(overhangs.right),
    lock_in: exactQuantity(run.lockIn, 'temperature', units),
    ...structureOf(run, units),
    ...(line === null ? {} : { line }),
    ...(gap === null ? {} : { gap: length(gap), ...jointOf(run, length) }),
    setting_tolerance: length(run.settingTolerance),
    added_tension: exactQuantity(run.addedTension, 'force', units),
    added_shear: exactQuantity(run.addedShear, 'force', units),
  };
}

/** Count and spacing where the fasteners are even, else the place of each from the first. */
function placesOf({ positions }: Run, length: (value: number) => string): Row {
  const count = positions.length;
  if (count === 1) return { count: '1' };
  const places = positions.map((x) => x - positions[0]);
  const spacing = places[count - 1] / (count - 1);
  const even = places.every((x, i) => Math.abs(x - i * spacing) <= 1e-12 * places[count - 1]);
  return even
    ? { count: String(count), spacing: length(spacing) }
    : { positions: Array.from(places, length) };
}

function fixedOf({ roles }: Run): string | readonly string[] {
  const fixed = roles.flatMap((role, i) => (role === 'fixed' ? [String(i + 1)] : []));
  if (fixed.length === roles.length) return 'all';
  return fixed.length === 0 ? 'none' : fixed;
}

function structureOf({ structure }: Run, units: UnitSystem): Row {
  if (structure === null) return {};
  return {
    structure_zone: structure.zone.name,
    structure_expansion: exactQuantity(structure.expansion, 'expansion', units),
    structure_lock_in: exactQuantity(structure.lockIn, 'temperature', units),
  };
}

function jointOf({ joint }: Run, length: (value: number) => string): Row {
  const { cover, structureMovement } = joint;
  return {
    joint: cover.kind,
    ...(cover.kind === 'lapped' ? { lap: length(cover.lap) } : {}),
    ...(cover.kind === 'sealed' ? { sealant_movement: String(cover.movement) } : {}),
    structure_movement: length(structureMovement),
  };
}
