import { readIsoTime } from './iso-time.ts';
import type { Key } from './keys.ts';
import type { Source, SourceText } from './source.ts';
import { type Fault, fault, type KindValues, type Outcome } from './values.ts';

type LockIn = KindValues['temperature or time'];

/**
 * A reader of lock-in: a temperature, a time, or two temperatures that it lay between, `5 degC to 25 degC`.
 *
 * @param readTemperature reads one temperature
 */
export function readLockIn(
  readTemperature: (source: Source, key: Key) => Outcome<number>,
): (source: SourceText, key: Key) => Outcome<LockIn> {
  return (source, key) => {
    const { text } = source;
    const time = /^(?:at\s+)?(\d{4}-.*)$/.exec(text)?.[1] ?? /^at\s+(.*)$/.exec(text)?.[1];
    if (time !== undefined) return readTime(time, text);
    const parts = /^(.+?)\s+to\s+(.+)$/.exec(text);
    if (parts === null) {
      const outcome = readTemperature(source, key);
      return 'faults' in outcome ? withTimeHint(outcome, text) : outcome;
    }
    const [from, to] = parts
      .slice(1)
      .map((part) => readTemperature({ ...source, text: part }, key));
    if ('faults' in from) return from;
    if ('faults' in to) return to;
    if (from.value < to.value) return { value: { from: from.value, to: to.value, text } };
    return fault(text, 'the lower temperature first, such as 5 degC to 25 degC');
  };
}

function readTime(time: string, text: string): Outcome<LockIn> {
  const read = readIsoTime(time.replace(' ', 'T'));
  if (read !== null) return { value: read };
  const expected = 'a date and time that there is, such as at 2031-04-12T10:00';
  return fault(text, expected, timeHint(time));
}

function withTimeHint(
  outcome: { readonly faults: readonly Fault[] },
  text: string,
): Outcome<never> {
  const hint = timeHint(text);
  if (hint === undefined) return outcome;
  return { faults: outcome.faults.map((one) => ({ ...one, hint })) };
}

/** How to write what a spreadsheet made of a date; `undefined` where the text looks like none. */
function timeHint(text: string): string | undefined {
  if (/^\d{5}(?:\.\d+)?$/.test(text)) {
    const day = new Date(Math.round((Number(text) - 25569) * 1440) * 60_000);
    const time = day.toISOString().slice(0, 16);
    return `As a spreadsheet counts days from 1900 on this is ${time}: if that is meant, write at ${time}.`;
  }
  if (/^\d{1,4}[./-]\d{1,2}[./-]\d{1,4}\b/.test(text)) {
    return 'Write a time with year, month and day in this order: at 2031-04-12T10:00.';
  }
  return undefined;
}
