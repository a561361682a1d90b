import type { Place } from '../issue.ts';

/** One value as the user typed it, with its place. */
export interface SourceText {
  readonly type: 'text';
  readonly text: string;
  readonly place: Place;
  /** The header of the value's column, whose unit applies where the value has none. */
  readonly column?: { readonly unit?: string; readonly place: Place };
}

export interface SourceList {
  readonly type: 'list';
  readonly items: readonly Source[];
  readonly place: Place;
}

/** Keys with their values: a mapping of the job file or a row of a CSV table. */
export interface SourceMap {
  readonly type: 'map';
  readonly entries: ReadonlyMap<string, SourceEntry>;
  readonly place: Place;
}

export interface SourceEntry {
  readonly value: Source;
  /** Where the key itself stands. */
  readonly place: Place;
}

/** What a file holds, before anything is known of its meaning. */
export type Source = SourceText | SourceList | SourceMap;

/** Where a key's value stands, or where the map stands that should have held it. */
export function placeOf(map: SourceMap, key: string): Place {
  const entry = map.entries.get(key);
  if (entry !== undefined) return entry.value.place;
  return { ...map.place, key: pathOf(map.place, key) };
}

/** The value under a key; `undefined` where there is none or it is blank. */
export function givenValue(map: SourceMap, key: string): Source | undefined {
  const value = map.entries.get(key)?.value;
  return value?.type === 'text' && value.text === '' ? undefined : value;
}

/** The text under a key; `undefined` where there is none, it is blank, or it is a list or a map. */
export function givenText(map: SourceMap, key: string): string | undefined {
  const value = givenValue(map, key);
  return value?.type === 'text' ? value.text : undefined;
}

/** A key's path below the place that holds it: `limits` and `damage` are `limits.damage`. */
export function pathOf(place: Place, key: string): string {
  return place.key === undefined ? key : `${place.key}.${key}`;
}

/** A map that the user left out. */
export function emptyMap(place: Place, key: string): SourceMap {
  return { type: 'map', entries: new Map(), place: { ...place, key: pathOf(place, key) } };
}
