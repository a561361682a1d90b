import type { FastLimits } from '../temperature/fast-changes.ts';
import type { Findings } from './findings.ts';
import type { KeyTable, RECORD_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { BAND_KEYS, JUMPS_KEYS, SPIKES_KEYS, STUCK_KEYS } from './record-keys.ts';
import { emptyMap, type SourceMap } from './source.ts';
import type { Values } from './values.ts';

/** What the job says about doubtful rows and values. */
export interface JudgingRules {
  readonly repeats: 'refuse' | 'first' | 'last';
  readonly disorder: 'refuse' | 'sort';
  /** Plausible temperatures [°C]. */
  readonly band: { readonly from: number; readonly to: number; readonly leaveOut: boolean };
  /** Longest time without any change [h]. */
  readonly stuck: { readonly longerThan: number; readonly leaveOut: boolean };
  readonly spikes: FastLimits & { readonly leaveOut: boolean };
  /** Beyond `apart` the medians of two channels differ too much [K]. */
  readonly jumps: FastLimits & { readonly apart: number };
}

/**
 * The rules by which the record is judged; each that is left at its default is noted.
 *
 * @param values the keys of the job's `record` that have no fault
 * @returns `null` with a fault, which is reported
 */
export function judgingRules(
  values: Partial<Values<typeof RECORD_KEYS>>,
  map: SourceMap,
  findings: Findings,
): JudgingRules | null {
  const part = <T extends KeyTable>(key: 'band' | 'stuck' | 'spikes' | 'jumps', table: T) => {
    const given = values[key] ?? emptyMap(map.place, key);
    const read = readKeys(table, given, `record.${key}.`, findings);
    return read.complete ? read.values : null;
  };
  const band = part('band', BAND_KEYS);
  const stuck = part('stuck', STUCK_KEYS);
  const spikes = part('spikes', SPIKES_KEYS);
  const jumps = part('jumps', JUMPS_KEYS);
  const { repeats, disorder } = values;
  if (!band || !stuck || !spikes || !jumps || !repeats || !disorder) return null;
  return {
    repeats,
    disorder,
    band: { from: band.from, to: band.to, leaveOut: band.rule === 'leave out' },
    stuck: { longerThan: stuck.longer_than, leaveOut: stuck.rule === 'leave out' },
    spikes: {
      over: spikes.over,
      overPerHour: spikes.over_per_hour,
      leaveOut: spikes.rule === 'leave out',
    },
    jumps: { over: jumps.over, overPerHour: jumps.over_per_hour, apart: jumps.apart },
  };
}
