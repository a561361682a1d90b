import type { Job } from '../../model.ts';
import { amount } from '../names.ts';
import { bullet } from './text-layout.ts';

/** The values that were worked out from others: `fasteners bracket: grip 1.2 kN, an estimate, …`. */
export function derivedLines({ derived, units }: Job): string[] {
  return derived.map(({ key, value, quantity, how }) =>
    bullet(`${key} ${amount(value, quantity, units)}, ${how}`),
  );
}
