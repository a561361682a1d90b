import { shortNumber } from '../number-text.ts';
import type { FixedTicks } from './fixed-ticks.ts';

/** Ticks at the powers of ten between two positive numbers, thinned to at most ten. */
export function decadeTicks(from: number, to: number): FixedTicks {
  const first = Math.ceil(Math.log10(from) - 1e-9);
  const last = Math.floor(Math.log10(to) + 1e-9);
  const step = Math.max(1, Math.ceil((last - first + 1) / 10));
  const ticks: { value: number; label: string }[] = [];
  for (let power = first; power <= last; power += step) {
    ticks.push({ value: 10 ** power, label: `10${raised(power)}` });
  }
  return ticks;
}

/** Ticks at 1, 2 and 5 times the powers of ten between two positive numbers, or at the powers alone. */
export function roundTicks(from: number, to: number): FixedTicks {
  const decades = Math.log10(to / from);
  const steps = decades > 4 ? [1] : decades > 2 ? [1, 3] : [1, 2, 5];
  const ticks: { value: number; label: string }[] = [];
  for (let power = Math.floor(Math.log10(from)); power <= Math.ceil(Math.log10(to)); power++) {
    for (const step of steps) {
      const value = Number(`${step}e${power}`);
      if (value >= from && value <= to) ticks.push({ value, label: shortNumber(value) });
    }
  }
  return ticks;
}

function raised(power: number): string {
  return [...String(power)].map((sign) => '⁻⁰¹²³⁴⁵⁶⁷⁸⁹'['-0123456789'.indexOf(sign)]).join('');
}
