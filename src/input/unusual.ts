import { wordPlace } from '../issue.ts';
import { baseUnit, type Quantity } from '../units.ts';
import type { Findings } from './findings.ts';
import type { Key, KeyTable } from './keys.ts';
import { givenText, placeOf, type SourceMap } from './source.ts';
import { WARNINGS } from './warnings.ts';

/**
 * Warns of every value that lies outside what is usual for its key: mostly a slip of the unit.
 *
 * @param values what was read, in base units
 */
export function doubtUnusual(
  table: KeyTable,
  map: SourceMap,
  values: Readonly<Record<string, unknown>>,
  findings: Findings,
): void {
  for (const [name, key] of Object.entries(table)) {
    const value = values[name];
    const text = givenText(map, name);
    if (key.usual === undefined || text === undefined || typeof value !== 'number') continue;
    const [from, to] = key.usual;
    if (value >= from && value <= to) continue;
    const usual = `${figure(from, key)} to ${figure(to, key)}`.trim();
    findings.warnings.push(WARNINGS.unusual(wordPlace(placeOf(map, name)), text, usual));
  }
}

function figure(value: number, { kind }: Key): string {
  const unit = UNITS[kind] ?? '';
  return `${value} ${unit}`.trim();
}

/** The base unit of the kinds that have one. */
const UNITS: { readonly [kind: string]: string | undefined } = {
  ...Object.fromEntries(
    (
      [
        'length',
        'area',
        'force',
        'stress',
        'stiffness',
        'torque',
        'expansion',
        'temperature',
        'years',
      ] satisfies Quantity[]
    ).map((quantity) => [quantity, baseUnit(quantity)]),
  ),
  'stiffness or rigid': baseUnit('stiffness'),
  'temperature or time': baseUnit('temperature'),
};
