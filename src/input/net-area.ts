import { type Findings, report } from './findings.ts';
import type { MEMBER_KEYS } from './keys.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';

type MemberValues = Values<typeof MEMBER_KEYS>;

/**
 * Net area at a fastener [mm²]: as given, or the area less its holes, or the gross area.
 *
 * @param prefix stands before the key where a default or a derived value is noted
 */
export function netAreaOf(values: MemberValues, prefix: string, findings: Findings): number {
  const { area, net_area: net, hole, thickness } = values;
  if (net !== null) return net;
  const key = `${prefix}net_area`;
  if (hole === null || thickness === null) {
    findings.defaults.push({ key, value: 'the gross area' });
    return area;
  }
  const holes = values.holes ?? 1;
  const value = area - holes * hole * thickness;
  const how = `the area less ${holes} ${holes === 1 ? 'hole' : 'holes'}`;
  findings.derived.push({ key, value, quantity: 'area', how });
  return value;
}

/** Reports a hole that does not fit the member's other values. */
export function checkHole(values: Partial<MemberValues>, row: SourceMap, findings: Findings): void {
  const { area, hole, thickness } = values;
  if (givenValue(row, 'holes') && !givenValue(row, 'hole')) {
    const found = givenText(row, 'holes') ?? '';
    report(findings, placeOf(row, 'holes'), { found, expected: 'nothing without hole' });
  }
  if (!givenValue(row, 'hole')) return;
  const found = givenText(row, 'hole') ?? '';
  if (givenValue(row, 'net_area')) {
    const expected = 'either hole or net_area, not both';
    report(findings, placeOf(row, 'hole'), { found, expected });
  }
  if (thickness === null) {
    const expected = 'a thickness, such as 6 mm, since hole is given';
    report(findings, placeOf(row, 'thickness'), { expected });
  }
  if (area === undefined || hole == null || thickness == null) return;
  if ((values.holes ?? 1) * hole * thickness < area) return;
  report(findings, placeOf(row, 'hole'), { found, expected: 'holes that leave some of the area' });
}
