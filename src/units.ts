/**
 * The edge between the user's units and the base units of the core (N, mm, MPa, K, °C, years, h).
 * The unit names, their sizes and the arithmetic of compound units are those of mathjs.
 */
import { createComplexClass, createFractionClass, createUnitClass } from 'mathjs';

/** What a number measures. A temperature and a difference of temperatures are different things. */
export type Quantity =
  | 'length'
  | 'area'
  | 'second moment of area'
  | 'force'
  | 'stress'
  | 'stiffness'
  | 'torque'
  | 'expansion'
  | 'temperature'
  | 'temperature difference'
  | 'years'
  | 'hours'
  | 'irradiance'
  | 'speed'
  | 'film coefficient'
  | 'angle'
  | 'mass per length'
  | 'heat capacity';

export type UnitSystem = 'SI' | 'US';

/** A number in base units; `null` where the text is no such quantity, with what is known of why. */
export interface Reading {
  readonly value: number | null;
  readonly hint?: string;
}

interface QuantityUnits {
  /** As it stands in a message. */
  readonly name: string;
  readonly base: string;
  readonly SI: string;
  readonly US: string;
}

const QUANTITIES: Record<Quantity, QuantityUnits> = {
  length: { name: 'a length', base: 'mm', SI: 'mm', US: 'in' },
  area: { name: 'an area', base: 'mm^2', SI: 'mm^2', US: 'in^2' },
  'second moment of area': {
    name: 'a second moment of area',
    base: 'mm^4',
    SI: 'mm^4',
    US: 'in^4',
  },
  force: { name: 'a force', base: 'N', SI: 'kN', US: 'kip' },
  stress: { name: 'a stress', base: 'MPa', SI: 'MPa', US: 'ksi' },
  stiffness: { name: 'a stiffness', base: 'N/mm', SI: 'kN/mm', US: 'kip/in' },
  torque: { name: 'a torque', base: 'N*mm', SI: 'N*m', US: 'ft*lbf' },
  expansion: {
    name: 'an expansion',
    base: 'K^-1',
    SI: 'K^-1',
    US: 'degF^-1',
  },
  temperature: { name: 'a temperature', base: 'K', SI: 'degC', US: 'degF' },
  'temperature difference': {
    name: 'a temperature difference',
    base: 'K',
    SI: 'K',
    US: 'degF',
  },
  years: { name: 'a time', base: 'year', SI: 'year', US: 'year' },
  hours: { name: 'a time', base: 'h', SI: 'h', US: 'h' },
  irradiance: { name: 'an irradiance', base: 'W/m^2', SI: 'W/m^2', US: 'W/m^2' },
  speed: { name: 'a speed', base: 'm/s', SI: 'm/s', US: 'ft/s' },
  'film coefficient': {
    name: 'a film coefficient',
    base: 'W/m^2/K',
    SI: 'W/m^2/K',
    US: 'BTU/h/ft^2/degF',
  },
  angle: { name: 'an angle', base: 'deg', SI: 'deg', US: 'deg' },
  'mass per length': { name: 'a mass per length', base: 'kg/m', SI: 'kg/m', US: 'lb/ft' },
  'heat capacity': {
    name: 'a heat capacity',
    base: 'J/kg/K',
    SI: 'J/kg/K',
    US: 'BTU/lb/degF',
  },
};

/** What each temperature scale reads at 0 °C. */
const ICE_POINT: Readonly<Record<string, number>> = { degC: 0, K: 273.15, degF: 32 };

/**
 * Reads a quantity written as a number and its unit, such as `600 mm`, `6.5e-6 / degF` or `9/16 in`.
 * A bare number takes the unit of its column where there is one, and is refused where there is none.
 *
 * @param text the user's text
 * @param quantity what it must measure
 * @param columnUnit unit in the column's header, which may hold a power of ten, such as `1e-6/K`
 * @returns the value in base units (a temperature in °C), or `null`
 */
export function readQuantity(text: string, quantity: Quantity, columnUnit?: string): Reading {
  const { number, unit } = split(text);
  if (number === null) return { value: null, ...numberHint(text) };
  const slip = SLIPS.find(([wrong]) => wrong.test(unit === '' ? (columnUnit ?? '') : unit));
  if (slip !== undefined) return { value: null, hint: slip[1] };
  const unitText = unit === '' ? columnUnit : unit;
  // «6 5 mm» is no 30 mm.
  const known = /^\d/.test(unit) ? null : converter(unitText ?? '', quantity);
  const value = known?.(number) ?? null;
  return value !== null && Number.isFinite(value)
    ? { value }
    : { value: null, ...numberHint(text) };
}

/**
 * How bare numbers in a unit turn into a quantity's base unit; `null` where it is no unit of the quantity.
 * Reads many numbers far faster than `readQuantity` does.
 */
