import type { Curve } from '../model.ts';
import { createDamageCells, type DamageCells } from './damage-cells.ts';
import { thicknessFactor } from './thickness-factor.ts';

/** Damage over range for one curve and the factors on its ranges. */
export interface DamageTable {
  readonly curve: Curve;
  /** γ on every range: load, resistance and thickness. */
  readonly factor: number;
  /** Damage over factored range, shared by all tables of the curve. */
  readonly cells: DamageCells;
}

/** The damage tables of a job. */
export interface DamageTables {
  /**
   * The table of a curve.
   *
   * @param curve an S-N curve
   * @param factor load factor × resistance factor
   * @param thickness of the member, for the curve's thickness effect [mm]; `null` for none
   */
  of(curve: Curve, factor: number, thickness: number | null): DamageTable;
}

/** Damage tables that share what is worked out once a curve. */
export function createDamageTables(): DamageTables {
  const known = new Map<Curve, DamageCells>();
  return {
    of(curve, factor, thickness) {
      const cells = known.get(curve) ?? createDamageCells(curve);
      known.set(curve, cells);
      return { curve, factor: factor * thicknessFactor(curve, thickness), cells };
    },
  };
}
