import type { UnitSystem } from '../units.ts';
import type { Cut } from '../verdict/even-pieces.ts';
import type { SpacingRow } from '../verdict/spacing-row.ts';
import type { SpacingCase } from '../verdict/spacings.ts';
import { grouped, shortNumber } from './number-text.ts';
import { inUnits, unitOf } from './quantity.ts';

/** A length as drawn: up to 4 significant digits, whole from 1,000 on. */
export function lengthText(length: number, units: UnitSystem): string {
  const value = inUnits(length, 'length', units);
  const digits = Math.abs(value) < 1000 ? Number(value.toPrecision(4)) : Math.round(value);
  return `${grouped(digits)} ${unitOf('length', units)}`;
}

/** A row's spacing and fasteners, with the spacing asked for where that is wider. */
export function rowText({ spacing, asked, count, pieces }: SpacingRow, units: UnitSystem): string {
  const own = lengthText(spacing, units);
  const wished = lengthText(asked, units);
  const facts = [
    `${count} fasteners${pieces === 1 ? '' : ` in ${pieces} pieces`}`,
    ...(own === wished ? [] : [`${wished} asked`]),
  ];
  return `${own} (${facts.join('; ')})`;
}

/** A run, its arrangement and its pieces, such as `R2, middle fixed, in 2 pieces`. */
export function caseText({ run, arrangement, cut }: SpacingCase, units: UnitSystem): string {
  return [run.id, `${arrangement} fixed`, cutText(cut, units)]
    .filter((part) => part !== '')
    .join(', ');
}

/** Into what pieces a run is cut; blank where it is left whole. */
export function cutText(cut: Cut, units: UnitSystem): string {
  if ('longest' in cut) return `in pieces up to ${lengthText(cut.longest, units)}`;
  return cut.pieces === 1 ? '' : `in ${cut.pieces} pieces`;
}

/** How far a limit is used: `1.32 times its limit`. */
export function useText(utilisation: number): string {
  return `${useNumber(utilisation)} times its limit`;
}

/** A utilisation with the digits that tell a failing one from 1. */
export function useNumber(utilisation: number): string {
  const short = shortNumber(utilisation);
  return utilisation > 1 && short === '1' ? String(Number(utilisation.toPrecision(5))) : short;
}
