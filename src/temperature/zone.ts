import type { RecordAxis, Zone } from '../model.ts';
import { bridgeGaps } from './gaps.ts';

/**
 * A zone that follows one channel of the record, its gaps bridged.
 *
 * @param name the zone's name
 * @param values the channel's temperature at each sample [°C], `NaN` where missing, at least one given
 * @param axis the record's time axis
 * @param fillUpTo longest gap that counts as covered [h]
 */
export function zoneOf(
  name: string,
  values: Float64Array,
  axis: RecordAxis,
  fillUpTo: number,
): Zone {
  return { name, ...bridgeGaps(values, axis, fillUpTo), constant: false, sunlit: null };
}

/** A zone with one temperature [°C] at every sample. */
export function constantZone(name: string, temperature: number, axis: RecordAxis): Zone {
  const samples = axis.times.length;
  return {
    name,
    temperature: new Float64Array(samples).fill(temperature),
    standing: new Uint8Array(samples),
    constant: true,
    sunlit: null,
  };
}

/**
 * A zone's temperature [°C] at a time [ms on the record's clock], straight between samples; `null` outside the
 * record.
 */
export function temperatureAt(zone: Zone, axis: RecordAxis, time: number): number | null {
  const { times } = axis;
  if (time < times[0] || time > times[times.length - 1]) return null;
  const after = times.findIndex((sample) => sample >= time);
  if (times[after] === time) return zone.temperature[after];
  const share = (time - times[after - 1]) / (times[after] - times[after - 1]);
  const [from, to] = [zone.temperature[after - 1], zone.temperature[after]];
  return from + share * (to - from);
}
