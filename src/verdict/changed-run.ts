import type { Fastener, Joint, Overhangs, Role, Run } from '../model.ts';

/**
 * The run with other roles: its fixed type where fixed, `slotted` elsewhere.
 *
 * @param roles one a fastener
 * @param slotted the type that stands where not fixed; may be `null` only where all are fixed
 * @throws RangeError if a slotted fastener is wanted and none was given, or the numbers differ
 */
export function withRoles(run: Run, roles: readonly Role[], slotted: Fastener | null): Run {
  if (roles.length !== run.positions.length) {
    throw new RangeError(`${roles.length} roles for ${run.positions.length} fasteners`);
  }
  const fasteners = roles.map((role) => (role === 'fixed' ? run.fixedType : slotted));
  if (!isComplete(fasteners)) throw new RangeError('slotted fasteners, and no type for them');
  return { ...run, roles, fasteners, slottedType: slotted };
}

/**
 * The run with its fastened length kept and its fasteners set evenly, no further apart than `spacing`.
 *
 * @param spacing widest spacing [mm]
 * @param rolesAt the roles of fasteners at given positions [mm]
 */
export function withSpacing(
  run: Run,
  spacing: number,
  rolesAt: (positions: Float64Array) => readonly Role[],
): Run {
  const first = run.positions[0];
  const length = run.positions[run.positions.length - 1] - first;
  // a spacing that divides the length but for rounding is the spacing that was asked for
  const spans = Math.max(1, Math.ceil(length / spacing - 1e-9));
  const positions =
    length === 0
      ? run.positions
      : Float64Array.from({ length: spans + 1 }, (_, i) => first + (i * length) / spans);
  return withRoles({ ...run, positions }, rolesAt(positions), run.slottedType);
}

const NEW_JOINT: Joint = { cover: { kind: 'open' }, structureMovement: 0 };

/**
 * The run cut into pieces between fasteners, at the middle of a span each. The member's ends at a cut overhang their
 * last fastener by half that span, less half the gap.
 *
 * @param firsts index of the first fastener of each piece but the first one, rising
 * @param gap width of the new gaps at lock-in [mm]
 * @returns the pieces from the left, with ids `R3.1`, `R3.2`, …, neighbours of one line
 */
export function cutRun(run: Run, firsts: readonly number[], gap: number): Run[] {
  const starts = [0, ...firsts];
  return starts.map((start, piece) => {
    const end = starts[piece + 1] ?? run.positions.length;
    const last = piece === starts.length - 1;
    return {
      ...run,
      id: `${run.id}.${piece + 1}`,
      positions: run.positions.slice(start, end),
      roles: run.roles.slice(start, end),
      fasteners: run.fasteners.slice(start, end),
      overhangs: overhangsOf(run, start, end, gap),
      line: run.line ?? run.id,
      gap: last ? run.gap : gap,
      joint: last ? run.joint : NEW_JOINT,
    };
  });
}

function overhangsOf(run: Run, start: number, end: number, gap: number): Overhangs {
  const { positions, overhangs } = run;
  const halfSpan = (i: number) => Math.max(0, (positions[i] - positions[i - 1] - gap) / 2);
  return {
    left: start === 0 ? overhangs.left : halfSpan(start),
    right: end === positions.length ? overhangs.right : halfSpan(end),
  };
}

function isComplete(fasteners: readonly (Fastener | null)[]): fasteners is Fastener[] {
  return fasteners.every((fastener) => fastener !== null);
}
