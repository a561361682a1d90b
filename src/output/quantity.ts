import type { CheckUnit } from '../model.ts';
import { type Quantity, resultUnit, type UnitSystem } from '../units.ts';

/** What a written number measures; a ratio has no unit. */
export type Written = Quantity | 'ratio';

/** The unit's name in the results, blank for a ratio. */
export function unitOf(quantity: Written, units: UnitSystem): string {
  return quantity === 'ratio' ? '' : resultUnit(quantity, units).name;
}

/** The value, given in base units, in the units of the results. */
export function inUnits(value: number, quantity: Written, units: UnitSystem): number {
  return quantity === 'ratio' ? value : resultUnit(quantity, units).from(value);
}

/** The quantity that a check's demand and limit are. */
export function quantityOf(unit: CheckUnit): Written {
  return QUANTITY[unit];
}

const QUANTITY: Record<CheckUnit, Written> = {
  N: 'force',
  MPa: 'stress',
  mm: 'length',
  '1': 'ratio',
};
