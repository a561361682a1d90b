import { type CurveTraits, constantCurve, pointsCurve } from '../damage/curve.ts';
import { formulaCurve } from '../damage/formula-curve.ts';
import { standardCurve } from '../damage/standard-shapes.ts';
import { survivalDivisor } from '../damage/survival.ts';
import type { Curve } from '../model.ts';
import { readQuantity } from '../units.ts';
import { checkCurve } from './check-curve.ts';
import type { CurveRow } from './curve-rows.ts';
import { type Findings, report } from './findings.ts';
import { CURVE_KEYS } from './keys.ts';
import { type Library, uniqueIds } from './library.ts';
import { readKeys } from './read-keys.ts';
import { givenText, placeOf } from './source.ts';
import type { Values } from './values.ts';
import { WARNINGS } from './warnings.ts';

/** The job's curves, built from what the user gave. */
export async function readCurves(
  rows: readonly CurveRow[],
  findings: Findings,
): Promise<Library<Curve>> {
  const ids = uniqueIds(
    rows.map(({ map }) => map),
    'curve',
    findings,
  );
  const items = new Map<string, Curve>();
  for (const row of rows) {
    const curve = row.points === 'faulty' ? null : await readCurve(row, findings);
    if (curve !== null && !items.has(curve.id)) items.set(curve.id, curve);
  }
  return { noun: 'curve', ids, items };
}

type CurveValues = Values<typeof CURVE_KEYS>;

async function readCurve({ map, points }: CurveRow, findings: Findings): Promise<Curve | null> {
  const prefix = `curves ${givenText(map, 'id') ?? '?'}: `;
  const read = readKeys(CURVE_KEYS, map, prefix, findings);
  const values = points === null || points === 'faulty' ? read.values : { ...read.values, points };
  const before = findings.issues.length;
  const of = checkCurve(values, map, findings);
  if (!read.complete || of === null || findings.issues.length > before) return null;
  const whole = values as CurveValues;
  const curve = await build(whole, traitsOf(whole, of));
  if (typeof curve === 'string') {
    const key = (['shape', 'constant', 'formula'] as const).find((name) => whole[name] !== null);
    const found = givenText(map, key ?? 'points') ?? `${whole.points?.length} points`;
    return report(findings, placeOf(map, key ?? 'points'), { found, expected: curve });
  }
  noteDefaults(whole, curve, prefix, findings);
  const characteristic = whole.characteristic ?? whole.shape !== null;
  if (characteristic && whole.survival !== null) {
    findings.warnings.push(WARNINGS.characteristicWithScatter(curve.id));
  }
  return curve;
}

/** Notes what was left out and stands as the curve's builder set it. */
function noteDefaults(values: CurveValues, curve: Curve, prefix: string, findings: Findings): void {
  const note = (key: keyof CurveValues, value: string) => {
    if (values[key] === null) findings.defaults.push({ key: `${prefix}${key}`, value });
  };
  note('below', curve.below);
  if (curve.of === 'force') return;
  note('on', curve.on);
  note('compression_share', `${curve.compressionShare}`);
}

function traitsOf(values: CurveValues, of: Curve['of']): CurveTraits {
  const { log_n_sd: deviation, survival } = values;
  const { thickness_reference: reference, thickness_exponent: exponent } = values;
  return {
    id: values.id,
    of,
    on: values.on ?? undefined,
    below: values.below ?? undefined,
    compressionShare: values.compression_share ?? undefined,
    survivalDivisor:
      deviation === null || survival === null ? 1 : survivalDivisor(deviation, survival),
    thicknessEffect: reference === null || exponent === null ? null : { reference, exponent },
  };
}

/** The curve, or what its builder expected; the values are checked and one way to give it is there. */
async function build(values: CurveValues, traits: CurveTraits): Promise<Curve | string> {
  const { points, shape, constant, formula } = values;
  if (points !== null) {
    const cycles = Float64Array.from(points, (point) => point.cycles);
    return pointsCurve(
      traits,
      cycles,
      Float64Array.from(points, ({ range }) => range.value),
    );
  }
  if (shape !== null) return standardCurve(traits, shape);
  if (constant !== null) {
    const threshold = values.threshold?.value ?? null;
    const slope = values.slope ?? constant.power;
    return constantCurve(traits, { constant: constant.value, slope, threshold, unit: 1 });
  }
  return formulaCurve(traits, {
    formula: formula ?? '',
    unit: readQuantity('1', traits.of, values.formula_unit ?? '').value ?? 1,
    from: values.formula_from?.value ?? 0,
    to: values.formula_to?.value ?? 0,
  });
}
