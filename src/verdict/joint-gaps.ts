import type { Check, Connection, Demand, EndMovement, Run } from '../model.ts';
import { compare } from './checks.ts';
import { governingConnection } from './governing-connection.ts';
import { judge } from './judge.ts';

/** What the check of a joint needs of the runs beside it. */
export interface JointedRun {
  readonly run: Run;
  readonly ends: { readonly left: EndMovement; readonly right: EndMovement };
  readonly connections: readonly Connection[];
  readonly governing: number;
}

/**
 * Checks the joint at the right end of every run that has one, and adds the check to the connection beside it. The runs
 * of one line are neighbours in the order given; a gap without a neighbour closes by its own run's movement alone, and
 * between neighbours of which no gap is given the check is `not given`.
 *
 * The two ends need not be furthest out at the same time: taking each at its own worst is on the safe side.
 */
export function withJointGaps<T extends JointedRun>(runs: readonly T[]): T[] {
  return runs.map((one, r) => {
    const neighbour = runs
      .slice(r + 1)
      .find(({ run }) => run.line !== null && run.line === one.run.line);
    if (one.run.gap === null && neighbour === undefined) return one;
    const check = jointGapCheck(one.run, one.ends.right, neighbour?.ends.left ?? null);
    const connections = one.connections.with(-1, withCheck(one.connections.at(-1)!, check));
    return { ...one, connections, governing: governingConnection(connections) };
  });
}

function withCheck(connection: Connection, check: Check): Connection {
  return { ...connection, ...judge([...connection.checks, check]) };
}

/** Of what the joint must not do — close, open too far, strain its sealant — what it is nearest to. */
function jointGapCheck(run: Run, own: EndMovement, other: EndMovement | null): Check {
  const { cover, structureMovement } = run.joint;
  const slack = structureMovement + run.settingTolerance;
  const closing = together(own.outward, other?.outward, slack);
  const opening = together(own.inward, other?.inward, slack);
  const { gap } = run;
  const closed = compare('joint gap', 'mm', closing, gap);
  if (cover.kind === 'open' || gap === null) return closed;
  const further =
    cover.kind === 'lapped'
      ? compare('joint gap', 'mm', opening, cover.lap)
      : sealantCheck(closing, opening, gap, cover.movement);
  return further.utilisation! > closed.utilisation! ? further : closed;
}

/** A joint sealed when it stands narrowest has the least sealant, and all of the movement still before it. */
function sealantCheck(closing: Demand, opening: Demand, gap: number, share: number): Check {
  const narrowest = Math.max(0, gap - closing.value);
  const travel = { value: closing.value + opening.value, when: opening.when };
  return compare('joint gap', 'mm', travel, share * narrowest);
}

function together(own: Demand, other: Demand | undefined, slack: number): Demand {
  return { value: own.value + (other?.value ?? 0) + slack, when: own.when };
}
