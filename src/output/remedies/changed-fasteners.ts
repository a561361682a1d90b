import type { Fastener, Remedy, Role, Run } from '../../model.ts';

/** Numbers, from 1, of the fasteners of a run that its remedy changes. */
export interface ChangedFasteners {
  /** Those that stand in a slot, and did not, or in one of another kind. */
  readonly slotted: readonly number[];
  /** Those that were slotted and are fixed. */
  readonly fixed: readonly number[];
  /** Each new joint lies between this fastener and the next. */
  readonly joints: readonly number[];
}

/**
 * What a remedy changes along a run. Where it adds fasteners none stays where it was: the numbers are then those of the
 * new run, and every slotted one is named.
 */
export function changedFasteners(run: Run, { pieces, added }: Remedy): ChangedFasteners {
  const fasteners = pieces.flatMap((piece) => piece.run.fasteners);
  const roles = pieces.flatMap((piece) => piece.run.roles);
  const isNew = (i: number) => added > 0 || differs(fasteners[i], run.fasteners[i]);
  const numbers = (role: Role, changed: (i: number) => boolean) =>
    roles.flatMap((one, i) => (one === role && changed(i) ? [i + 1] : []));
  const ends = pieces.map((_, p) =>
    pieces.slice(0, p + 1).reduce((count, piece) => count + piece.run.roles.length, 0),
  );
  return {
    slotted: numbers('slotted', isNew),
    fixed: numbers('fixed', (i) => added === 0 && run.roles[i] === 'slotted'),
    joints: ends.slice(0, -1),
  };
}

/** Whether a slot is another one than before, whatever it is called. */
function differs(one: Fastener, other: Fastener): boolean {
  return one.freePlay !== other.freePlay || one.grip !== other.grip;
}
