import { type Chain, moveTo } from './chain.ts';
import { forceOf, slipOf } from './joint.ts';

/** What one connection feels at each sample of a pass. */
export interface ConnectionTrace {
  /** Shear f of the connection [N]. */
  readonly shear: Float64Array;
  /** Force of one span beside it, tension positive [N]; zero where there is no span. */
  readonly spanForce: Float64Array;
  /** Slip s of its joint [mm]. */
  readonly slip: Float64Array;
}

/**
 * Takes the chain through the record once more, sample by sample, and keeps what one connection feels.
 *
 * @param chain the run as it is at the end of a pass; left at the end of the next
 * @param strain ε at each sample
 * @param connection index of the connection, from 0
 * @param span index of the span to follow, from 0; none where it lies outside 0 … n − 2
 */
export function traceConnection(
  chain: Chain,
  strain: Float64Array,
  connection: number,
  span: number,
): ConnectionTrace {
  const column = () => new Float64Array(strain.length);
  const trace = { shear: column(), spanForce: column(), slip: column() };
  const hasSpan = span >= 0 && span < chain.count - 1;
  for (let sample = 0; sample < strain.length; sample++) {
    moveTo(chain, strain[sample]);
    trace.shear[sample] = forceOf(chain, connection);
    trace.slip[sample] = slipOf(chain, connection);
    if (hasSpan) for (let i = 0; i <= span; i++) trace.spanForce[sample] += forceOf(chain, i);
  }
  return trace;
}
