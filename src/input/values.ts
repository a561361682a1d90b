import type { Issue, Place } from '../issue.ts';
import type { Curve } from '../model.ts';
import type { Quantity } from '../units.ts';
import type { WrittenTime } from './iso-time.ts';
import type { Key, KeyTable } from './keys.ts';
import type { Source, SourceList, SourceMap } from './source.ts';

/** A range in MPa or N, and which of the two. */
export interface RangeValue {
  readonly value: number;
  readonly of: Curve['of'];
}

/** Two temperatures that something lay between [°C], as the user wrote them. */
export interface TemperatureRange {
  readonly from: number;
  readonly to: number;
  readonly text: string;
}

/** A point of an S-N curve. */
export interface PointValue {
  readonly cycles: number;
  readonly range: RangeValue;
  readonly place: Place;
}

/** C of N = C/S^m in base units, and the power m in its unit. */
export interface ConstantValue extends RangeValue {
  readonly power: number;
}

type QuantityValues = { readonly [Q in Quantity]: number };

/** What the reading of each kind gives, in base units. */
export interface KindValues extends QuantityValues {
  'force or stress': RangeValue;
  number: number;
  'whole number': number;
  lengths: readonly number[];
  texts: readonly string[];
  text: string;
  id: string;
  name: string;
  'yes or no': boolean;
  choice: string;
  'stiffness or rigid': number | 'rigid';
  'length at force': number;
  'temperature or time': number | WrittenTime | TemperatureRange;
  fixed: 'all' | 'middle' | 'first' | 'none' | readonly number[];
  points: readonly PointValue[];
  constant: ConstantValue;
  unit: string;
  map: SourceMap;
  list: SourceList;
  table: Source;
}

type ValueOf<K extends Key> = K extends { readonly choices: readonly (infer C)[] }
  ? C
  : KindValues[K['kind']];

/** The values of a table of keys; `null` for a key that may be left out and was. */
export type Values<T extends KeyTable> = {
  readonly [N in keyof T]: T[N] extends { readonly required: true } | { readonly default: string }
    ? ValueOf<T[N]>
    : ValueOf<T[N]> | null;
};

/** Something wrong with a value, at its own place unless the fault names another. */
export type Fault = Omit<Issue, 'place'> & { readonly place?: Place };

export type Outcome<T> = { readonly value: T } | { readonly faults: readonly Fault[] };

/** A text was wanted and a list or a mapping stands there, or the other way round. */
export function wrongForm(found: Source, expected: string): Outcome<never> {
  const what = { text: undefined, list: 'a list', map: 'a mapping of keys to values' }[found.type];
  return fault(what ?? (found as { text: string }).text, expected);
}

/** The outcome of one fault. */
export function fault(found: string, expected: string, hint?: string): Outcome<never> {
  return { faults: [hint === undefined ? { found, expected } : { found, expected, hint }] };
}
