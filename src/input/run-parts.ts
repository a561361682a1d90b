import type { Fastener, Member, RecordAxis, Zone } from '../model.ts';
import type { RUN_KEYS } from './keys.ts';
import type { Library } from './library.ts';
import type { Values } from './values.ts';
import type { ZoneClock } from './zone-clock.ts';

/** What a run is put together from. */
export interface RunParts {
  readonly members: Library<Member>;
  readonly fasteners: Library<Fastener>;
  readonly zones: Library<Zone>;
  /** The record's axis and clock; `null` where the record has faults. */
  readonly clock: Clock | null;
}

/** The record's time axis and the offset of its clock from UTC [ms], `null` where it names none. */
export interface Clock {
  readonly axis: RecordAxis;
  readonly offset: number | null;
  /** The clock that the record was written by, where the job names its zone. */
  readonly zone: ZoneClock | null;
}

/** The keys of one run, read. */
export type RunValues = Values<typeof RUN_KEYS>;
