import { describe, expect, it } from 'vitest';
import {
  isUnit,
  type Quantity,
  quantityOf,
  readNumber,
  readQuantity,
  resultUnit,
} from '../src/units.ts';

/**
 * Exact by definition: 1 in = 25.4 mm and 1 lb = 0.45359237 kg by the international yard and pound
 * agreement of 1959; standard gravity 9.80665 m/s² by the 3rd General Conference on Weights and
 * Measures of 1901, so 1 lbf = 4.4482216152605 N; the Fahrenheit degree is 5/9 K and 32 °F is 0 °C; a
 * Julian year is 365.25 days of 24 h.
 */
const LBF = 4.4482216152605;
const READ: readonly [string, Quantity, number][] = [
  ['24 in', 'length', 609.6],
  ['1 ft', 'length', 304.8],
  ['9/16 in', 'length', 14.2875],
  ['1 1/8 in', 'length', 28.575],
  ['1-1/8 in', 'length', 28.575],
  ['24"', 'length', 609.6],
  ['0.6 m', 'length', 600],
  ['60cm', 'length', 600],
  ['6E2 mm', 'length', 600],
  ['6e2mm', 'length', 600],
  ['1 in^2', 'area', 645.16],
  ['450 mm2', 'area', 450],
  ['450 mm²', 'area', 450],
  ['1 in^4', 'second moment of area', 25.4 ** 4],
  ['16 cm4', 'second moment of area', 160000],
  ['1 lbf', 'force', LBF],
  ['1 kip', 'force', 1000 * LBF],
  ['2 kips', 'force', 2000 * LBF],
  ['5 kN', 'force', 5000],
  ['1 psi', 'stress', LBF / 645.16],
  ['29000 ksi', 'stress', (29e6 * LBF) / 645.16],
  ['210 GPa', 'stress', 210000],
  ['80 N/mm²', 'stress', 80],
  ['80 N/mm2', 'stress', 80],
  ['1/4"', 'length', 6.35],
  [`2'-6"`, 'length', 762],
  ['2 ft 6 1/2 in', 'length', 774.7],
  [`2'`, 'length', 609.6],
  ['40 µm', 'length', 0.04],
  ['40 μm', 'length', 0.04],
  ['20 N m', 'torque', 20000],
  ['20 Nm', 'torque', 20000],
  ['20 N·m', 'torque', 20000],
  ['1 kNm', 'torque', 1e6],
  ['15 ft-lb', 'torque', 15 * LBF * 304.8],
  ['15 lbf-ft', 'torque', 15 * LBF * 304.8],
  ['1 kip/in', 'stiffness', (1000 * LBF) / 25.4],
  ['2 kN/mm', 'stiffness', 2000],
  ['23e-6 / K', 'expansion', 23e-6],
  ['23e-6 1/K', 'expansion', 23e-6],
  ['23e-6/°C', 'expansion', 23e-6],
  ['23·10⁻⁶ / K', 'expansion', 23e-6],
  ['23 x 10^-6 /K', 'expansion', 23e-6],
  ['6.5e-6 / degF', 'expansion', 11.7e-6],
  ['6.5e-6 / °F', 'expansion', 11.7e-6],
  ['0.023 mm/m/K', 'expansion', 23e-6],
  ['21 degC', 'temperature', 21],
  ['−13 °C', 'temperature', -13],
  ['32 degF', 'temperature', 0],
  ['−40 °F', 'temperature', -40],
  ['212 °F', 'temperature', 100],
  ['294.15 K', 'temperature', 21],
  ['9 degF', 'temperature difference', 5],
  ['9 K', 'temperature difference', 9],
  ['50 years', 'years', 50],
  ['50 yr', 'years', 50],
  ['8766 h', 'years', 1],
  ['3 h', 'hours', 3],
  ['90 min', 'hours', 1.5],
  ['1 day', 'hours', 24],
];

