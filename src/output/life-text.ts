import type { Connection } from '../model.ts';
import { shortNumber } from './number-text.ts';

/** More years than these say no more [years]. */
const LONGEST_LIFE = 10_000;

/** A life for a person to read: `37 years`, `over 10,000 years` or `unlimited`. */
export function lifeText(years: number): string {
  if (!Number.isFinite(years)) return 'unlimited';
  if (years > LONGEST_LIFE) return `over ${shortNumber(LONGEST_LIFE)} years`;
  return `${shortNumber(years)} years`;
}

/** The shortest life of some connections; `no curve` where none has one. */
export function shortestLife(connections: readonly Pick<Connection, 'life'>[]): string {
  const lives = connections.map(({ life }) => life).filter((years) => years !== null);
  return lives.length === 0 ? 'no curve' : lifeText(Math.min(...lives));
}
