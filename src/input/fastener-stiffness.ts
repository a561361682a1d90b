import { type Findings, report } from './findings.ts';
import { FASTENER_KEYS } from './keys.ts';
import { givenValue, placeOf, type SourceMap } from './source.ts';
import type { Values } from './values.ts';

type FastenerValues = Values<typeof FASTENER_KEYS>;

const CANTILEVER = ['bracket_length', 'bracket_modulus', 'bracket_inertia'] as const;

/**
 * Stiffness of each fastener [N/mm], `null` for a rigid one: as given, or by its displacement, and in series
 * with its share of the bracket where there is one, 1/k = 1/k_fastener + n/k_bracket.
 *
 * @param prefix stands before the key where a derived value is noted
 */
export function stiffnessOf(
  values: FastenerValues,
  prefix: string,
  findings: Findings,
): number | null {
  const { stiffness, shear_displacement: displaced, per_connection: n } = values;
  const alone = stiffness === 'rigid' ? null : (stiffness ?? displaced);
  const bracket = bracketOf(values);
  if (bracket === null) {
    if (displaced !== null) {
      const how = 'force over shear_displacement';
      const key = `${prefix}stiffness`;
      findings.derived.push({ key, value: displaced, quantity: 'stiffness', how });
    }
    return alone;
  }
  const value = 1 / ((alone === null ? 0 : 1 / alone) + n / bracket.stiffness);
  const share = n === 1 ? 'its bracket' : `its share, 1 of ${n}, of the bracket`;
  findings.derived.push({
    key: `${prefix}stiffness`,
    value,
    quantity: 'stiffness',
    how: alone === null ? `${share}${bracket.how}` : `in series with ${share}${bracket.how}`,
  });
  return value;
}

function bracketOf(values: FastenerValues): { stiffness: number; how: string } | null {
  if (values.bracket_stiffness !== null) return { stiffness: values.bracket_stiffness, how: '' };
  const { bracket_length: length, bracket_modulus: e, bracket_inertia: i } = values;
  if (length === null || e === null || i === null) return null;
  return { stiffness: cantileverStiffness(length, e, i), how: ', a cantilever of 3EI/l³' };
}

/**
 * Stiffness of a cantilever at its end, 3EI/l³ (elementary beam theory) [N/mm].
 *
 * @param length l [mm]
 * @param modulus E [MPa]
 * @param inertia I [mm⁴]
 */
export function cantileverStiffness(length: number, modulus: number, inertia: number): number {
  return (3 * modulus * inertia) / length ** 3;
}

/** Reports where stiffness is given in no way or in two, and where half a cantilever is. */
export function checkStiffness(row: SourceMap, findings: Findings): void {
  const given = ['stiffness', 'shear_displacement'].filter((key) => givenValue(row, key));
  if (given.length !== 1) {
    report(findings, placeOf(row, given.length === 0 ? 'stiffness' : 'shear_displacement'), {
      ...(given.length === 0 ? {} : { found: 'both' }),
      expected: 'either stiffness, such as 2 kN/mm, or shear_displacement, such as 2.0 mm at 10 kN',
    });
  }
  const parts = CANTILEVER.filter((key) => givenValue(row, key));
  if (parts.length > 0 && givenValue(row, 'bracket_stiffness')) {
    report(findings, placeOf(row, 'bracket_stiffness'), {
      found: `bracket_stiffness and ${parts.join(', ')}`,
      expected: 'the stiffness of the bracket or its length, modulus and inertia, not both',
    });
  }
  for (const key of parts.length === 0 ? [] : CANTILEVER) {
    if (givenValue(row, key)) continue;
    const expected = `a value, such as ${FASTENER_KEYS[key].example}, since ${parts.join(' and ')} ${parts.length === 1 ? 'is' : 'are'} given`;
    report(findings, placeOf(row, key), { expected });
  }
}
