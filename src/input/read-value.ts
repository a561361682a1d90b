import {
  baseUnit,
  type Quantity,
  quantityName,
  quantityOf,
  readNumber,
  readQuantity,
} from '../units.ts';
import { boundsText, isWithin } from './bounds.ts';
import { columnUnitFault } from './column-unit.ts';
import type { Key, Kind } from './keys.ts';
import { readFixed, readLengths, readPoints, readTexts } from './read-list.ts';
import { readLockIn } from './read-lock-in.ts';
import type { Source, SourceText } from './source.ts';
import {
  type ConstantValue,
  fault,
  type KindValues,
  type Outcome,
  type RangeValue,
  wrongForm,
} from './values.ts';
import { wanted } from './wanted.ts';

/**
 * Reads one value as its key demands: kind, unit, words and bounds.
 *
 * @returns the value in base units, or its faults
 */
export function readValue<K extends Kind>(
  key: Key & { readonly kind: K },
  source: Source,
): Outcome<KindValues[K]> {
  const fault = columnUnitFault(source, key);
  return fault === null ? READERS[key.kind](source, key) : { faults: [fault] };
}

type TextReader<T> = (source: SourceText, key: Key) => Outcome<T>;
type Reader<T> = (source: Source, key: Key) => Outcome<T>;

const READERS: { readonly [K in Kind]: Reader<KindValues[K]> } = {
  length: quantity('length'),
  area: quantity('area'),
  'second moment of area': quantity('second moment of area'),
  force: quantity('force'),
  stress: quantity('stress'),
  stiffness: quantity('stiffness'),
  torque: quantity('torque'),
  expansion: quantity('expansion'),
  temperature: quantity('temperature'),
  'temperature difference': quantity('temperature difference'),
  years: quantity('years'),
  hours: quantity('hours'),
  irradiance: quantity('irradiance'),
  speed: quantity('speed'),
  'film coefficient': quantity('film coefficient'),
  angle: quantity('angle'),
  'mass per length': quantity('mass per length'),
  'heat capacity': quantity('heat capacity'),
  'force or stress': text(readRange),
  number: text(readPlainNumber),
  'whole number': text(readWholeNumber),
  text: text(readOneLine),
  name: text(readOneLine),
  unit: text(({ text }) => ({ value: text })),
  id: text(readId),
  'yes or no': text(readYesOrNo),
  choice: text(readChoice),
  'stiffness or rigid': text(readStiffness),
  'length at force': text(readLengthAtForce),
  'temperature or time': text(readLockIn(quantity('temperature'))),
  constant: text(readConstant),
  lengths: (source, key) => readLengths(source, key, text(quantity('length'))),
  texts: readTexts,
  fixed: (source, key) => readFixed(source, key, text(readWholeNumber)),
  points: (source, key) => readPoints(source, key, text(readPlainNumber), text(readRange)),
  map: (source, key) =>
    source.type === 'map' ? { value: source } : wrongForm(source, wanted(key)),
  list: (source, key) =>
    source.type === 'list' ? { value: source } : wrongForm(source, wanted(key)),
  table: (source) => ({ value: source }),
};

function text<T>(reader: TextReader<T>): Reader<T> {
  return (source, key) =>
    source.type === 'text' ? reader(source, key) : wrongForm(source, wanted(key));
}

function quantity(of: Quantity): Reader<number> {
  return text(({ text: typed, column }, key) => {
    const { value, hint } = readQuantity(typed, of, column?.unit);
    const name = quantityName(of);
    if (value === null) return fault(typed, wanted(key), hint);
    return bounded(value, typed, key, { name, unit: baseUnit(of) });
  });
}

interface Measure {
  readonly name: string;
  readonly unit: string;
}

function bounded(value: number, typed: string, key: Key, measure: Measure): Outcome<number> {
  if (isWithin(value, key)) return { value };
  const bounds = boundsText(value, key, measure.unit);
  return fault(typed, `${measure.name}${bounds}, such as ${key.example}`, key.slip);
}

