import type { BucklingRule, Curve, Member } from '../model.ts';
import { type Findings, report } from './findings.ts';
import { MEMBER_KEYS } from './keys.ts';
import { type Library, lookUp, uniqueIds } from './library.ts';
import { checkHole, netAreaOf } from './net-area.ts';
import { readKeys } from './read-keys.ts';
import { givenText, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';
import { WARNINGS } from './warnings.ts';

/** The job's members, each with its curve. */
export function readMembers(
  rows: readonly SourceMap[],
  curves: Library<Curve>,
  findings: Findings,
): Library<Member> {
  const ids = uniqueIds(rows, 'member', findings);
  const items = new Map<string, Member>();
  for (const row of rows) {
    const member = readMember(row, curves, findings);
    if (member !== null && !items.has(member.id)) items.set(member.id, member);
  }
  return { noun: 'member', ids, items };
}

type MemberValues = Values<typeof MEMBER_KEYS>;

function readMember(row: SourceMap, curves: Library<Curve>, findings: Findings): Member | null {
  const prefix = `members ${givenText(row, 'id') ?? '?'}: `;
  const { complete, values } = readKeys(MEMBER_KEYS, row, prefix, findings);
  const before = findings.issues.length;
  const curve = lookUp(curves, row, 'curve', findings);
  checkCurve(curve, row, findings);
  checkNetArea(values, row, findings);
  checkHole(values, row, findings);
  checkBuckling(values, row, findings);
  if (!complete || findings.issues.length > before) return null;
  const { area } = values;
  if (curve?.thicknessEffect && values.thickness === null) {
    findings.warnings.push(WARNINGS.thicknessUnknown(values.id, curve.id));
  }
  return {
    id: values.id,
    modulus: values.modulus,
    expansion: values.expansion,
    area,
    netArea: netAreaOf(values, prefix, findings),
    inertia: values.inertia,
    yield: values.yield,
    buckling: bucklingOf(values),
    bucklingFactor: values.buckling_factor,
    stressFactor: values.stress_factor,
    thickness: values.thickness,
    curve,
  };
}

function bucklingOf(values: MemberValues): BucklingRule | null {
  if (values.buckling !== 'EN') return values.buckling === null ? null : { rule: 'AISC' };
  const [imperfection, plateau] = [values.buckling_imperfection, values.buckling_plateau];
  if (imperfection === null || plateau === null) return null;
  return { rule: 'EN', imperfection, plateau };
}

function checkCurve(curve: Curve | null, row: SourceMap, findings: Findings): void {
  if (curve?.of !== 'force') return;
  const found = `${curve.id}, a curve of force`;
  report(findings, placeOf(row, 'curve'), { found, expected: 'a curve of stress for a member' });
}

function checkNetArea(values: Partial<MemberValues>, row: SourceMap, findings: Findings): void {
  const { area, net_area: net } = values;
  if (area === undefined || net == null || net <= area) return;
  const found = givenText(row, 'net_area') ?? '';
  report(findings, placeOf(row, 'net_area'), { found, expected: 'no more than the area' });
}

/** Each rule of buckling needs its figures, and figures without a rule that uses them are a slip. */
function checkBuckling(values: Partial<MemberValues>, row: SourceMap, findings: Findings): void {
  const { buckling } = values;
  if (buckling === undefined) return;
  const needed = ['inertia', 'yield'] as const;
  const ofEn = ['buckling_imperfection', 'buckling_plateau'] as const;
  for (const key of buckling === null ? [] : [...needed, ...(buckling === 'EN' ? ofEn : [])]) {
    if (values[key] !== null) continue;
    const { example } = MEMBER_KEYS[key];
    const expected = `a value, such as ${example}, for buckling by ${buckling}`;
    report(findings, placeOf(row, key), { expected });
  }
  for (const key of buckling === 'EN' ? [] : ofEn) {
    if (values[key] == null) continue;
    const found = givenText(row, key) ?? '';
    report(findings, placeOf(row, key), { found, expected: 'nothing, unless buckling is EN' });
  }
}
