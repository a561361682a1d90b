import type { Fastener, Rework, Run, RunResult, SingleChange } from '../model.ts';
import { type Search, tryRun } from './candidate.ts';

/** A quantity of a run, and the run with that quantity multiplied. */
interface Quantity {
  readonly name: SingleChange['quantity'];
  readonly of: (run: Run) => number;
  readonly scaled: (run: Run, factor: number) => Run;
}

const fastenerQuantity = (name: SingleChange['quantity'], key: keyof Fastener): Quantity => ({
  name,
  of: (run) => Math.max(...run.fasteners.map((fastener) => Number(fastener[key] ?? 0))),
  scaled: (run, factor) => ({
    ...run,
    fasteners: run.fasteners.map((fastener) => {
      const value = fastener[key];
      return typeof value === 'number' ? { ...fastener, [key]: factor * value } : fastener;
    }),
  }),
});

const QUANTITIES: readonly Quantity[] = [
  fastenerQuantity('grip', 'grip'),
  fastenerQuantity('free play', 'freePlay'),
  fastenerQuantity('shear range limit', 'shearRangeLimit'),
  fastenerQuantity('stiffness', 'stiffness'),
  {
    name: 'member area',
    of: ({ member }) => member.area,
    scaled: (run, factor) => {
      const { member } = run;
      const areas = { area: factor * member.area, netArea: factor * member.netArea };
      return { ...run, member: { ...member, ...areas } };
    },
  },
];

/** A quantity is tried up to this many times and down to this share of what it is. */
const FURTHEST = 20;
/** Halvings of the factor: to within a thousandth. */
const HALVINGS = 12;
/** Longer runs are told what fails only: each try would cost more than its answer is worth. */
const MOST_FASTENERS = 100;

/**
 * Where no remedy passes: the check that stays furthest above its limit, and for each single quantity of the run as it
 * is drawn the value nearest to its own at which every check would pass, if there is one.
 */
export function reworkOf(
  { run, connections, governing }: Pick<RunResult, 'run' | 'connections' | 'governing'>,
  search: Search,
): Rework {
  const worst = connections[governing];
  return {
    kind: 'rework',
    check: worst.governing!,
    at: `${worst.run}/${worst.number}`,
    changes: (run.roles.length > MOST_FASTENERS ? [] : QUANTITIES).flatMap(
      (quantity) => singleChange(run, quantity, search) ?? [],
    ),
  };
}

function singleChange(run: Run, quantity: Quantity, search: Search): SingleChange | null {
  const own = quantity.of(run);
  if (own === 0) return null;
  const passes = (factor: number) => tryRun(quantity.scaled(run, factor), search) !== null;
  const down = nearestFactor(passes, 1 / FURTHEST);
  const up = down === null ? nearestFactor(passes, FURTHEST) : null;
  const factor = down ?? up;
  if (factor === null) return null;
  return {
    quantity: quantity.name,
    bound: down === null ? 'at least' : 'at most',
    value: factor * own,
  };
}

/** The factor nearest to 1, on the way to `furthest`, from which on the run passes; `null` where it does not even there. */
function nearestFactor(passes: (factor: number) => boolean, furthest: number): number | null {
  if (!passes(furthest)) return null;
  let [failing, passing] = [1, furthest];
  for (let halving = 0; halving < HALVINGS; halving++) {
    const middle = Math.sqrt(failing * passing);
    if (passes(middle)) passing = middle;
    else failing = middle;
  }
  return passing;
}
