import { type Chain, MARK, SLIPS_DOWN, SLIPS_UP, STUCK } from './chain-state.ts';

/**
 * One fastener: an elastic spring k in series with a joint that grips, slips and bears, f = k·(d − s), |s| ≤ c.
 * The joint slips where f − h·s = ±g; h is so small (a billionth of the softest spring) that the slip force is the
 * grip for every practical purpose, and only serves to give a run that slides as a whole one answer.
 *
 * Every change of mode keeps the force that the joint has at that moment, so that rounding never leaves the run out
 * of balance.
 */

/** Joints this near a limit, as a share of the movement that the limit stands for, are at it. */
const NEAR = 1e-10;

/** Sets every joint as at lock-in: centred, unloaded, stuck. A tight hole (c = 0) has no limits: a plain spring. */
export function releaseJoints(chain: Chain): void {
  const { stiffness, freePlay, grip } = chain;
  for (let i = 0; i < chain.count; i++) {
    const tight = freePlay[i] === 0;
    chain.mode[i] = STUCK;
    chain.tangent[i] = stiffness[i];
    chain.offset[i] = 0;
    chain.upper[i] = tight ? Number.POSITIVE_INFINITY : grip[i] / stiffness[i];
    chain.lower[i] = -chain.upper[i];
    chain.nearness[i] = (NEAR * grip[i]) / stiffness[i];
  }
}

/**
 * Changes the mode of joint i, which has reached its limit while moving `up` (+1) or down (−1): a stuck joint starts
 * to slip, a slipping one that goes on bears, a slipping one that turned round sticks.
 */
export function changeMode(chain: Chain, i: number, up: number): void {
  const mode = chain.mode[i];
  if (mode === STUCK) startSlip(chain, i, up);
  else stopSlip(chain, i, mode === up);
}

/** The slip s of joint i now [mm]. */
export function slipOf(chain: Chain, i: number): number {
  const { mode, rest, tangent, stiffness, movement } = chain;
  return mode[i] === STUCK ? rest[i] : rest[i] + (1 - tangent[i] / stiffness[i]) * movement[i];
}

/** Shear f of connection i now [N]. */
export function forceOf(chain: Chain, i: number): number {
  return chain.offset[i] + chain.tangent[i] * chain.movement[i];
}

/** Movement d of the member against the structure at joint i now [mm]. */
export function movementOf(chain: Chain, i: number): number {
  return forceOf(chain, i) / chain.stiffness[i] + slipOf(chain, i);
}

/** Books the slide of joint i up to now: sliding distance and largest slip. */
export function bookSlide(chain: Chain, i: number, slip: number): void {
  chain.slid[i] += Math.abs(slip - chain.slideStart[i]);
  chain.slideStart[i] = slip;
  if (Math.abs(slip) > chain.slipPeak[i]) {
    chain.slipPeak[i] = Math.abs(slip);
    chain.slipPeakMark[i] = chain.now[MARK];
  }
}

function startSlip(chain: Chain, i: number, up: number): void {
  const tangent = chain.slipTangent[i];
  beginMode(chain, i, up, tangent);
  chain.slideStart[i] = chain.rest[i];
  // s = rest + (1 − tangent/k)·u reaches ±c there
  const bears = (up * chain.freePlay[i] - chain.rest[i]) / (1 - tangent / chain.stiffness[i]);
  // a slipping joint that turns round is past its limit at once
  chain.upper[i] = up === SLIPS_UP ? bears : Number.NEGATIVE_INFINITY;
  chain.lower[i] = up === SLIPS_DOWN ? bears : Number.POSITIVE_INFINITY;
  chain.nearness[i] = NEAR * chain.freePlay[i];
}

function stopSlip(chain: Chain, i: number, bears: boolean): void {
  const k = chain.stiffness[i];
  const up = chain.mode[i];
  const slip = bears ? up * chain.freePlay[i] : slipOf(chain, i);
  bookSlide(chain, i, slip);
  beginMode(chain, i, STUCK, k);
  chain.rest[i] = slip;
  const grip = chain.grip[i];
  const centre = chain.slipHardening[i] * slip - chain.offset[i];
  chain.nearness[i] = (NEAR * grip) / k;
  chain.upper[i] = bears && up === SLIPS_UP ? Number.POSITIVE_INFINITY : (centre + grip) / k;
  chain.lower[i] = bears && up === SLIPS_DOWN ? Number.NEGATIVE_INFINITY : (centre - grip) / k;
}

/** Begins a mode with the force that the joint has now. */
function beginMode(chain: Chain, i: number, mode: number, tangent: number): void {
  chain.offset[i] += chain.tangent[i] * chain.movement[i];
  chain.movement[i] = 0;
  chain.mode[i] = mode;
  chain.tangent[i] = tangent;
}
