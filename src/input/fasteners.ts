import type { Curve, Fastener } from '../model.ts';
import { checkGrip, gripOf } from './fastener-grip.ts';
import { checkStiffness, stiffnessOf } from './fastener-stiffness.ts';
import { type Findings, report } from './findings.ts';
import { FASTENER_KEYS } from './keys.ts';
import { type Library, lookUp, uniqueIds } from './library.ts';
import { readKeys } from './read-keys.ts';
import { givenText, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';
import { WARNINGS } from './warnings.ts';

/** The job's types of fastener, each with its curve. */
export function readFasteners(
  rows: readonly SourceMap[],
  curves: Library<Curve>,
  findings: Findings,
): Library<Fastener> {
  const ids = uniqueIds(rows, 'fastener', findings);
  const items = new Map<string, Fastener>();
  for (const row of rows) {
    const fastener = readFastener(row, curves, findings);
    if (fastener !== null && !items.has(fastener.id)) items.set(fastener.id, fastener);
  }
  return { noun: 'fastener', ids, items };
}

type FastenerValues = Values<typeof FASTENER_KEYS>;

function readFastener(row: SourceMap, curves: Library<Curve>, findings: Findings): Fastener | null {
  const prefix = `fasteners ${givenText(row, 'id') ?? '?'}: `;
  const { complete, values } = readKeys(FASTENER_KEYS, row, prefix, findings);
  const before = findings.issues.length;
  const curve = lookUp(curves, row, 'curve', findings);
  checkStiffness(row, findings);
  checkGrip(row, findings);
  checkShearArea(values, curve, row, findings);
  checkNeeds(values, row, findings);
  if (!complete || findings.issues.length > before) return null;
  const grip = gripOf(values, prefix, findings);
  if (grip > 0 && values.free_play === 0) {
    findings.warnings.push(WARNINGS.gripWithoutPlay(values.id));
  }
  return {
    id: values.id,
    perConnection: values.per_connection,
    stiffness: stiffnessOf(values, prefix, findings),
    freePlay: values.free_play,
    grip,
    shearArea: values.shear_area,
    shearResistance: values.shear_resistance,
    tensionResistance: values.tension_resistance,
    interaction: values.interaction,
    shearRangeLimit: shearRangeLimitOf(values),
    shearRangeRule: values.shear_range_rule,
    slottedGrip: values.slotted_grip,
    maySlot: values.may_slot,
    diameter: values.diameter,
    curve,
  };
}

/** The limit as a force [N]; one in stress times the shear area. */
function shearRangeLimitOf(values: FastenerValues): number | null {
  const limit = values.shear_range_limit;
  if (limit === null) return null;
  return limit.of === 'force' ? limit.value : limit.value * (values.shear_area ?? 0);
}

function checkShearArea(
  values: Partial<FastenerValues>,
  curve: Curve | null,
  row: SourceMap,
  findings: Findings,
): void {
  if (values.shear_area !== null) return;
  const why = [
    ...(curve?.of === 'stress' ? [`curve ${curve.id} is of stress`] : []),
    ...(values.shear_range_limit?.of === 'stress' ? ['shear_range_limit is a stress'] : []),
  ];
  if (why.length === 0) return;
  const expected = `an area, such as 84.3 mm^2, since ${why.join(' and ')}`;
  report(findings, placeOf(row, 'shear_area'), { expected });
}

/** Keys that mean nothing without others. */
function checkNeeds(values: Partial<FastenerValues>, row: SourceMap, findings: Findings): void {
  const needs = (key: keyof typeof FASTENER_KEYS, why: string) =>
    values[key] === null &&
    report(findings, placeOf(row, key), {
      expected: `a value, such as ${FASTENER_KEYS[key].example}, for ${why}`,
    });
  if (values.shear_range_rule === 'exempts') needs('shear_range_limit', 'the rule exempts');
  if (values.interaction == null) return;
  needs('shear_resistance', 'interaction');
  needs('tension_resistance', 'interaction');
}
