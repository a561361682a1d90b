import type { ChainSpec } from '../../src/mechanics/chain.ts';

/**
 * A second opinion on a row with slip, built on nothing of the event-to-event solver. The strain grows by small steps.
 * At the end of each, every joint's force follows from its movement by implicit return mapping from the slip before
 * the step, and the movement of the first fastener is found by shooting: it is halved in until the force left at the
 * free far end is zero. Wrong only where a joint turns round inside a step, so the error falls at first order.
 *
 * Shooting loses a digit for every tenfold growth along the row: few fasteners, none much stiffer than its spans.
 */
export class SmallSteps {
  readonly slip: Float64Array;
  private readonly movement: Float64Array;
  private readonly spans: Float64Array;
  private readonly hardening: Float64Array;
  private readonly spec: ChainSpec;
  private strain = 0;

  constructor(spec: ChainSpec) {
    const { positions, axialStiffness } = spec;
    this.spec = spec;
    this.slip = new Float64Array(positions.length);
    this.movement = new Float64Array(positions.length);
    this.spans = positions.slice(1).map((x, j) => axialStiffness / (x - positions[j]));
    // a slipping joint keeps a billionth of the smaller of its spring and the softest span: k in series with this
    const softest = Math.min(...this.spans);
    this.hardening = spec.stiffness.map((k) => {
      const tangent = 1e-9 * Math.min(k, softest);
      return (k * tangent) / (k - tangent);
    });
  }

  /** Moves to a mismatch strain in `steps` equal steps. */
  moveTo(strain: number, steps: number): void {
    const from = this.strain;
    for (let s = 1; s <= steps; s++) {
      this.strain = from + ((strain - from) * s) / steps;
      this.endForce(this.balancedStart());
      for (let i = 0; i < this.slip.length; i++) this.slip[i] = this.slipAt(i, this.movement[i]);
    }
  }

  /** Shear of every fastener [N]. */
  forces(): Float64Array {
    return this.slip.map((s, i) => this.spec.stiffness[i] * (this.movement[i] - s));
  }

  /** The slip of joint i at movement d, from its slip before the step. */
  private slipAt(i: number, d: number): number {
    const k = this.spec.stiffness[i];
    const h = this.hardening[i];
    const grip = this.spec.grip[i];
    const free = this.spec.freePlay[i];
    const before = this.slip[i];
    const force = k * (d - before) - h * before;
    if (force > grip) return Math.min(free, (k * d - grip) / (k + h));
    if (force < -grip) return Math.max(-free, (k * d + grip) / (k + h));
    return before;
  }

  /** Movements along the row from that of the first fastener; returns the force left at the far end [N]. */
  private endForce(start: number): number {
    let d = start;
    let pull = 0;
    for (let i = 0; i < this.movement.length; i++) {
      this.movement[i] = d;
      pull += this.spec.stiffness[i] * (d - this.slipAt(i, d));
      if (i < this.spans.length) {
        d += (pull + this.spec.axialStiffness * this.strain) / this.spans[i];
      }
    }
    return pull;
  }

  /** The first fastener's movement at which nothing is left: the force left grows with it. */
  private balancedStart(): number {
    let reach = 1e-6;
    let low = this.movement[0];
    let high = low;
    for (; this.endForce(low) > 0; reach *= 2) low -= reach;
    for (; this.endForce(high) < 0; reach *= 2) high += reach;
    for (;;) {
      const middle = (low + high) / 2;
      if (middle === low || middle === high) return middle;
      if (this.endForce(middle) < 0) low = middle;
      else high = middle;
    }
  }
}
