import type { Fastener } from '../../model.ts';
import type { Quantity, UnitSystem } from '../../units.ts';
import { exactQuantity } from './exact-quantity.ts';

/** One row of a job: values by key. */
export type Row = Readonly<Record<string, string | readonly string[]>>;

/** A fastener as a job's list of fasteners holds it, under a name. */
export function fastenerRow(fastener: Fastener, id: string, units: UnitSystem): Row {
  const { stiffness, curve, interaction } = fastener;
  const given = (key: string, value: number | null, quantity: Quantity) =>
    value === null ? {} : { [key]: exactQuantity(value, quantity, units) };
  return {
    id,
    per_connection: String(fastener.perConnection),
    ...(stiffness === null ? { stiffness: 'rigid' } : given('stiffness', stiffness, 'stiffness')),
    ...given('free_play', fastener.freePlay, 'length'),
    ...given('grip', fastener.grip, 'force'),
    ...given('slotted_grip', fastener.slottedGrip, 'force'),
    may_slot: String(fastener.maySlot),
    ...given('diameter', fastener.diameter, 'length'),
    ...given('shear_area', fastener.shearArea, 'area'),
    ...given('shear_resistance', fastener.shearResistance, 'force'),
    ...given('tension_resistance', fastener.tensionResistance, 'force'),
    ...(interaction === null ? {} : { interaction: String(interaction) }),
    ...given('shear_range_limit', fastener.shearRangeLimit, 'force'),
    shear_range_rule: fastener.shearRangeRule,
    ...(curve === null ? {} : { curve: curve.id }),
  };
}
