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

/** The key's bounds as they end a sentence: ` over 0 mm and up to 100000000 mm`. */
export function boundsText(key: Key, unit: string): string {
  const { over, from, to, under } = key;
  const figure = (value: number) => (unit === '' ? `${value}` : `${value} ${unit}`);
  const parts = [
    over === undefined ? '' : `over ${figure(over)}`,
    from === undefined ? '' : `not under ${figure(from)}`,
    to === undefined ? '' : `not over ${figure(to)}`,
    under === undefined ? '' : `under ${figure(under)}`,
  ].filter((part) => part !== '');
  return parts.length === 0 ? '' : ` ${parts.join(' and ')}`;
}
