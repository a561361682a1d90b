import type { Fastener, Member, RecordAxis, Zone } from '../model.ts';
import type { Library } from './library.ts';

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
}
