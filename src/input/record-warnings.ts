import type { RecordAxis } from '../model.ts';
import type { FindingList } from './finding-list.ts';
import type { Findings } from './findings.ts';
import { WARNINGS } from './warnings.ts';

/** A longer step misses the top and the bottom of a day [h]. */
const COARSE = 3;

/** Warns, once a kind, of what was found in the record. */
export function warnOfRecord(list: FindingList, axis: RecordAxis, { warnings }: Findings): void {
  const warn = (count: number, warning: (count: number) => string) => {
    if (count > 0) warnings.push(warning(count));
  };
  warn(list.count('stuck'), WARNINGS.stuck);
  warn(list.count('spike'), WARNINGS.spikes);
  warn(list.count('jump') + list.count('jump between files'), WARNINGS.jumps);
  warn(list.count('channels apart'), WARNINGS.channelsApart);
  warn(list.count('doubled hour once'), WARNINGS.doubledHourOnce);
  if (axis.stepHours > COARSE) warnings.push(WARNINGS.coarseStep(axis.stepHours));
}
