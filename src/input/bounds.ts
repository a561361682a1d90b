import type { Key } from './keys.ts';

/** True where the value, in base units, lies within the key's bounds. */
export function isWithin(value: number, key: Key): boolean {
  const { over, from, to, under } = key;
  return (
    !(over !== undefined && value <= over) &&
    !(from !== undefined && value < from) &&
    !(to !== undefined && value > to) &&
    !(under !== undefined && value >= under)
  );
}

/** The bounds that the value is beyond, as they end a sentence: ` over 0 mm`. */
export function boundsText(value: number, key: Key, unit: string): string {
  const { over, from, to, under } = key;
  const figure = (bound: number) => (unit === '' ? `${bound}` : `${bound} ${unit}`);
  const low = (over !== undefined && value <= over) || (from !== undefined && value < from);
  if (low) return over === undefined ? ` not under ${figure(from ?? 0)}` : ` over ${figure(over)}`;
  return under === undefined ? ` not over ${figure(to ?? 0)}` : ` under ${figure(under)}`;
}
