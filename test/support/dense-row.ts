import { lusolve } from 'mathjs';
import type { ChainSpec } from '../../src/mechanics/chain.ts';

/**
 * A second opinion on a row of plain springs: assembles the whole stiffness matrix of member and fasteners and solves
 * it by the LU decomposition of mathjs. Free play and grip have no part in it.
 *
 * @returns the shear of every fastener at the mismatch strain [N]
 */
export function denseRowForces(spec: ChainSpec, strain: number): Float64Array {
  const { axialStiffness, positions, stiffness } = spec;
  const n = positions.length;
  const matrix = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  const load = new Array<number>(n).fill(0);
  for (let i = 0; i < n; i++) matrix[i][i] += stiffness[i];
  for (let j = 0; j + 1 < n; j++) {
    const span = axialStiffness / (positions[j + 1] - positions[j]);
    matrix[j][j] += span;
    matrix[j + 1][j + 1] += span;
    matrix[j][j + 1] -= span;
    matrix[j + 1][j] -= span;
    load[j] -= axialStiffness * strain;
    load[j + 1] += axialStiffness * strain;
  }
  const movement = (lusolve(matrix, load) as unknown as number[][]).map(([d]) => d);
  return Float64Array.from(movement, (d, i) => stiffness[i] * d);
}
