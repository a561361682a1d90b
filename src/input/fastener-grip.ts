import { type Findings, report } from './findings.ts';
import { FASTENER_KEYS } from './keys.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';

type FastenerValues = Values<typeof FASTENER_KEYS>;

/** Torque over preload and diameter of a bolt as delivered; from memory. */
const TORQUE_FACTOR = 0.2;

/**
 * Grip of each fastener [N]: as given, by its tightening, or none.
 *
 * @param prefix stands before the key where a default or a derived value is noted
 */
export function gripOf(values: FastenerValues, prefix: string, findings: Findings): number {
  const { tightening_torque: torque, diameter, friction, grip_share: share } = values;
  if (values.grip !== null) return values.grip;
  if (torque === null || diameter === null || friction === null || share === null) {
    findings.defaults.push({ key: `${prefix}grip`, value: '0 N' });
    return 0;
  }
  const factor = values.torque_factor ?? TORQUE_FACTOR;
  const value = gripOfTorque(torque, factor * diameter, friction * share);
  findings.derived.push({
    key: `${prefix}grip`,
    value,
    quantity: 'force',
    how: `an estimate, torque / (${factor} × diameter) × friction ${friction} × retained share ${share}`,
  });
  return value;
}

/**
 * Friction force of a tightened bolt [N]: preload T/(K·d), from memory, times what of it is left as friction.
 *
 * @param torque T [N·mm]
 * @param lever K·d [mm]
 * @param share friction coefficient times the share of the preload that is left
 */
export function gripOfTorque(torque: number, lever: number, share: number): number {
  return (torque / lever) * share;
}

/** Reports a grip given in two ways, and a tightening of which a part is missing or stands alone. */
export function checkGrip(row: SourceMap, findings: Findings): void {
  const tightened = givenValue(row, 'tightening_torque') !== undefined;
  if (tightened && givenValue(row, 'grip')) {
    const found = 'grip and tightening_torque';
    report(findings, placeOf(row, 'grip'), { found, expected: 'one of them' });
  }
  for (const key of ['diameter', 'friction', 'grip_share'] as const) {
    if (!tightened || givenValue(row, key)) continue;
    const expected = `a value, such as ${FASTENER_KEYS[key].example}, since tightening_torque is given`;
    report(findings, placeOf(row, key), { expected });
  }
  for (const key of ['friction', 'grip_share', 'torque_factor'] as const) {
    if (tightened || !givenValue(row, key)) continue;
    const found = givenText(row, key) ?? '';
    report(findings, placeOf(row, key), { found, expected: 'nothing without tightening_torque' });
  }
}
