import type { Quantity, UnitSystem } from '../../units.ts';
import { inUnits, unitOf } from '../quantity.ts';

/**
 * A quantity to be read again, `600 mm`, with all of its digits but those that rounding made.
 *
 * @param value in base units
 */
export function exactQuantity(value: number, quantity: Quantity, units: UnitSystem): string {
  return `${Number(inUnits(value, quantity, units).toPrecision(15))} ${unitOf(quantity, units)}`;
}
