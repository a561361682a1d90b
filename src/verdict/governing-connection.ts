import type { Connection } from '../model.ts';
import { firstLargest } from './first-largest.ts';

/** Index of the connection with the largest governing utilisation; of the largest shear range where none has one. */
export function governingConnection(connections: readonly Connection[]): number {
  const uses = connections.map(({ governing }) => governing?.utilisation ?? 0);
  const judged = uses.some((use) => use > 0);
  return firstLargest(judged ? uses : connections.map(({ shearRange }) => shearRange));
}
