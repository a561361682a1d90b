import type { Chain } from './chain-state.ts';

/**
 * Solves the movement of every fastener per unit of mismatch strain in the present state, into `chain.rate` [mm].
 *
 * Equilibrium Nᵢ − Nᵢ₋₁ = fᵢ with Nⱼ = (EA/Lⱼ)·(dᵢ₊₁ − dᵢ) − EA·ε is tridiagonal, and only the two end fasteners carry
 * a load, −EA and +EA. The chain is folded up from both ends at once onto the fastener in the middle, then unfolded.
 * `stiffness` is what the part folded so far offers to the next span; written so, nothing is ever subtracted, and
 * fasteners a million times stiffer than the spans or a billion times softer lose no digits.
 */
export function solveRates(chain: Chain): void {
  const { count, axialStiffness, tangent, spanStiffness, rate, factor, load } = chain;
  if (count === 1) {
    rate[0] = 0;
    return;
  }
  const middle = count >> 1;
  const last = count - 1;

  let leftStiffness = tangent[0];
  let leftLoad = -axialStiffness;
  let rightStiffness = tangent[last];
  let rightLoad = axialStiffness;
  let left = 0;
  let right = last;
  // both ends in one loop: two chains of divisions that do not wait for each other
  for (; left < middle - 1; left++, right--) {
    const leftSpan = spanStiffness[left];
    const rightSpan = spanStiffness[right - 1];
    const leftPivot = leftStiffness + leftSpan;
    const rightPivot = rightStiffness + rightSpan;
    const leftFactor = leftSpan / leftPivot;
    const rightFactor = rightSpan / rightPivot;
    load[left] = leftLoad / leftPivot;
    load[right] = rightLoad / rightPivot;
    factor[left] = leftFactor;
    factor[right] = rightFactor;
    leftLoad *= leftFactor;
    rightLoad *= rightFactor;
    leftStiffness = tangent[left + 1] + leftFactor * leftStiffness;
    rightStiffness = tangent[right - 1] + rightFactor * rightStiffness;
  }
  const span = spanStiffness[left];
  const pivot = leftStiffness + span;
  const fold = span / pivot;
  load[left] = leftLoad / pivot;
  factor[left] = fold;
  leftLoad *= fold;
  let meeting = fold * leftStiffness;
  if (right > middle) {
    const rightSpan = spanStiffness[right - 1];
    const rightPivot = rightStiffness + rightSpan;
    const rightFold = rightSpan / rightPivot;
    load[right] = rightLoad / rightPivot;
    factor[right] = rightFold;
    rightLoad *= rightFold;
    meeting += rightFold * rightStiffness + tangent[middle];
  } else {
    meeting += rightStiffness;
  }

  const centre = (leftLoad + rightLoad) / meeting;
  rate[middle] = centre;
  let leftRate = centre;
  let rightRate = centre;
  for (left = middle - 1, right = middle + 1; right < count; left--, right++) {
    leftRate = load[left] + factor[left] * leftRate;
    rightRate = load[right] + factor[right] * rightRate;
    rate[left] = leftRate;
    rate[right] = rightRate;
  }
  if (left === 0) rate[0] = load[0] + factor[0] * leftRate;
}
