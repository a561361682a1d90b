import type { WrittenTime } from './iso-time.ts';
import type { ZoneClock } from './zone-clock.ts';

/** Why a written time cannot be put on the record's clock. */
export type ClockFault = 'offset' | 'skipped';

/**
 * Puts written times on the record's own clock, which keeps one offset all year: the zone's standard time, or the
 * first offset that is written, or none.
 */
export class RecordClock {
  /** Offset of the clock from UTC [ms]; `null` where nobody names one, `undefined` before the first time. */
  private offset: number | null | undefined;
  private readonly zone: ZoneClock | null;
  private previous = Number.NEGATIVE_INFINITY;
  /** First time that the clock shows twice and that has stood here once so far. */
  private open: number | null = null;
  /** Times [ms] that the clock showed twice and that stand here once, each change from summer time once. */
  readonly doubledOnce: number[] = [];

  constructor(zone: ZoneClock | null) {
    this.zone = zone;
    if (zone !== null) this.offset = zone.standard;
  }

  /** Offset of the clock from UTC [ms]; `null` where nobody names one. */
  get utcOffset(): number | null {
    return this.offset ?? null;
  }

  /**
   * @param time as written in the row behind the one read last
   * @returns ms since 1970 on the record's clock, or why there is none
   */
  read(time: WrittenTime): number | ClockFault {
    const own = this.zone === null ? this.plain(time) : this.zoned(time, this.zone);
    if (typeof own === 'number') this.previous = own;
    return own;
  }

  private plain(time: WrittenTime): number | ClockFault {
    if (this.offset === undefined) this.offset = time.offset;
    if ((this.offset === null) !== (time.offset === null)) return 'offset';
    return time.local - (time.offset ?? 0) + (this.offset ?? 0);
  }

  private zoned(time: WrittenTime, zone: ZoneClock): number | ClockFault {
    if (time.offset !== null) return time.local - time.offset + zone.standard;
    const { first, second, exists } = zone.read(time.local);
    if (!exists) return 'skipped';
    if (first === second) {
      if (this.open !== null) this.doubledOnce.push(this.open);
      this.open = null;
      return first;
    }
    // The clock shows the hour of the change twice: rows go on, so the second time is the one behind the first.
    const isFirst = first > this.previous;
    this.open = isFirst ? (this.open ?? first) : null;
    return isFirst ? first : second;
  }
}
