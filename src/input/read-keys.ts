import { custom, NEVER, optional, partial, pipe, strictObject, transform } from 'zod/mini';
import { type Findings, report } from './findings.ts';
import type { Key, KeyTable } from './keys.ts';
import { nearestName } from './nearest-name.ts';
import { readValue } from './read-value.ts';
import { givenValue, placeOf, type Source, type SourceMap } from './source.ts';
import { doubtUnusual } from './unusual.ts';
import type { Fault, Values } from './values.ts';
import { wanted } from './wanted.ts';

/** The values of a map: all of them, or those without fault. */
export type KeysRead<T extends KeyTable> =
  | { readonly complete: true; readonly values: Values<T> }
  | { readonly complete: false; readonly values: Partial<Values<T>> };

/**
 * Reads a mapping of the job or a row of a table by its table of keys. Every unknown key, missing key and
 * faulty value is reported; every value left at its default is noted.
 *
 * @param table the keys
 * @param map what the user wrote
 * @param prefix stands before the key where a default is noted, such as `limits.`
 */
export function readKeys<T extends KeyTable>(
  table: T,
  map: SourceMap,
  prefix: string,
  findings: Findings,
): KeysRead<T> {
  const given = givenOrDefault(table, map, prefix, findings);
  const schema = schemaOf(table);
  const whole = schema.safeParse(given);
  if (whole.success) {
    doubtUnusual(table, map, whole.data, findings);
    return { complete: true, values: withNulls(table, whole.data) };
  }
  const { issues } = whole.error;
  const unknown = issues.flatMap((issue) => (issue.code === 'unrecognized_keys' ? issue.keys : []));
  const meant = unknown.map((name) => reportUnknown(name, table, map, findings));
  for (const issue of issues) reportIssue(issue, table, map, { findings, meant });
  const sound = Object.entries(table).filter(([name, key]) => {
    const faulty = issues.some(({ path }) => path[0] === name);
    return !faulty && (given[name] !== undefined || !key.required);
  });
  const part = Object.fromEntries(sound.map(([name]) => [name, given[name]]));
  const soundTable = Object.fromEntries(sound);
  const values = withNulls(soundTable, partial(schema).parse(part)) as Partial<Values<T>>;
  return { complete: false, values };
}

/** What the user gave, with the defaults in the places of what may be left out. */
function givenOrDefault(
  table: KeyTable,
  map: SourceMap,
  prefix: string,
  findings: Findings,
): Record<string, Source | undefined> {
  const given: Record<string, Source | undefined> = {};
  for (const name of map.entries.keys()) {
    const value = givenValue(map, name);
    if (value !== undefined || !Object.hasOwn(table, name)) given[name] = value;
  }
  for (const [name, key] of Object.entries(table)) {
    if (key.default === undefined || given[name] !== undefined) continue;
    given[name] = { type: 'text', text: key.default, place: map.place };
    findings.defaults.push({ key: prefix + name, value: key.default });
  }
  return given;
}

type Schema = ReturnType<typeof buildSchema>;

const schemas = new WeakMap<KeyTable, Schema>();

function schemaOf(table: KeyTable): Schema {
  let schema = schemas.get(table);
  if (schema === undefined) {
    schema = buildSchema(table);
    schemas.set(table, schema);
  }
  return schema;
}

function buildSchema(table: KeyTable) {
  const shape = Object.entries(table).map(([name, key]) => {
    const value = valueSchema(key);
    return [name, key.required ? value : optional(value)] as const;
  });
  return strictObject(Object.fromEntries(shape));
}

function valueSchema(key: Key) {
  const source = custom<Source>((value) => value !== undefined);
  const read = transform((value: Source, context) => {
    const outcome = readValue(key, value);
    if ('value' in outcome) return outcome.value;
    context.issues.push({ code: 'custom', input: value, params: { faults: outcome.faults } });
    return NEVER;
  });
  return pipe(source, read);
}

/** The values by name, `null` where left out. */
function withNulls<T extends KeyTable>(table: T, values: Record<string, unknown>): Values<T> {
  const names = Object.keys(table);
  return Object.fromEntries(names.map((name) => [name, values[name] ?? null])) as Values<T>;
}

type SchemaIssue = NonNullable<ReturnType<Schema['safeParse']>['error']>['issues'][number];

interface Report {
  readonly findings: Findings;
  /** Keys that an unknown one was likely meant to be: not missed a second time. */
  readonly meant: readonly (string | undefined)[];
}

function reportIssue(
  issue: SchemaIssue,
  table: KeyTable,
  map: SourceMap,
  { findings, meant }: Report,
): void {
  if (issue.code === 'unrecognized_keys') return;
  const name = String(issue.path[0]);
  const faults = issue.code === 'custom' ? (issue.params?.faults as readonly Fault[]) : undefined;
  if (faults === undefined && !meant.includes(name)) {
    report(findings, placeOf(map, name), { expected: wanted(table[name]) });
  }
  for (const { place, ...fault } of faults ?? []) {
    report(findings, place ?? placeOf(map, name), fault);
  }
}

/** Reports an unknown key and gives the known one that was likely meant. */
function reportUnknown(
  name: string,
  table: KeyTable,
  map: SourceMap,
  findings: Findings,
): string | undefined {
  const place = map.entries.get(name)?.place ?? map.place;
  const nearest = nearestName(name, Object.keys(table));
  const free = Object.keys(table).filter((key) => !map.entries.has(key));
  report(findings, place, {
    found: name,
    ...(nearest === undefined
      ? { expected: free.length === 0 ? 'no further key' : `one of ${free.join(', ')}` }
      : { expected: 'a known name', nearest }),
    // In «{ area: 1,250 mm^2 }» the comma ends the value, and what follows it reads as a key.
    ...(/^\d/.test(name) ? { hint: COMMA_HINT } : {}),
  });
  return nearest;
}

const COMMA_HINT = 'Inside braces a comma ends the value: write numbers without one.';
