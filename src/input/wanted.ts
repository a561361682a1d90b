import { type Quantity, quantityName } from '../units.ts';
import type { Key, Kind } from './keys.ts';

/** What a key takes, as the end of a sentence that begins «expected». */
export function wanted(key: Key): string {
  if (key.choices !== undefined) return key.choices.join(' or ');
  if (key.kind in WANTED) return `${WANTED[key.kind as WordedKind]}, such as ${key.example}`;
  return `${quantityName(key.kind as Quantity)} with its unit, such as ${key.example}`;
}

type WordedKind = Exclude<Kind, Quantity | 'choice'>;

const WANTED: Record<WordedKind, string> = {
  'force or stress': 'a force or a stress with its unit',
  number: 'a number without a unit',
  'whole number': 'a whole number',
  lengths: 'a list of lengths with their units',
  text: 'a text',
  texts: 'a list of texts',
  id: 'a name that may stand in the name of a file',
  name: 'a name',
  'yes or no': 'yes or no',
  'stiffness or rigid': 'a stiffness with its unit, or rigid',
  'length at force': 'a length over 0 at a force over 0',
  'temperature or time': 'a temperature with its unit, or a time',
  fixed: 'all, middle, first, none, or a list of fastener numbers',
  points: 'a list of pairs of cycles and a range',
  constant: 'a number over 0 with a unit to the power of the slope',
  unit: 'a unit',
  map: 'a mapping of keys to values',
  list: 'a list',
  table: 'a list, or the name of a CSV file',
};
