import type { Place } from '../issue.ts';
import { converter } from '../units.ts';
import { type Findings, report } from './findings.ts';
import { readHeader } from './header.ts';
import { COLUMN_KEYS } from './keys.ts';
import { nearestName } from './nearest-name.ts';
import { readKeys } from './read-keys.ts';
import { placeOf, type SourceMap } from './source.ts';

/** One column of the record that is read. */
export interface RecordColumn {
  /** The channel's name, or `time`. */
  readonly name: string;
  /** Which cell of a row, from 0. */
  readonly index: number;
  /** The header as it stands in the file. */
  readonly header: string;
  /** The column's numbers in °C; `null` for the time. */
  readonly toCelsius: ((value: number) => number) | null;
}

/**
 * Which columns of the record are the time and the channels. Without a mapping, that is `time` and every
 * other column, each with its unit in brackets; with one, what the mapping names.
 *
 * @returns the columns, the time first, or `null` where there is a fault, which is reported
 */
export function recordColumns(
  headers: readonly string[],
  file: string,
  mapping: SourceMap | null,
  findings: Findings,
): RecordColumn[] | null {
  const before = findings.issues.length;
  const header = (index: number): Place => ({
    file,
    line: 1,
    column: headers.slice(0, index).join(',').length + (index === 0 ? 1 : 2),
  });
  const columns =
    mapping === null
      ? headers.map((text, index) => plainColumn(text, index, header(index), findings))
      : mappedColumns(headers, mapping, findings);
  const found = columns.filter((column) => column !== null);
  const names = found.map(({ name }) => name);
  const time = found.filter(({ toCelsius }) => toCelsius === null);
  const twice = found.find(({ name }, i) => names.indexOf(name) !== i);
  if (twice !== undefined) {
    const place = mapping?.place ?? header(twice.index);
    report(findings, place, { found: twice.name, expected: 'each channel once, and one time' });
  } else if (time.length === 0 && findings.issues.length === before) {
    reportNoTime(headers, mapping?.place ?? header(0), findings);
  }
  if (findings.issues.length > before) return null;
  return [...time, ...found.filter(({ toCelsius }) => toCelsius !== null)];
}

function plainColumn(
  text: string,
  index: number,
  place: Place,
  findings: Findings,
): RecordColumn | null {
  const { name, unit } = readHeader(text);
  if (name === 'time') return { name, index, header: text, toCelsius: null };
  const toCelsius = converter(unit ?? '', 'temperature');
  if (name !== '' && toCelsius !== null) return { name, index, header: text, toCelsius };
  return report(findings, place, {
    found: text,
    expected: 'a channel with its unit of temperature in brackets, such as deck [degC]',
    hint: 'For a file with headers of its own, name its columns under record.columns.',
  });
}

function mappedColumns(
  headers: readonly string[],
  mapping: SourceMap,
  findings: Findings,
): (RecordColumn | null)[] {
  return [...mapping.entries].map(([header, { place }]) => {
    const index = headers.indexOf(header);
    if (headers.lastIndexOf(header) > index) {
      return report(findings, place, { found: header, expected: 'a header that stands once' });
    }
    if (index >= 0) return mappedColumn(header, index, mapping, findings);
    const nearest = nearestName(header, headers);
    return report(findings, place, {
      found: header,
      expected: `a column of the record: ${headers.join(', ')}`,
      ...(nearest === undefined ? {} : { nearest }),
    });
  });
}

function mappedColumn(
  header: string,
  index: number,
  mapping: SourceMap,
  findings: Findings,
): RecordColumn | null {
  const value = mapping.entries.get(header)?.value;
  if (value?.type === 'text' && value.text === 'time') {
    return { name: 'time', index, header, toCelsius: null };
  }
  if (value?.type !== 'map') {
    const expected = 'time, or a mapping such as { channel: air, unit: degC }';
    return report(findings, placeOf(mapping, header), {
      ...(value?.type === 'text' && value.text !== '' ? { found: value.text } : {}),
      expected,
    });
  }
  const { complete, values } = readKeys(COLUMN_KEYS, value, '', findings);
  if (!complete) return null;
  const toCelsius = converter(values.unit ?? readHeader(header).unit ?? '', 'temperature');
  if (toCelsius !== null) return { name: values.channel, index, header, toCelsius };
  const found = values.unit === null ? {} : { found: values.unit };
  const expected = 'a unit of temperature, such as degC, degF or K';
  return report(findings, placeOf(value, 'unit'), { ...found, expected });
}

function reportNoTime(headers: readonly string[], place: Place, findings: Findings): void {
  const one = headers.length === 1 && /[;\t]/.test(headers[0]);
  report(findings, place, {
    found: headers.join(','),
    expected: 'a column time',
    hint: one
      ? 'Cells are separated by commas.'
      : 'For a file with headers of its own, name its columns under record.columns.',
  });
}
