import { expect, test } from 'vitest';
import { cellNumber, grouped, shortNumber } from '../../src/output/number-text.ts';

test('a cell has up to 8 significant digits and no trailing zeros', () => {
  expect(cellNumber(1 / 3)).toBe('0.33333333');
  expect(cellNumber(609.5999999999999)).toBe('609.6');
  expect(cellNumber(123456789)).toBe('123456790');
  expect(cellNumber(0.00000123456789)).toBe('0.0000012345679');
});

test('a cell has an exponent only where plain digits would not do', () => {
  expect(cellNumber(3.2e-9)).toBe('3.2e-9');
  expect(cellNumber(2.5e15)).toBe('2500000000000000');
});

test('zero, nothing and no end have their own cells', () => {
  expect([0, -0, null, Infinity].map((value) => cellNumber(value))).toEqual([
    '0',
    '0',
    '',
    'infinite',
  ]);
  expect(cellNumber(Infinity, 'unlimited')).toBe('unlimited');
});

test('a number to read has 3 significant digits, and commas from 1,000 on', () => {
  expect([0.061234, 8.897, 999.4, 999.6, 12345].map(shortNumber)).toEqual([
    '0.0612',
    '8.9',
    '999',
    '1,000',
    '12,345',
  ]);
  expect(shortNumber(0.00000455)).toBe('4.55e-6');
  expect(grouped(8760)).toBe('8,760');
});