export function converter(unit: string, quantity: Quantity): ((value: number) => number) | null {
  const scale = split(unit);
  const size = sizeOf(scale.unit, quantity);
  if (size === null) return null;
  const factor = scale.number ?? 1;
  const zero = quantity === 'temperature' ? ICE_POINT[scale.unit] : 0;
  return (value) => (value * factor - zero) * size;
}

/** The quantity as it stands in a message, `a length`. */
export function quantityName(quantity: Quantity): string {
  return QUANTITIES[quantity].name;
}

/** The quantity's base unit as a user may write it, `mm`. */
export function baseUnit(quantity: Quantity): string {
  return quantity === 'temperature' ? 'degC' : QUANTITIES[quantity].base;
}

/**
 * The first of the quantities that the text is a unit of, or `null`.
 * @param text a unit, or a quantity with its unit
 */
export function quantityOf<Q extends Quantity>(text: string, among: readonly Q[]): Q | null {
  const { unit } = split(text);
  return among.find((quantity) => unit !== '' && converter(unit, quantity) !== null) ?? null;
}

/** True where the text is a unit alone, such as `kN/mm`, or one with a power of ten, such as `1e-6/K`. */
export function isUnit(text: string): boolean {
  const { number, unit } = split(text);
  if (unit === '' || (number !== null && number !== 1 && !/^1e/.test(plainCharacters(text)))) {
    return false;
  }
  return quantityOf(text, Object.keys(QUANTITIES) as Quantity[]) !== null;
}

/** Reads a number without a unit, such as `1.35`, `1e4` or `60 %` (0.6); `null` where it is none. */
export function readNumber(text: string): number | null {
  const { number, unit } = split(text);
  if (number === null || !Number.isFinite(number)) return null;
  if (unit === '') return number;
  return unit === '%' ? number / 100 : null;
}

/** The unit that results are written in: its name as it stands in a column's header, and values in it. */
export function resultUnit(quantity: Quantity, system: UnitSystem): ResultUnit {
  const unit = QUANTITIES[quantity][system];
  const size = sizeOf(unit, quantity) as number;
  const zero = quantity === 'temperature' ? ICE_POINT[unit] : 0;
  return { name: unit.replace('deg', '°'), from: (value) => value / size + zero };
}

/** A unit that results are written in. */
export interface ResultUnit {
  readonly name: string;
  /** A value in base units (a temperature in °C), in this unit. */
  readonly from: (value: number) => number;
}

/** Units that mathjs knows and nobody here means, each with what to write. */
const SLIPS: readonly (readonly [RegExp, string])[] = [
  [/\bmPa\b/, 'mPa is a thousandth of a pascal: write MPa.'],
  [/\bmN\b/, 'mN is a thousandth of a newton: write kN or MN.'],
  [/\bMm\b/, 'Mm is a thousand kilometres: write mm.'],
];

