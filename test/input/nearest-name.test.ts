import { expect, it } from 'vitest';
import { nearestName } from '../../src/input/nearest-name.ts';

const KEYS = ['stiffness', 'spacing', 'slotted', 'grip', 'gap'];

it('finds the name that was likely meant', () => {
  expect(nearestName('stifness', KEYS)).toBe('stiffness');
  expect(nearestName('Spacing', KEYS)).toBe('spacing');
  expect(nearestName('gpa', KEYS)).toBe('gap');
  expect(nearestName('gripp', KEYS)).toBe('grip');
});

it('says nothing where no name is near', () => {
  expect(nearestName('colour', KEYS)).toBeUndefined();
  expect(nearestName('x', KEYS)).toBeUndefined();
});
