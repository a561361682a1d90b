import { converter, type Quantity } from '../units.ts';
import type { Key, Kind } from './keys.ts';
import type { Source } from './source.ts';
import type { Fault } from './values.ts';

/** A fault at the header where the unit of a value's column is none that the value can take. */
export function columnUnitFault(source: Source, key: Key): Fault | null {
  if (source.type !== 'text' || source.column?.unit === undefined) return null;
  const { unit, place } = source.column;
  const takes = TAKES[key.kind] ?? [];
  if (takes.some((quantity) => converter(unit, quantity) !== null)) return null;
  const expected =
    takes.length === 0 ? 'no unit for this column' : `a unit such as that of ${key.example}`;
  return { place, found: `[${unit}]`, expected };
}

/** What the unit of a column may measure, by the kind of its values; the other kinds take no unit. */
const TAKES: { readonly [K in Kind]?: readonly Quantity[] } = {
  length: ['length'],
  area: ['area'],
  'second moment of area': ['second moment of area'],
  force: ['force'],
  stress: ['stress'],
  stiffness: ['stiffness'],
  torque: ['torque'],
  expansion: ['expansion'],
  temperature: ['temperature'],
  'temperature difference': ['temperature difference'],
  years: ['years'],
  hours: ['hours'],
  irradiance: ['irradiance'],
  speed: ['speed'],
  'film coefficient': ['film coefficient'],
  angle: ['angle'],
  'mass per length': ['mass per length'],
  'heat capacity': ['heat capacity'],
  'force or stress': ['force', 'stress'],
  'stiffness or rigid': ['stiffness'],
  'temperature or time': ['temperature'],
  lengths: ['length'],
};
