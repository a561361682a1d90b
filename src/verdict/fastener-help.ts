import type { CheckName, Connection, Fastener, Run } from '../model.ts';
import type { Arrangement } from './arrangement.ts';
import type { CheckAt, SpacingRow } from './spacing-row.ts';

/** What more fasteners do to one check. */
export interface FastenerHelp {
  readonly check: CheckName;
  /** The widest spacing tried, and the largest utilisation of the check there. */
  readonly few: SpacingRow;
  readonly fewUse: number;
  /** The closest spacing tried, and the same there. */
  readonly many: SpacingRow;
  readonly manyUse: number;
  readonly effect: 'worse' | 'none' | 'little' | 'much';
  /** Why they do not help more; `null` where they do, or where no plain reason is known. */
  readonly reason: HelpReason | null;
}

export type HelpReason =
  | {
      /** In a row of tight elastic fasteners the force builds up over the lag length √(EA·s/k) from either end. */
      readonly why: 'shear lag';
      /** Lag length at the closest and at the widest spacing, and half the fastened length of a piece [mm]. */
      readonly closeLag: number;
      readonly wideLag: number;
      readonly halfLength: number;
    }
  | { readonly why: 'rigid fasteners' }
  | {
      readonly why: 'slips both ways';
      /** Grip of one fastener [N]. */
      readonly grip: number;
      /** At the widest spacing too; else only at the closest. */
      readonly throughout: boolean;
    }
  | { readonly why: 'travel from the fixed point' }
  | { readonly why: 'member held back' }
  | { readonly why: 'more compression' };

/** A utilisation goes with the spacing to some power: under this it is as good as unchanged. */
const UNCHANGED = 0.03;

/** The end shear of a long elastic row goes with the root of the spacing, and that is little. */
const LITTLE = 0.6;

/**
 * Compares the largest utilisation of a check at the closest spacing tried with that at the widest, and says why there
 * is little between them.
 *
 * @param rows of one run, from the closest spacing to the widest; at least one
 * @param check the check that decides
 * @returns `null` where only one number of fasteners was tried, or a utilisation is none, zero or infinite
 */
export function fastenerHelp(
  rows: readonly SpacingRow[],
  check: CheckName,
  run: Run,
  arrangement: Arrangement,
): FastenerHelp | null {
  const [many, few] = [rows[0], rows[rows.length - 1]];
  const [manyAt, fewAt] = [worstOf(many, check), worstOf(few, check)];
  const [manyUse, fewUse] = [useOf(manyAt), useOf(fewAt)];
  if (manyAt === null || manyUse === null || fewUse === null || many.count === few.count) {
    return null;
  }
  const effect = effectOf(Math.log(fewUse / manyUse) / Math.log(few.spacing / many.spacing));
  const reason =
    effect === 'much' ? null : reasonOf(manyAt, { run, arrangement, many, few, fewAt });
  return { check, few, fewUse, many, manyUse, effect, reason };
}

function worstOf({ worst }: SpacingRow, name: CheckName): CheckAt | null {
  return worst.find(({ check }) => check.check === name) ?? null;
}

function useOf(at: CheckAt | null): number | null {
  const use = at?.check.utilisation ?? 0;
  return use > 0 && Number.isFinite(use) ? use : null;
}

function effectOf(power: number): FastenerHelp['effect'] {
  if (power < -UNCHANGED) return 'worse';
  if (power < UNCHANGED) return 'none';
  return power < LITTLE ? 'little' : 'much';
}

interface Circumstances {
  readonly run: Run;
  readonly arrangement: Arrangement;
  readonly many: SpacingRow;
  readonly few: SpacingRow;
  readonly fewAt: CheckAt | null;
}

function reasonOf({ check, connection }: CheckAt, around: Circumstances): HelpReason | null {
  const { fastener } = connection;
  switch (check.check) {
    case 'slot travel':
      return { why: 'travel from the fixed point' };
    case 'member damage':
    case 'yield range':
      return { why: 'member held back' };
    case 'fastener damage':
    case 'shear range':
    case 'peak shear':
    case 'combined':
      if (fastener.freePlay === 0) return rowReason(fastener, around);
      if (!slipsBothWays(connection)) return null;
      return {
        why: 'slips both ways',
        grip: fastener.grip,
        throughout: around.fewAt !== null && slipsBothWays(around.fewAt.connection),
      };
    case 'buckling':
      return around.many.memberForce > around.few.memberForce ? { why: 'more compression' } : null;
    default:
      return null;
  }
}

/** A row of tight fasteners, all fixed. */
function rowReason(fastener: Fastener, { run, arrangement, many, few }: Circumstances) {
  if (arrangement !== 'all') return null;
  const { stiffness, perConnection } = fastener;
  if (stiffness === null) return { why: 'rigid fasteners' } as const;
  const lag = ({ spacing }: SpacingRow) =>
    Math.sqrt((run.member.modulus * run.member.area * spacing) / (stiffness * perConnection));
  const fastened = run.positions[run.positions.length - 1] - run.positions[0];
  const halfLength = fastened / many.pieces / 2;
  return { why: 'shear lag', closeLag: lag(many), wideLag: lag(few), halfLength } as const;
}

/** A joint that slips one way and the other and never bears has a range of twice its grip. */
function slipsBothWays({ fastener: { grip }, shearRange }: Connection): boolean {
  return Math.abs(shearRange - 2 * grip) <= 0.02 * 2 * grip;
}