const FEET_AND_INCHES = /^(\d+)\s*(?:ft|['′])[ -]*(\d[\d ./-]*?)\s*in$/;
const NUMBER = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)(?![\d.,])\s*(.*)$/i;
const FRACTION = /^(?:(\d+)[ -])?(\d+)\/(\d+)(?![\d.,/])\s*(.*)$/;

/** Text cut into its number and its unit, both in plain characters; no number is `null`. */
function split(text: string): { number: number | null; unit: string } {
  const plain = plainCharacters(text);
  const feet = FEET_AND_INCHES.exec(plain);
  if (feet !== null) {
    const inches = split(`${feet[2]} in`);
    if (inches.number === null || inches.unit !== 'in') return { number: null, unit: '' };
    return { number: 12 * Number(feet[1]) + inches.number, unit: 'in' };
  }
  const fraction = FRACTION.exec(plain);
  if (fraction !== null) {
    const [, whole = '0', above, below, unit] = fraction;
    return { number: Number(whole) + Number(above) / Number(below), unit: plainUnit(unit) };
  }
  const match = NUMBER.exec(plain);
  if (match === null) return { number: null, unit: plainUnit(plain) };
  return { number: Number(match[1]), unit: plainUnit(match[2]) };
}

/** A unit in the form that mathjs reads: `mm4` as a power, and `1/K` behind a number as one over a kelvin. */
function plainUnit(unit: string): string {
  return unit.replace(/([a-z])(\d)/gi, '$1^$2').replace(/^1\s*\//, '/');
}

function plainCharacters(text: string): string {
  return text
    .replace(/[\u00a0\u202f\u2009]/g, ' ')
    .replace(/[−–]/g, '-')
    .replace(/[·⋅]/g, '*')
    .replace(/[µμ]/g, 'u')
    .replace(
      /[⁻⁰¹²³⁴-⁹]+/g,
      (raised) => `^${[...raised].map((c) => '-0123456789'['⁻⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(c)]).join('')}`,
    )
    .replace(/(?<=\d)\s*[*×x]\s*10\^/, 'e')
    .replace(/^10\^/, '1e')
    .replace(/(?:°|deg)\s*([CF])\b/g, 'deg$1')
    .replace(/°/g, ' deg')
    .replace(/\bBtu\b/g, 'BTU')
    .replace(/["″]$/, ' in')
    .replace(/(?<=\d)['′]$/, ' ft')
    .replace(/\b(k?N)m\b/g, '$1*m')
    .replace(/\b(ft|in)[- ]?lbf?\b|\blbf?[- ](ft|in)\b/g, '$1$2*lbf')
    .replace(/\byrs?\b/, 'year')
    .trim();
}

/** What may be meant by a text that does not begin with a plain number, and how to write it. */
function numberHint(text: string): { hint?: string } {
  const hint = NUMBER_HINTS.find(([looks]) => looks.test(text));
  if (hint === undefined) return {};
  return { hint: text.replace(hint[0], hint[1]) };
}

/** Each a whole text, and what is said of it. */
const NUMBER_HINTS: readonly (readonly [RegExp, string])[] = [
  [/^#.*$/s, 'A formula of the spreadsheet has failed there: mend it and save the file again.'],
  [
    /^\d{1,2}[-. ](?:jan|feb|mar|apr|may|jun|jul|aug|sep|oct|nov|dec)\w*$/i,
    'The spreadsheet took a fraction for a date: format the cell as text, or write a decimal number.',
  ],
  [
    /^([+-]?\d{1,3}),(\d{3})(?![\d,.]).*$/s,
    'The comma may part thousands or decimals: write $1$2 or $1.$2, whichever is meant.',
  ],
  [/^([+-]?\d+),(\d+)(?![\d,.]).*$/s, 'Write decimals with a point: $1.$2.'],
  [/^[+-]?[\d.]+,[\d.,]+.*$/s, 'Write numbers with a point and no comma: 1250.5.'],
  [
    /^([+-]?\d{1,3})[ \u00a0\u202f\u2009'’](\d{3})(?![\d,.]).*$/s,
    'Write numbers without a space or a mark between the thousands: $1$2.',
  ],
];

const sizes = new Map<string, number | null>();

/** Size of one unit in the quantity's base unit; `null` where it does not measure the quantity. */
function sizeOf(unit: string, quantity: Quantity): number | null {
  const key = `${quantity}|${unit}`;
  let size = sizes.get(key);
  if (size === undefined) {
    size = computeSize(unit, quantity);
    sizes.set(key, size);
  }
  return size;
}

function computeSize(unit: string, quantity: Quantity): number | null {
  if (quantity === 'temperature' && !Object.hasOwn(ICE_POINT, unit)) return null;
  // A lone temperature unit carries its zero; times a length it is a difference.
  const difference = quantity === 'temperature' || quantity === 'temperature difference';
  const times = difference ? ' m' : '';
  try {
    const one = Unit().parse(`1 ${unit}${times}`);
    const base = Unit().parse(`1 ${QUANTITIES[quantity].base}${times}`);
    return one.equalBase(base) ? one.toNumber(`${QUANTITIES[quantity].base}${times}`) : null;
  } catch {
    return null;
  }
}

interface MathUnit {
  equalBase(other: MathUnit): boolean;
  toNumber(unit: string): number;
}

interface MathUnitClass {
  parse(text: string): MathUnit;
  createUnit(definitions: object, options: object): void;
}

declare module 'mathjs' {
  // The library exports these and does not declare them.
  export function createUnitClass(parts: object): MathUnitClass;
  export function createFractionClass(parts: object): unknown;
  export function createComplexClass(parts: object): unknown;
}

let unitClass: MathUnitClass | undefined;

/**
 * The library's unit class over plain numbers: without the rest of the library, which takes far longer to load.
 * Its own kip (4448.2216 N) and psi are rounded; ours follow from the exact pound-force and inch.
 */
function Unit(): MathUnitClass {
  if (unitClass !== undefined) return unitClass;
  unitClass = createUnitClass({
    config: { number: 'number', predictable: false },
    addScalar: (a: number, b: number) => a + b,
    subtractScalar: (a: number, b: number) => a - b,
    multiplyScalar: (a: number, b: number) => a * b,
    divideScalar: (a: number, b: number) => a / b,
    pow: Math.pow,
    abs: Math.abs,
    fix: Math.trunc,
    round: Math.round,
    equal: (a: number, b: number) => a === b,
    isNumeric: (value: unknown) => typeof value === 'number',
    format: String,
    number: Number,
    BigNumber: Number,
    Complex: createComplexClass({}),
    Fraction: createFractionClass({}),
  });
  unitClass.createUnit(
    {
      mph: { definition: '1 mile/h' },
      knot: { definition: '1852 m/h', aliases: ['knots'] },
      kip: { definition: '1000 lbf', aliases: ['kips'] },
      psi: { definition: '1 lbf/in^2' },
      ksi: { definition: '1000 lbf/in^2' },
    },
    { override: true },
  );
  return unitClass;
}
