import type { Remedy, Rework, RunResult, SingleChange } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { amount, connectionNames } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { inUnits, quantityOf, unitOf, type Written } from '../quantity.ts';
import { changedFasteners } from './changed-fasteners.ts';
import { slotLength } from './slot-length.ts';

/**
 * What a remedy does, in words to draw by: joints, spacing, slots and what is fixed, such as `slot 14 of 21 fasteners
 * (R2/1 to R2/7, R2/15 to R2/21), ±8 mm, slots 28 mm long`.
 */
export function schemeWords(
  { run }: Pick<RunResult, 'run'>,
  remedy: Remedy,
  units: UnitSystem,
): string {
  const changed = changedFasteners(run, remedy);
  const names = (numbers: readonly number[]) =>
    connectionNames(numbers.map((number) => ({ run: run.id, number })));
  const count = remedy.pieces.reduce((sum, piece) => sum + piece.run.roles.length, 0);
  const slotted = `slot ${changed.slotted.length} of ${count} fasteners (${names(changed.slotted)})`;
  return [
    ...jointWords(remedy, changed.joints, run.id, units),
    ...spacingWords(run.positions, remedy, units),
    ...(changed.slotted.length > 0 ? [slotted] : []),
    ...(changed.fixed.length > 0 ? [`fix ${names(changed.fixed)}`] : []),
    ...(Object.values(changed).some(({ length }) => length > 0) ? slotWords(remedy, units) : []),
    ...(remedy.endGap === undefined
      ? []
      : [`widen the gap at its right end to ${drawnLength(remedy.endGap, units)}`]),
  ].join(', ');
}

/** Which check stays above its limit, and by how much. */
export function reworkWords({ check, at }: Rework, units: UnitSystem): string {
  const quantity = quantityOf(check.unit);
  const demand = amount(check.demand!, quantity, units);
  const limit = amount(check.limit!, quantity, units);
  return `${check.check} at ${at} stays ${shortNumber(check.utilisation!)} times its limit (${demand}, limit ${limit})`;
}

/** A single change with which a run would pass, rounded to the safe side: `grip at most 2.52 kN`. */
export function changeWords({ quantity, bound, value }: SingleChange, units: UnitSystem): string {
  const written = CHANGED[quantity];
  const round = bound === 'at most' ? Math.floor : Math.ceil;
  const number = inUnits(value, written, units);
  const step = 10 ** (Math.floor(Math.log10(number)) - 2);
  // A step under 1 is no exact number; its inverse is.
  const rounded =
    step < 1 ? round(number / step) / Math.round(1 / step) : round(number / step) * step;
  return `${quantity} ${bound} ${rounded} ${unitOf(written, units)}`;
}

const CHANGED: Readonly<Record<SingleChange['quantity'], Written>> = {
  grip: 'force',
  'free play': 'length',
  'shear range limit': 'force',
  'member area': 'area',
  stiffness: 'stiffness',
};

/** A length that is drawn, not rounded to what a person would say. */
export function drawnLength(value: number, units: UnitSystem): string {
  const number = Number(inUnits(value, 'length', units).toFixed(units === 'SI' ? 3 : 4));
  return `${number} ${unitOf('length', units)}`;
}

function jointWords(
  { gap }: Remedy,
  joints: readonly number[],
  id: string,
  units: UnitSystem,
): string[] {
  if (gap === null || joints.length === 0) return [];
  const places = joints.map((number) => `between ${id}/${number} and ${id}/${number + 1}`);
  const count = joints.length === 1 ? 'one joint' : `${joints.length} joints`;
  return [`${count} of ${drawnLength(gap, units)} ${places.join(' and ')}`];
}

function spacingWords(
  positions: Float64Array,
  { pieces, added }: Remedy,
  units: UnitSystem,
): string[] {
  if (added === 0) return [];
  const at = (all: Float64Array) =>
    `${all.length} fasteners at ${drawnLength(widestSpan(all), units)}`;
  return [`${at(pieces[0].run.positions)} in place of ${at(positions)}`];
}

/** The widest distance between neighbouring fasteners [mm]; 0 for a single one. */
export function widestSpan(positions: Float64Array): number {
  return positions.slice(1).reduce((most, x, i) => Math.max(most, x - positions[i]), 0);
}

/** The slots of each piece, said once where they are alike. */
function slotWords({ pieces }: Remedy, units: UnitSystem): string[] {
  const each = pieces.flatMap(({ run }) => {
    const slotted = run.fasteners.find((_, i) => run.roles[i] === 'slotted');
    if (slotted === undefined) return [];
    const length = slotLength(slotted);
    const full = length === null ? '' : `, slots ${drawnLength(length, units)} long`;
    return [{ id: run.id, words: `±${drawnLength(slotted.freePlay, units)}${full}` }];
  });
  const kinds = [...new Set(each.map(({ words }) => words))];
  if (kinds.length <= 1) return kinds;
  return each.map(({ id, words }) => `${id} ${words}`);
}
