import type { RecordAxis } from '../model.ts';
import { fastChanges } from '../temperature/fast-changes.ts';
import { missingStretches } from '../temperature/gaps.ts';
import { findSteps } from '../temperature/steps.ts';
import { stuckStretches } from '../temperature/stuck-stretches.ts';
import type { FindingList } from './finding-list.ts';
import type { JudgingRules } from './judging-rules.ts';
import { medianOf } from './median-of.ts';
import type { RecordTable } from './record.ts';

const HOUR = 3_600_000;

/**
 * Judges the channels of temperature: stuck stretches, spikes, jumps, and channels far apart. What the rules leave
 * out is blanked in place.
 *
 * @param record its channels are changed where something is left out
 * @param list takes every finding
 */
export function judgeChannels(record: RecordTable, rules: JudgingRules, list: FindingList): void {
  for (const [name, values] of record.channels) {
    if (record.quantities.get(name) !== 'temperature') continue;
    judgeSpikes(name, values, record, rules, list);
    judgeJumps(name, values, record, rules, list);
    judgeStuck(name, values, record, rules, list);
  }
  judgeApart(record, rules, list);
}

function judgeSpikes(
  channel: string,
  values: Float64Array,
  { times }: RecordTable,
  { spikes: rule }: JudgingRules,
  list: FindingList,
): void {
  for (const { first, last } of fastChanges(values, times, rule).spikes) {
    for (let i = first; i <= last; i++) {
      if (Number.isNaN(values[i])) continue;
      const done = rule.leaveOut ? 'left out' : 'kept';
      list.add({ kind: 'spike', time: times[i], channel, value: values[i], hours: null, done });
      if (rule.leaveOut) values[i] = Number.NaN;
    }
  }
}

function judgeJumps(
  channel: string,
  values: Float64Array,
  { times, fileStarts }: RecordTable,
  { jumps: rule }: JudgingRules,
  list: FindingList,
): void {
  for (const at of fastChanges(values, times, rule).jumps) {
    const kind = fileStarts.includes(times[at]) ? 'jump between files' : 'jump';
    list.add({ kind, time: times[at], channel, value: values[at], hours: null, done: 'kept' });
  }
}

/** The first value of a stuck stretch stands: the sensor showed it. */
function judgeStuck(
  channel: string,
  values: Float64Array,
  { times }: RecordTable,
  { stuck: rule }: JudgingRules,
  list: FindingList,
): void {
  for (const { first, last } of stuckStretches(values, times, rule.longerThan * HOUR)) {
    const hours = (times[last] - times[first]) / HOUR;
    const done = rule.leaveOut ? 'left out but for its first value' : 'kept';
    list.add({ kind: 'stuck', time: times[first], channel, value: values[first], hours, done });
    if (rule.leaveOut) values.fill(Number.NaN, first + 1, last + 1);
  }
}

/** Each channel whose median lies far from that of the first one. */
function judgeApart(
  { times, channels, quantities }: RecordTable,
  { jumps: { apart } }: JudgingRules,
  list: FindingList,
): void {
  const names = [...channels.keys()].filter((name) => quantities.get(name) === 'temperature');
  const medians = names.map((name) => medianOf(channels.get(name)!));
  for (let i = 1; i < names.length; i++) {
    if (!(Math.abs(medians[i] - medians[0]) > apart)) continue;
    const done = `kept; its median, against that of ${names[0]}`;
    list.add({
      kind: 'channels apart',
      time: times[0],
      channel: names[i],
      value: medians[i],
      hours: null,
      done,
    });
  }
}

/**
 * Lists what is missing and where the step changes, once nothing more is left out.
 *
 * @param fillUpTo longest gap that is filled [h]
 */
export function judgeGaps(
  { times, channels }: RecordTable,
  axis: RecordAxis,
  fillUpTo: number,
  list: FindingList,
): void {
  for (const { at, from, to } of findSteps(times).changes) {
    const done = `kept; from ${shown(from)} to ${shown(to)} h`;
    const [time, hours] = [times[at - 1], null];
    list.add({ kind: 'step changes', time, channel: '', value: null, hours, done });
  }
  const perChannel = [...channels].map(([name, values]) => ({
    name,
    stretches: missingStretches(values, axis, fillUpTo),
  }));
  const inAll = commonTo(perChannel.map(({ stretches }) => stretches));
  const told = new Set<string>();
  for (const { name, stretches } of perChannel) {
    for (const { time, hours, filled } of stretches) {
      const key = `${time} ${hours}`;
      if (told.has(key)) continue;
      const all = inAll(key);
      if (all) told.add(key);
      const done = filled ? 'filled by a straight line' : 'bridged, and not counted as covered';
      list.add({ kind: 'gap', time, channel: all ? '' : name, value: null, hours, done });
    }
  }
}

/** Tells the stretches that are missing in every channel alike. */
function commonTo(
  channels: readonly (readonly { readonly time: number; readonly hours: number }[])[],
): (key: string) => boolean {
  const counts = new Map<string, number>();
  for (const { time, hours } of channels.flat()) {
    const key = `${time} ${hours}`;
    counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  return (key) => counts.get(key) === channels.length;
}

function shown(hours: number): number {
  return Number(hours.toPrecision(3));
}
