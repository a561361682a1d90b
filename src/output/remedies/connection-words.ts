import type { ConnectionChange } from '../../model.ts';
import type { UnitSystem } from '../../units.ts';
import { drawnLength } from './remedy-words.ts';

/** What a remedy changes at one connection, in words to draw by; blank for nothing. */
export function connectionWords(change: ConnectionChange | null, units: UnitSystem): string {
  if (change === null) return '';
  const { slot, fixed, joint, spacing } = change;
  const length = (value: number) => drawnLength(value, units);
  return [
    ...(spacing === null ? [] : [`${spacing.count} fasteners at ${length(spacing.widest)}`]),
    ...(slot === null ? [] : [`slot, ${length(slot)} each way`]),
    ...(fixed ? ['fix'] : []),
    ...(joint === null ? [] : [`joint of ${length(joint)} to the right`]),
  ].join('; ');
}
