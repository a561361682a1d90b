import { type Chain, type ChainSpec, chainState, MARK, STRAIN } from './chain-state.ts';
import { bookSlide, changeMode, forceOf, releaseJoints, slipOf } from './joint.ts';
import { solveRates } from './rates.ts';
import type { RowSink } from './row-sink.ts';

export type { Chain, ChainSpec };

/** Changes of mode at one strain, per fastener, after which something is wrong with the solver. */
const MOST_IDLE = 100;

/**
 * A run of n fasteners on one member, at lock-in.
 *
 * @throws RangeError if the columns differ in length or hold no fastener.
 */
export function createChain(spec: ChainSpec): Chain {
  const chain = chainState(spec);
  resetChain(chain);
  return chain;
}

/** Brings the chain back to lock-in: no strain, no force, every bolt centred, nothing slid. */
export function resetChain(chain: Chain): void {
  const zeroed = [chain.now, chain.movement, chain.rest, chain.slideStart, chain.slid];
  for (const column of [...zeroed, chain.slipPeak, chain.slipPeakMark]) column.fill(0);
  releaseJoints(chain);
  solveRates(chain);
}

/**
 * Follows the run straight from its present mismatch strain to `strain`, from event to event: a joint starts to slip,
 * sticks, or bears. Between events everything is linear, so the path is exact and every peak of force lies at an event
 * or at the end.
 *
 * @param chain the run, changed in place
 * @param strain mismatch strain ε = α·θ − α_s·θ_s at the end of the way
 * @param sink takes the forces at every event and at the end, with a mark `leg` … `leg + 1` along the way
 * @param leg number of this way in the record's path
 * @throws Error if joints keep changing their modes at one strain, which no run should do
 */
export function moveTo(chain: Chain, strain: number, sink: RowSink | null = null, leg = 0): void {
  const { now } = chain;
  const whole = strain - now[STRAIN];
  const direction = Math.sign(whole);
  let remaining = whole;
  let idle = 0;
  while (remaining !== 0) {
    const first = firstToReach(chain, remaining);
    const step = first < 0 ? remaining : stepOf(chain, first, remaining);
    if (step !== 0) {
      remaining = first < 0 ? 0 : remaining - step;
      advance(chain, step);
      if (first >= 0) landOnLimit(chain, first, direction);
      now[STRAIN] = strain - remaining;
      now[MARK] = leg + 1 - remaining / whole;
      if (sink !== null) sink.take(chain);
      idle = 0;
    }
    if (first >= 0) {
      // Taking all joints at their limits at once settles nearly always at the first try. Should it ever go round in
      // circles, the one of the lowest number alone does not: Murty's least-index rule for a P-matrix problem.
      idle++;
      if (idle > MOST_IDLE * (chain.count + 1)) throw new Error('the run finds no way to go on');
      turnJoints(chain, direction, idle > 2 * chain.count + 8 ? first : -1);
      solveRates(chain);
    }
  }
}

/** Forces f of every connection on the member's fasteners now [N], into `out` (n). */
export function readForces(chain: Chain, out: Float64Array): void {
  for (let i = 0; i < chain.count; i++) out[i] = forceOf(chain, i);
}

/** Slips s of every joint now [mm], into `out` (n). */
export function readSlips(chain: Chain, out: Float64Array): void {
  for (let i = 0; i < chain.count; i++) out[i] = slipOf(chain, i);
}

/** Span forces N now, tension positive [N], into `out` (n − 1): the sum of the shears to the left. */
export function readSpanForces(chain: Chain, out: Float64Array): void {
  let force = 0;
  for (let j = 0; j < chain.count - 1; j++) {
    force += forceOf(chain, j);
    out[j] = force;
  }
}

/** Books the slides that are still under way, so that sliding distance and largest slip are true now. */
export function bookSlides(chain: Chain): void {
  for (let i = 0; i < chain.count; i++) {
    if (chain.mode[i] !== 0) bookSlide(chain, i, slipOf(chain, i));
  }
}

/** The joint that reaches its limit first on the way of `remaining` strain, or −1 where none does. */
function firstToReach(chain: Chain, remaining: number): number {
  const { count, movement, rate, lower, upper } = chain;
  let first = -1;
  let way = remaining;
  for (let i = 0; i < count; i++) {
    const move = rate[i] * way;
    const limit = move > 0 ? upper[i] : lower[i];
    const room = limit - movement[i];
    if (move > 0 ? move > room : move < 0 && move < room) {
      first = i;
      // a slipping joint that turned round, or one at its limit already: at once
      if (move > 0 ? room <= 0 : room >= 0) return i;
      way = room / rate[i];
    }
  }
  return first;
}

/** The strain from now to the event of joint `first`, never past the end or back. */
function stepOf(chain: Chain, first: number, remaining: number): number {
  const up = chain.rate[first] * remaining > 0;
  const room = (up ? chain.upper[first] : chain.lower[first]) - chain.movement[first];
  if (up ? room <= 0 : room >= 0) return 0;
  const step = room / chain.rate[first];
  return Math.abs(step) < Math.abs(remaining) ? step : remaining;
}

function advance(chain: Chain, step: number): void {
  const { count, movement, rate } = chain;
  for (let i = 0; i < count; i++) movement[i] += rate[i] * step;
}

/** Puts joint `first` exactly on the limit that the way led to, where rounding left it beside it. */
function landOnLimit(chain: Chain, first: number, direction: number): void {
  const up = chain.rate[first] * direction > 0;
  chain.movement[first] = up ? chain.upper[first] : chain.lower[first];
}

/** Changes the mode of every joint that is at its limit and moving outward, or of joint `only` alone. */
function turnJoints(chain: Chain, direction: number, only: number): void {
  const { count, movement, rate, lower, upper, nearness } = chain;
  const end = only < 0 ? count : only + 1;
  for (let i = Math.max(only, 0); i < end; i++) {
    const up = rate[i] * direction;
    if (up > 0) {
      if (upper[i] - movement[i] <= nearness[i]) changeMode(chain, i, 1);
    } else if (up < 0 && movement[i] - lower[i] <= nearness[i]) changeMode(chain, i, -1);
  }
}
