import type { ChannelQuantity } from './record-columns.ts';

/** A value that was outside its bounds and is taken as missing. */
export interface LeftOut {
  /** [ms on the record's clock] */
  readonly time: number;
  readonly channel: string;
  readonly value: number;
}

export interface Bounds {
  readonly from: number;
  readonly to: number;
  /** As they stand in a message. */
  readonly words: string;
  /** Takes a value outside as missing; `null` where it is refused. */
  readonly leaveOut: ((one: LeftOut) => void) | null;
}

/** Between what the values of a channel must lie [°C, W/m², m/s]. */
export type ValueBounds = Readonly<Record<ChannelQuantity, Bounds>>;

/**
 * The bounds of all channels.
 *
 * @param from coldest plausible temperature [°C]
 * @param to hottest plausible temperature [°C]
 * @param leaveOut takes temperatures outside as missing; `null` where they are refused
 */
export function valueBounds(from: number, to: number, leaveOut: Bounds['leaveOut']): ValueBounds {
  const words = `a temperature from ${from} to ${to} degC`;
  return {
    temperature: { from, to, words, leaveOut },
    // A pyranometer reads a little under zero at night.
    irradiance: {
      from: -100,
      to: 2000,
      words: 'an irradiance from -100 to 2000 W/m^2',
      leaveOut: null,
    },
    speed: { from: 0, to: 150, words: 'a speed from 0 to 150 m/s', leaveOut: null },
  };
}
