import type { Key } from './keys.ts';
import type { Source, SourceText } from './source.ts';
import {
  type Fault,
  fault,
  type KindValues,
  type Outcome,
  type PointValue,
  type RangeValue,
  wrongForm,
} from './values.ts';
import { wanted } from './wanted.ts';

type Reader<T> = (source: Source, key: Key) => Outcome<T>;

/** Reads lengths that rise, from a list or from a text with spaces between. */
export function readLengths(source: Source, key: Key, read: Reader<number>): Outcome<number[]> {
  const items = itemsOf(source);
  if (items === null) return wrongForm(source, wanted(key));
  const outcome = readEach(items, (item) => read(item, key));
  if ('faults' in outcome) return outcome;
  const lengths = outcome.value;
  const falls = lengths.findIndex((length, i) => i > 0 && length <= lengths[i - 1]);
  if (lengths.length >= 1 && lengths.length <= 500 && falls < 0) return outcome;
  if (falls < 0) return fault(`${lengths.length} positions`, 'between 1 and 500 positions');
  const place = items[falls].place;
  return { faults: [{ place, found: shown(items[falls]), expected: 'positions that rise' }] };
}

/** Reads texts, from a list or from one text. */
export function readTexts(source: Source, key: Key): Outcome<string[]> {
  if (source.type === 'text') return { value: [source.text] };
  if (source.type === 'map' || source.items.length === 0) return wrongForm(source, wanted(key));
  return readEach<string>(source.items, (item) =>
    item.type === 'text' ? { value: item.text } : wrongForm(item, 'a text'),
  );
}

/** Reads which fasteners are fixed: a word, or their numbers, each once. */
export function readFixed(
  source: Source,
  key: Key,
  read: Reader<number>,
): Outcome<KindValues['fixed']> {
  if (source.type === 'text' && isFixedWord(source.text)) return { value: source.text };
  const expected = wanted(key);
  if (source.type === 'text' && !/^[\d\s]+$/.test(source.text)) return fault(source.text, expected);
  const items = itemsOf(source);
  if (items === null) return wrongForm(source, expected);
  const numbers = readEach(items, (item) => read(item, { ...key, from: 1, to: 500 }));
  if ('faults' in numbers || new Set(numbers.value).size === numbers.value.length) return numbers;
  return fault(numbers.value.join(' '), 'each fastener number once');
}

/** Reads the points of an S-N curve: a list of pairs of cycles and range. */
export function readPoints(
  source: Source,
  key: Key,
  readCycles: Reader<number>,
  readRange: Reader<RangeValue>,
): Outcome<PointValue[]> {
  if (source.type !== 'list') return wrongForm(source, wanted(key));
  return readEach<PointValue>(source.items, (item) => {
    if (item.type !== 'list' || item.items.length !== 2) {
      return fault(shown(item), 'a pair of cycles and a range, such as [1e4, 526 MPa]');
    }
    const [cycles, range] = item.items;
    const bounds = { over: 0, to: 1e30 };
    const n = readEach([cycles], (one) => readCycles(one, { ...key, ...bounds, example: '1e4' }));
    const s = readEach([range], (one) => readRange(one, { ...key, ...bounds, example: '526 MPa' }));
    if ('faults' in n || 'faults' in s) return { faults: [...faultsOf(n), ...faultsOf(s)] };
    return { value: { cycles: n.value[0], range: s.value[0], place: item.place } };
  });
}

/** The items of a list, or the parts of a text between its spaces. */
function itemsOf(source: Source): readonly Source[] | null {
  if (source.type === 'list') return source.items;
  if (source.type === 'map') return null;
  return source.text.split(/\s+/).map((text): SourceText => ({ ...source, text }));
}

/** Reads every item; all their faults, each at its item, where there are any. */
function readEach<T>(items: readonly Source[], read: (item: Source) => Outcome<T>): Outcome<T[]> {
  const outcomes = items.map(read);
  const faults = outcomes.flatMap((outcome, i): Fault[] =>
    faultsOf(outcome).map((one) => ({ place: items[i].place, ...one })),
  );
  if (faults.length > 0) return { faults };
  return { value: outcomes.map((outcome) => (outcome as { value: T }).value) };
}

function faultsOf(outcome: Outcome<unknown>): readonly Fault[] {
  return 'faults' in outcome ? outcome.faults : [];
}

function shown(source: Source): string {
  if (source.type === 'text') return source.text;
  return source.type === 'list' ? `a list of ${source.items.length}` : 'a mapping';
}

function isFixedWord(text: string): text is 'all' | 'middle' | 'first' | 'none' {
  return ['all', 'middle', 'first', 'none'].includes(text);
}