describe('quantities with units', () => {
  it.each(READ)('reads %s as %s', (text, quantity, value) => {
    const read = readQuantity(text, quantity).value;
    expect(read).not.toBeNull();
    expect(Math.abs(Number(read) - value)).toBeLessThanOrEqual(1e-13 * Math.abs(value));
  });

  it.each([
    ['600', 'length'],
    ['mm', 'length'],
    ['', 'length'],
    ['600 kg', 'length'],
    ['1,250 mm', 'length'],
    ['1e400 mm', 'length'],
    ['6 mm 5', 'length'],
    ['6 5 mm', 'length'],
    ['5 constructor', 'temperature'],
    ['600 Mm', 'length'],
    ['70000 mPa', 'stress'],
    ['21 C', 'temperature'],
    ['21', 'temperature'],
    ['5 lb', 'force'],
    ['23e-6', 'expansion'],
    ['0x10 mm', 'length'],
    ['Infinity mm', 'length'],
    ['NaN mm', 'length'],
  ] as const)('refuses %j as %s', (text, quantity) => {
    expect(readQuantity(text, quantity).value).toBeNull();
  });

  it('takes the unit of the column for a bare number and lets a unit of its own win', () => {
    expect(readQuantity('24', 'length', 'in')).toEqual({ value: 24 * 25.4 });
    expect(readQuantity('600 mm', 'length', 'in')).toEqual({ value: 600 });
    expect(readQuantity('23', 'expansion', '1e-6/K')).toEqual({ value: 23 * 1e-6 });
    expect(readQuantity('23', 'expansion', '10⁻⁶ 1/K')).toEqual({ value: 23 * 1e-6 });
    expect(readQuantity('59', 'temperature', '°F')).toEqual({ value: 15 });
  });

  it('tells a force from a stress', () => {
    expect(quantityOf('5 kip', ['force', 'stress'])).toBe('force');
    expect(quantityOf('60 N/mm²', ['force', 'stress'])).toBe('stress');
    expect(quantityOf('5', ['force', 'stress'])).toBeNull();
    expect(quantityOf('5 mm', ['force', 'stress'])).toBeNull();
  });

  it('reads plain numbers and shares', () => {
    expect(['1.35', '1e4', '60 %', '1.35 mm', 'x', '', '1e999'].map(readNumber)).toEqual([
      1.35,
      1e4,
      0.6,
      null,
      null,
      null,
      null,
    ]);
  });

  it('writes in the units of the results', () => {
    const to = (value: number, quantity: Quantity, system: 'SI' | 'US') =>
      resultUnit(quantity, system).from(value);
    expect(to(1000 * LBF, 'force', 'US')).toBeCloseTo(1, 14);
    expect(to(1500, 'force', 'SI')).toBe(1.5);
    expect(to(609.6, 'length', 'US')).toBeCloseTo(24, 13);
    expect(to(100, 'temperature', 'US')).toBe(212);
    expect(to(-40, 'temperature', 'US')).toBe(-40);
    expect(
      (['force', 'length', 'stress', 'temperature'] as const).map((q) => resultUnit(q, 'US').name),
    ).toEqual(['kip', 'in', 'ksi', '°F']);
  });

  it.each([
    ['1,250 mm', '1250 or 1.250'],
    ['4,50 mm', '4.50'],
    ['1.250,5 mm', '1250.5'],
    ['1 250 mm', '1250'],
    ['16-Sep', 'a fraction for a date'],
    ['#REF!', 'formula'],
  ])('says what %j may mean', (text, words) => {
    const read = readQuantity(text, 'length', 'mm');
    expect(read.value).toBeNull();
    expect(read.hint).toContain(words);
  });

  it('tells a unit from a value', () => {
    expect(['mm', 'kN/mm', '1e-6/K', '1/K', '°C', 'mm²'].map(isUnit)).not.toContain(false);
    expect(['600 mm', 'R1', '', '12', 'rigid', 'kg mm s'].map(isUnit)).not.toContain(true);
  });
});
