import { createRainflow } from '../counting/rainflow.ts';
import { BRIDGED, FILLED, type RecordAxis, type Sunlit, type Zone } from '../model.ts';
import { type DailySwings, dailySwings } from '../temperature/daily-swings.ts';
import { coveredHours, yearsOf } from '../temperature/gaps.ts';
import { quantile } from '../temperature/quantile.ts';

/** A temperature [°C] or a difference [K], and its time [ms since 1970 on the record's own clock]. */
export interface Moment {
  readonly value: number;
  readonly time: number;
}

/** What a user may judge a zone's temperatures by. */
export interface ZoneFacts {
  readonly zone: Zone;
  readonly coldest: Moment;
  readonly warmest: Moment;
  /** Mean of the samples [°C]. */
  readonly mean: number;
  readonly days: DailySwings;
  /** Daily swing that a half, nine tenths and 99 of 100 whole days stay under [K]; `null` without a whole day. */
  readonly swings: {
    readonly half: number;
    readonly most: number;
    readonly nearlyAll: number;
  } | null;
  /** The largest daily swing [K] and its day; `null` without a whole day. */
  readonly largestSwing: Moment | null;
  /** Samples bridged across gaps, counted as covered and not. */
  readonly filled: number;
  readonly bridged: number;
  /** Ranges of all swings between turning points as rainflow counts them, the record repeating [K]. */
  readonly ranges: Float64Array;
  /** Years that the ranges are of. */
  readonly years: number;
  /** What the sun does, for a zone reckoned from it. */
  readonly gain: SolarGain | null;
}

/** How far a member in sun and air lies over the air. */
export interface SolarGain {
  /** Over the air at its most [K]. */
  readonly largest: Moment;
  /** Under the air at its most, by loss to the sky and lag [K, negative or 0]. */
  readonly smallest: Moment;
  /** Mean over the samples with light on the surface [K]; 0 without any. */
  readonly meanInLight: number;
  /** Largest irradiance on the surface [W/m²]. */
  readonly brightest: Moment;
  /** Light on the surface a year [kWh/m²]. */
  readonly lightPerYear: number;
}

/**
 * What a zone's temperature history comes to.
 *
 * @param zone a zone that is not constant
 * @param represents years that the user gave for one pass of the record, or `null`
 */
export function zoneFacts(zone: Zone, axis: RecordAxis, represents: number | null): ZoneFacts {
  const { temperature, standing } = zone;
  const days = dailySwings(axis, temperature);
  const swings = days.warmest.map((warm, d) => warm - days.coldest[d]);
  const counter = createRainflow();
  counter.push(temperature, 0, 1, temperature.length);
  const years = yearsOf(coveredHours(axis, [zone]), represents);
  return {
    zone,
    coldest: leastOf(temperature, axis.times),
    warmest: mostOf(temperature, axis.times),
    mean: temperature.reduce((sum, value) => sum + value, 0) / temperature.length,
    days,
    swings: swings.length === 0 ? null : quantilesOf(swings),
    largestSwing: swings.length === 0 ? null : mostOf(swings, days.days),
    filled: countOf(standing, FILLED),
    bridged: countOf(standing, BRIDGED),
    ranges: counter.finish('repeat').ranges,
    years,
    gain: zone.sunlit === null ? null : gainOf(temperature, zone.sunlit, axis, years),
  };
}

function quantilesOf(swings: Float64Array): NonNullable<ZoneFacts['swings']> {
  const sorted = swings.slice().sort();
  return {
    half: quantile(sorted, 0.5),
    most: quantile(sorted, 0.9),
    nearlyAll: quantile(sorted, 0.99),
  };
}

function gainOf(
  temperature: Float64Array,
  { air, irradiance }: Sunlit,
  { times, stepHours }: RecordAxis,
  years: number,
): SolarGain {
  const excess = temperature.map((value, i) => value - air[i]);
  const inLight = excess.filter((_, i) => irradiance[i] > 0);
  const sum = irradiance.reduce((total, value) => total + value, 0);
  return {
    largest: mostOf(excess, times),
    smallest: leastOf(excess, times),
    meanInLight: inLight.length === 0 ? 0 : inLight.reduce((a, b) => a + b, 0) / inLight.length,
    brightest: mostOf(irradiance, times),
    lightPerYear: (sum * stepHours) / 1000 / years,
  };
}

function mostOf(values: Float64Array, times: Float64Array): Moment {
  const at = values.reduce((best, value, i) => (value > values[best] ? i : best), 0);
  return { value: values[at], time: times[at] };
}

function leastOf(values: Float64Array, times: Float64Array): Moment {
  const at = values.reduce((best, value, i) => (value < values[best] ? i : best), 0);
  return { value: values[at], time: times[at] };
}

function countOf(standing: Uint8Array, wanted: number): number {
  return standing.reduce((count, one) => count + (one === wanted ? 1 : 0), 0);
}
