import {
  type Chain,
  type ChainSpec,
  createChain,
  moveTo,
  readForces,
  readSlips,
  readSpanForces,
} from '../../src/mechanics/chain.ts';

/** A chain from plain arrays; positions by equal spacing where only `spacing` is given. */
export function row(parts: {
  axialStiffness: number;
  spacing?: number;
  positions?: number[];
  stiffness: number[];
  freePlay?: number[];
  grip?: number[];
}): ChainSpec {
  const n = parts.stiffness.length;
  const zeros = new Array<number>(n).fill(0);
  return {
    axialStiffness: parts.axialStiffness,
    positions: Float64Array.from(parts.positions ?? zeros.map((_, i) => i * (parts.spacing ?? 1))),
    stiffness: Float64Array.from(parts.stiffness),
    freePlay: Float64Array.from(parts.freePlay ?? zeros),
    grip: Float64Array.from(parts.grip ?? zeros),
  };
}

/** The chain after a path of strains. */
export function chainAfter(spec: ChainSpec, ...strains: number[]): Chain {
  const chain = createChain(spec);
  for (const strain of strains) moveTo(chain, strain);
  return chain;
}

export function forcesOf(chain: Chain, count: number): Float64Array {
  const out = new Float64Array(count);
  readForces(chain, out);
  return out;
}

export function slipsOf(chain: Chain, count: number): Float64Array {
  const out = new Float64Array(count);
  readSlips(chain, out);
  return out;
}

export function spanForcesOf(chain: Chain, count: number): Float64Array {
  const out = new Float64Array(count - 1);
  readSpanForces(chain, out);
  return out;
}

/** Largest magnitude in a column. */
export function largest(values: ArrayLike<number>): number {
  return Math.max(0, ...Array.from(values, Math.abs));
}

/** Largest difference between two columns. */
export function difference(a: ArrayLike<number>, b: ArrayLike<number>): number {
  return largest(Array.from(a, (v, i) => v - b[i]));
}
