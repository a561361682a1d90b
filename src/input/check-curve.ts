import type { Place } from '../issue.ts';
import type { Curve } from '../model.ts';
import { quantityOf } from '../units.ts';
import { type Findings, report } from './findings.ts';
import { CURVE_KEYS } from './keys.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import type { RangeValue, Values } from './values.ts';

type CurveKey = keyof typeof CURVE_KEYS;
type CurveValues = Partial<Values<typeof CURVE_KEYS>>;

/** The ways to give a curve's line, each with the keys that it needs and those that it may have. */
const WAYS = {
  points: { needs: [], may: [] },
  shape: { needs: [], may: [] },
  constant: { needs: ['slope'], may: ['threshold'] },
  formula: { needs: ['formula_unit', 'formula_from', 'formula_to'], may: [] },
} as const satisfies Partial<
  Record<CurveKey, { readonly needs: readonly CurveKey[]; readonly may: readonly CurveKey[] }>
>;
type Way = keyof typeof WAYS;
const WAY_NAMES = Object.keys(WAYS) as Way[];

/**
 * Checks how a curve's keys fit together.
 *
 * @param values its values that have no fault of their own
 * @returns what its ranges are, or `null` where that cannot be told, which is reported
 */
export function checkCurve(
  values: CurveValues,
  map: SourceMap,
  findings: Findings,
): Curve['of'] | null {
  checkPairs(map, findings);
  const ways = WAY_NAMES.filter((way) => givenValue(map, way) || values[way] != null);
  if (ways.length !== 1) {
    return report(findings, map.place, {
      found: ways.length === 0 ? 'none of them' : ways.join(' and '),
      expected: 'exactly one of points, shape, constant and formula',
    });
  }
  const [way] = ways;
  checkKeysOfWay(way, map, findings);
  if (way === 'points') checkPoints(values, findings);
  const of = rangesOf(way, values, map, findings);
  if (of === 'force') checkForceCurve(map, findings);
  if (way === 'constant') checkSlope(values, map, findings);
  return of;
}

function checkPairs(map: SourceMap, findings: Findings): void {
  const pairs = [
    ['log_n_sd', 'survival'],
    ['thickness_reference', 'thickness_exponent'],
  ] as const;
  for (const [a, b] of [...pairs, ...pairs.map(([a, b]) => [b, a] as const)]) {
    if (!givenValue(map, a) || givenValue(map, b)) continue;
    const expected = `a value, such as ${CURVE_KEYS[b].example}, since ${a} is given`;
    report(findings, placeOf(map, b), { expected });
  }
}

function checkKeysOfWay(way: Way, map: SourceMap, findings: Findings): void {
  const { needs, may }: { needs: readonly string[]; may: readonly string[] } = WAYS[way];
  for (const key of WAYS[way].needs) {
    if (givenValue(map, key)) continue;
    const expected = `a value, such as ${CURVE_KEYS[key].example}, since ${way} is given`;
    report(findings, placeOf(map, key), { expected });
  }
  for (const other of WAY_NAMES) {
    for (const key of [...WAYS[other].needs, ...WAYS[other].may]) {
      if (!givenValue(map, key) || needs.includes(key) || may.includes(key)) continue;
      const found = givenText(map, key) ?? '';
      report(findings, placeOf(map, key), { found, expected: `nothing, unless ${other} is given` });
    }
  }
}

/** What the ranges are, by their units; they and `of` must agree. */
function rangesOf(
  way: Way,
  values: CurveValues,
  map: SourceMap,
  findings: Findings,
): Curve['of'] | null {
  const ranges = givenRanges(way, values, map, findings);
  const [first] = ranges;
  if (first === undefined) return null;
  for (const { of, key, place } of ranges) {
    if (of === first.of) continue;
    const found = givenText(map, key) ?? `a ${of}`;
    const expected = `a ${first.of}, as in ${first.key}`;
    return report(findings, place, { found, expected });
  }
  return first.of;
}

interface GivenRange {
  readonly of: Curve['of'];
  readonly key: CurveKey;
  readonly place: Place;
}

function givenRanges(
  way: Way,
  values: CurveValues,
  map: SourceMap,
  findings: Findings,
): GivenRange[] {
  const ranges: GivenRange[] = [];
  const add = (key: CurveKey, of: Curve['of'] | null | undefined, place = placeOf(map, key)) => {
    if (of != null) ranges.push({ of, key, place });
  };
  const addRange = (key: CurveKey, range: RangeValue | null | undefined) => add(key, range?.of);
  add('shape', way === 'shape' ? 'stress' : null);
  for (const { range, place } of values.points ?? []) add('points', range.of, place);
  addRange('constant', values.constant);
  addRange('threshold', values.threshold);
  if (typeof values.formula_unit === 'string') {
    const of = quantityOf(values.formula_unit, ['force', 'stress']);
    add('formula_unit', of);
    if (of === null) {
      const expected = 'a unit of stress or force, such as MPa or kN';
      report(findings, placeOf(map, 'formula_unit'), { found: values.formula_unit, expected });
    }
  }
  addRange('formula_from', values.formula_from);
  addRange('formula_to', values.formula_to);
  add('of', values.of);
  return ranges;
}

/** Each point against the one before it, at its own place. */
function checkPoints({ points }: CurveValues, findings: Findings): void {
  for (let i = 1; i < (points?.length ?? 0); i++) {
    const [before, point] = [points![i - 1], points![i]];
    if (point.cycles <= before.cycles) {
      const expected = `more cycles than the ${before.cycles} of the point before`;
      report(findings, point.place, { found: `${point.cycles} cycles`, expected });
    }
    if (point.range.of === before.range.of && point.range.value >= before.range.value) {
      const found = 'a range no less than that of the point before';
      report(findings, point.place, { found, expected: 'ranges that fall as cycles rise' });
    }
  }
}

function checkForceCurve(map: SourceMap, findings: Findings): void {
  const keys = ['on', 'compression_share', 'thickness_reference', 'thickness_exponent'] as const;
  for (const key of keys) {
    if (!givenValue(map, key)) continue;
    const found = givenText(map, key) ?? '';
    report(findings, placeOf(map, key), { found, expected: 'nothing for a curve of force' });
  }
}

function checkSlope({ constant, slope }: CurveValues, map: SourceMap, findings: Findings): void {
  if (constant == null || slope == null || constant.power === slope) return;
  const found = givenText(map, 'constant') ?? '';
  const expected = `a unit to the power of the slope, ${slope}`;
  report(findings, placeOf(map, 'constant'), { found, expected });
}
