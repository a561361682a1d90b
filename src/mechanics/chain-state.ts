import type { Overhangs } from '../model.ts';

/** What the user's run is to the chain: all per connection, so `perConnection` is already multiplied in. */
export interface ChainSpec {
  /** EA of the member [N]. */
  readonly axialStiffness: number;
  /** Fastener positions along the member, rising [mm]. */
  readonly positions: Float64Array;
  /** Shear stiffness k of each connection [N/mm]; `Infinity` is rigid: a million times the stiffest span. */
  readonly stiffness: Float64Array;
  /** Slip each way from the centre before the fastener bears, c [mm]. */
  readonly freePlay: Float64Array;
  /** Friction force before the joint slips, g [N]; under 1 N counts as 1 N where there is free play. */
  readonly grip: Float64Array;
  /** Free member beyond the first and the last fastener [mm]; none where not given. */
  readonly overhangs?: Overhangs;
}

/** A joint that holds: f = k·(d − s) with s at rest. A joint that bears is stuck too, at s = ±c. */
export const STUCK = 0;
/** A joint that slips to the right, f = +g. */
export const SLIPS_UP = 1;
/** A joint that slips to the left, f = −g. */
export const SLIPS_DOWN = -1;

/** Places in `Chain.now`. */
export const STRAIN = 0;
export const MARK = 1;

/**
 * One run and the state it is in. Columns over the fasteners, allocated once and changed in place: within one
 * state every joint is the straight line f = tangent·u + offset between the movements `lower` and `upper`.
 */
export interface Chain {
  readonly count: number;
  /** EA [N]. */
  readonly axialStiffness: number;
  /** EA/Lⱼ of each span [N/mm]. */
  readonly spanStiffness: Float64Array;
  readonly stiffness: Float64Array;
  readonly freePlay: Float64Array;
  readonly grip: Float64Array;
  /** Tangent of each joint while it slips [N/mm]. */
  readonly slipTangent: Float64Array;
  /** Growth of the slip force with slip, h [N/mm], that gives that tangent: k·h/(k + h). */
  readonly slipHardening: Float64Array;
  readonly overhangs: Overhangs;

  /** Mismatch strain, and how far along the record's path it was reached. */
  readonly now: Float64Array;
  /** `STUCK`, `SLIPS_UP` or `SLIPS_DOWN`. */
  readonly mode: Int8Array;
  /** Movement since the joint's mode began, u [mm]: small numbers keep the digits that k times all of d would lose. */
  readonly movement: Float64Array;
  readonly tangent: Float64Array;
  /** Force when the mode began [N]. */
  readonly offset: Float64Array;
  /** Slip when the mode began [mm]. */
  readonly rest: Float64Array;
  readonly lower: Float64Array;
  readonly upper: Float64Array;
  /** So near to a limit counts as at it [mm]: joints that differ by rounding only then turn together. */
  readonly nearness: Float64Array;
  /** dd/dε in the present state [mm]. */
  readonly rate: Float64Array;

  /** Slip at which the present slide began [mm]. */
  readonly slideStart: Float64Array;
  /** Σ|Δs| of the slides that have ended [mm]. */
  readonly slid: Float64Array;
  /** Largest |s| so far [mm], and the mark at which it was reached. */
  readonly slipPeak: Float64Array;
  readonly slipPeakMark: Float64Array;

  /** Elimination factors, scratch of the rate solver. */
  readonly factor: Float64Array;
  readonly load: Float64Array;
}

/** A rigid fastener's stiffness as a multiple of the stiffest span's. */
const RIGID = 1e6;
/** A slipping joint's tangent as a multiple of the smaller of k and the softest span. */
const SLIP_TANGENT = 1e-9;
/** Least grip of a joint with free play [N]. */
export const LEAST_GRIP = 1;

/**
 * A chain at lock-in: no strain, no force, every bolt centred. Its rates are not solved yet.
 *
 * @throws RangeError if the columns differ in length or hold no fastener.
 */
export function chainState(spec: ChainSpec): Chain {
  const count = spec.positions.length;
  const columns = [spec.stiffness, spec.freePlay, spec.grip];
  if (count < 1 || columns.some((column) => column.length !== count)) {
    const lengths = [count, ...columns.map((column) => column.length)].join(', ');
    throw new RangeError(`a chain takes columns of one length of at least 1, not ${lengths}`);
  }
  const column = () => new Float64Array(count);
  const spanStiffness = spansOf(spec);
  const stiffest = Math.max(...spanStiffness, 0) || spec.axialStiffness;
  const softest = Math.min(...spanStiffness, Number.POSITIVE_INFINITY);
  const stiffness = spec.stiffness.map((k) => (Number.isFinite(k) ? k : RIGID * stiffest));
  const slipTangent = stiffness.map((k) => SLIP_TANGENT * Math.min(k, softest));
  return {
    count,
    axialStiffness: spec.axialStiffness,
    spanStiffness,
    stiffness,
    freePlay: spec.freePlay,
    grip: spec.grip.map((g) => Math.max(g, LEAST_GRIP)),
    slipTangent,
    slipHardening: slipTangent.map((t, i) => (stiffness[i] * t) / (stiffness[i] - t)),
    overhangs: spec.overhangs ?? { left: 0, right: 0 },
    now: new Float64Array(2),
    mode: new Int8Array(count),
    movement: column(),
    tangent: column(),
    offset: column(),
    rest: column(),
    lower: column(),
    upper: column(),
    nearness: column(),
    rate: column(),
    slideStart: column(),
    slid: column(),
    slipPeak: column(),
    slipPeakMark: column(),
    factor: column(),
    load: column(),
  };
}

function spansOf({ positions, axialStiffness }: ChainSpec): Float64Array {
  const spans = new Float64Array(positions.length - 1);
  for (let j = 0; j < spans.length; j++) {
    spans[j] = axialStiffness / (positions[j + 1] - positions[j]);
  }
  return spans;
}
