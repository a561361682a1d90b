import type { Stretch } from './stuck-stretches.ts';

const HOUR = 3_600_000;

/** A change that leaves the channel and comes back within so many samples is a spike. */
const LONGEST_SPIKE = 3;

/** How fast a channel may change: the larger of both. */
export interface FastLimits {
  /** From sample to sample, however short the step [K]. */
  readonly over: number;
  /** Times the hours of the step [K]. */
  readonly overPerHour: number;
}

/** Changes that are faster than the limits. */
export interface FastChanges {
  /** Samples that leave the channel and from which it comes back, each way faster than the limits. */
  readonly spikes: readonly Stretch[];
  /** First sample behind a fast change that does not come back. */
  readonly jumps: readonly number[];
}

/**
 * Finds spikes and jumps: a change faster than the limits is a spike of one to three samples where another one
 * brings the channel back to within the limits of where it was, and else a jump.
 *
 * @param values the channel [°C], `NaN` where missing; steps go from value to value
 * @param times time of each sample [ms], rising
 */
export function fastChanges(
  values: Float64Array,
  times: Float64Array,
  limits: FastLimits,
): FastChanges {
  const spikes: Stretch[] = [];
  const jumps: number[] = [];
  if (isCalm(values, limits.over)) return { spikes, jumps };
  let before = nextValue(values, 0);
  for (let at = nextValue(values, before + 1); at < values.length; ) {
    let behind = at;
    if (isFast(values, times, limits, before, at)) {
      const back = comesBack(values, times, limits, before, at);
      if (back === null) jumps.push(at);
      else {
        spikes.push({ first: at, last: back.last });
        behind = back.at;
      }
    }
    before = behind;
    at = nextValue(values, behind + 1);
  }
  return { spikes, jumps };
}

/** Whether no two neighbours are further apart than `over` and none is missing: nothing can be fast then. */
function isCalm(values: Float64Array, over: number): boolean {
  for (let i = 1; i < values.length; i++) {
    if (!(Math.abs(values[i] - values[i - 1]) <= over)) return false;
  }
  return true;
}

/** The sample that brings a fast change back, and the last one of the spike before it; `null` where none does. */
function comesBack(
  values: Float64Array,
  times: Float64Array,
  limits: FastLimits,
  before: number,
  first: number,
): { at: number; last: number } | null {
  let last = first;
  for (let k = 0; k < LONGEST_SPIKE; k++) {
    const at = nextValue(values, last + 1);
    if (at >= values.length) return null;
    const isBack = !isFast(values, times, limits, before, at);
    if (isBack && isFast(values, times, limits, last, at)) return { at, last };
    last = at;
  }
  return null;
}

function isFast(
  values: Float64Array,
  times: Float64Array,
  { over, overPerHour }: FastLimits,
  from: number,
  to: number,
): boolean {
  const hours = (times[to] - times[from]) / HOUR;
  return Math.abs(values[to] - values[from]) > Math.max(over, overPerHour * hours);
}

/** The first sample from one on that holds a value; the length where none does. */
function nextValue(values: Float64Array, from: number): number {
  let at = from;
  while (at < values.length && Number.isNaN(values[at])) at++;
  return at;
}