function readPlainNumber({ text: typed }: SourceText, key: Key): Outcome<number> {
  const value = readNumber(typed);
  if (value === null) return fault(typed, wanted(key));
  return bounded(value, typed, key, { name: 'a number', unit: '' });
}

function readWholeNumber({ text: typed }: SourceText, key: Key): Outcome<number> {
  if (!/^\d{1,9}$/.test(typed)) return fault(typed, wanted(key));
  return bounded(Number(typed), typed, key, { name: 'a whole number', unit: '' });
}

function readRange(source: SourceText, key: Key): Outcome<RangeValue> {
  const { text: typed, column } = source;
  const unit = column?.unit;
  const of = quantityOf(typed, ['force', 'stress']) ?? quantityOf(unit ?? '', ['force', 'stress']);
  const read = of === null ? { value: null } : readQuantity(typed, of, unit);
  if (of === null || read.value === null) {
    return fault(typed, wanted(key), read.hint);
  }
  const outcome = bounded(read.value, typed, key, { name: quantityName(of), unit: baseUnit(of) });
  return 'faults' in outcome ? outcome : { value: { value: outcome.value, of } };
}

function readId({ text: typed }: SourceText): Outcome<string> {
  const safe = /^[^/\\:*?"<>|\p{Cc}]{1,100}$/u.test(typed) && !/^[. ]|[. ]$/.test(typed);
  const reserved = /^(?:con|prn|aux|nul|com\d|lpt\d)(?:\.|$)/i.test(typed);
  const formula = /^[=+@-]/.test(typed);
  if (safe && !reserved && !formula) return { value: typed };
  const hint = reserved
    ? 'Some systems keep this name for a device.'
    : formula
      ? 'A spreadsheet that opens the results would take it for a formula.'
      : 'No full stop or space at an end, at most 100 characters, none of / \\ : * ? " < > |.';
  return fault(typed, 'a name that may stand in the name of a file', hint);
}

/** Texts stand in tables and on terminals, which line ends and other control characters would upset. */
function readOneLine({ text: typed }: SourceText): Outcome<string> {
  if (!/\p{Cc}/u.test(typed)) return { value: typed };
  return fault(typed, 'a text on one line, without control characters');
}

function readYesOrNo({ text: typed }: SourceText, key: Key): Outcome<boolean> {
  if (/^(?:true|yes)$/i.test(typed)) return { value: true };
  if (/^(?:false|no)$/i.test(typed)) return { value: false };
  return fault(typed, wanted(key));
}

function readChoice({ text: typed }: SourceText, key: Key): Outcome<string> {
  const choices = key.choices ?? [];
  return choices.includes(typed) ? { value: typed } : fault(typed, wanted(key));
}

function readStiffness(source: SourceText, key: Key): Outcome<number | 'rigid'> {
  return source.text === 'rigid' ? { value: 'rigid' } : quantity('stiffness')(source, key);
}

/** A stiffness [N/mm] as `2.0 mm at 10 kN`. */
function readLengthAtForce({ text: typed }: SourceText, key: Key): Outcome<number> {
  const [length, force] = typed.split(/\s+at\s+/);
  const displacement = readQuantity(length, 'length').value;
  const shear = readQuantity(force ?? '', 'force').value;
  if (displacement !== null && displacement > 0 && shear !== null && shear > 0) {
    return { value: shear / displacement };
  }
  return fault(typed, wanted(key));
}

/** C of N = C/S^m, such as `1.02e12 MPa^3`: any unit of stress or force, to the power m. */
function readConstant({ text: typed }: SourceText, key: Key): Outcome<ConstantValue> {
  const match = /^(\S+)\s+([^\s^]+)\s*\^\s*(\S+)$/.exec(typed);
  const [number, unit, power] = match === null ? ['', '', ''] : match.slice(1);
  const [constant, exponent] = [readNumber(number), readNumber(power)];
  const of = quantityOf(unit, ['force', 'stress']);
  const size = of === null ? null : readQuantity('1', of, unit).value;
  if (constant !== null && constant > 0 && exponent !== null && of !== null && size !== null) {
    return { value: { value: constant * size ** exponent, of, power: exponent } };
  }
  return fault(typed, wanted(key));
}
