import type { DamageTables } from '../damage/damage-table.ts';
import type { History } from '../mechanics/history.ts';
import type { Job, Run } from '../model.ts';
import type { ExtremesCycle } from './extremes-cycle.ts';
import type { PassCounters } from './pass-counters.ts';

/** All that the spans and connections of one run are judged from. */
export interface RunScene {
  readonly run: Run;
  readonly job: Job;
  readonly tables: DamageTables;
  readonly history: History;
  readonly counters: PassCounters;
  /** Years that one pass of the record stands for. */
  readonly years: number;
  /** Where the job adds one cycle a year between its extremes. */
  readonly extremesCycle: ExtremesCycle | null;
  readonly coveredHours: number;
  /** Forces under this are rounding [N]. */
  readonly noise: number;
  /** Words for when a mark was. */
  readonly when: (mark: number) => string;
}
