import type { Run } from '../model.ts';

/**
 * Net friction that the slotted fasteners put on a fixed one where grips differ [N a connection]: at worst those on one
 * side of it grip as hard as they may and those on the other as little, |Σ g_high − Σ g_low|.
 *
 * @param run a run with slotted fasteners
 * @param i index of a fixed fastener
 * @param spread share by which a grip may lie above or below its value, 0 … 1
 */
export function unevenFriction(run: Run, i: number, spread: number): number {
  const left = slottedGrip(run, 0, i);
  const right = slottedGrip(run, i + 1, run.roles.length);
  const [less, more] = left < right ? [left, right] : [right, left];
  return more * (1 + spread) - less * (1 - spread);
}

function slottedGrip({ roles, fasteners }: Run, from: number, to: number): number {
  let grip = 0;
  for (let i = from; i < to; i++) {
    if (roles[i] === 'slotted') grip += fasteners[i].perConnection * fasteners[i].grip;
  }
  return grip;
}
