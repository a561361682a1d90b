import {
  isMap,
  isScalar,
  isSeq,
  LineCounter,
  type ParsedNode,
  parseDocument,
  type Scalar,
  type YAMLError,
} from 'yaml';
import type { Place } from '../issue.ts';
import { type Findings, report } from './findings.ts';
import { soundText } from './sound-text.ts';
import { pathOf, type Source, type SourceEntry, type SourceMap } from './source.ts';

/**
 * Reads a YAML text (JSON is YAML) into values that know their places. Plain values stay as they were
 * typed: `01` is not 1 and `1e3` is not 1000. A key without a value holds a blank text.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @returns the mapping at the top, or `null` where the text has faults, each of them reported
 */
export function readYaml(text: string, file: string, findings: Findings): SourceMap | null {
  const lines = new LineCounter();
  const document = parseDocument(text, { lineCounter: lines, prettyErrors: false });
  const at = (offset: number): Place => {
    const { line, col } = lines.linePos(offset);
    return { file, line, column: col };
  };
  for (const error of document.errors) reportFault(error, at(error.pos[0]), findings);
  if (document.errors.length > 0) return null;
  const top = document.contents === null ? null : build(document.contents, at, '', findings);
  if (top?.type === 'map') return top;
  return report(
    findings,
    { file, line: 1, column: 1 },
    { expected: 'a mapping of keys to values' },
  );
}

type At = (offset: number) => Place;

/** One node with all below it. */
function build(node: ParsedNode, at: At, key: string, findings: Findings): Source {
  const place: Place = { ...at(node.range[0]), ...(key === '' ? {} : { key }) };
  if (isScalar(node)) {
    return { type: 'text', text: soundText(typedText(node), place, findings), place };
  }
  if (isSeq(node)) {
    const items = node.items.map((item, i) => build(item, at, `${key}[${i + 1}]`, findings));
    return { type: 'list', items, place };
  }
  if (isMap(node))
    return { type: 'map', entries: entriesOf(node.items, at, place, findings), place };
  report(findings, place, {
    found: `*${node.source}`,
    expected: 'a value',
    hint: 'Write the value out in full: references to other values are not read.',
  });
  return { type: 'text', text: '', place };
}

/** A single value as it was typed, without quotes; blank for none. */
function typedText({ value, source }: Scalar.Parsed): string {
  if (value === null) return '';
  return typeof value === 'string' ? value : (source ?? String(value));
}

interface Pair {
  readonly key: ParsedNode;
  readonly value: ParsedNode | null;
}

function entriesOf(
  pairs: readonly Pair[],
  at: At,
  place: Place,
  findings: Findings,
): Map<string, SourceEntry> {
  const entries = new Map<string, SourceEntry>();
  for (const { key, value } of pairs) {
    const keyPlace = at(key.range[0]);
    if (!isScalar(key)) {
      report(findings, keyPlace, { expected: 'a key' });
      continue;
    }
    const name = soundText(typedText(key), keyPlace, findings);
    if (/\p{Cc}/u.test(name)) {
      report(findings, keyPlace, { found: name, expected: 'a key without control characters' });
    }
    const path = pathOf(place, name);
    const blank: Source = { type: 'text', text: '', place: { ...keyPlace, key: path } };
    entries.set(name, {
      value: value === null ? blank : build(value, at, path, findings),
      place: keyPlace,
    });
  }
  return entries;
}

function reportFault(error: YAMLError, place: Place, findings: Findings): void {
  const twice = error.code === 'DUPLICATE_KEY';
  report(findings, place, {
    found: twice ? 'a key for the second time' : error.message.replace(/\.$/, ''),
    expected: twice ? 'each key once' : 'valid YAML',
  });
}
