import type { Place } from '../issue.ts';
import { converter, quantityOf } from '../units.ts';
import { cellName } from './cell-name.ts';
import { type Findings, report } from './findings.ts';
import { readHeader } from './header.ts';
import { COLUMN_KEYS } from './keys.ts';
import { nearestName } from './nearest-name.ts';
import { readKeys } from './read-keys.ts';
import type { RecordLayout } from './record-layout.ts';
import { placeOf, type SourceMap } from './source.ts';

/** What a channel of the record may measure. */
export const CHANNEL_QUANTITIES = ['temperature', 'irradiance', 'speed'] as const;
export type ChannelQuantity = (typeof CHANNEL_QUANTITIES)[number];

/** One column of the record that is read. */
export interface RecordColumn {
  /** The channel's name, or `time` or `date`. */
  readonly name: string;
  /** Which cell of a row, from 0. */
  readonly index: number;
  /** The header as it stands in the file. */
  readonly header: string;
  /** `null` for the time. */
  readonly measure: Measure | null;
}

/** What a channel measures, and its numbers in °C, W/m² or m/s. */
export interface Measure {
  readonly quantity: ChannelQuantity;
  readonly convert: (value: number) => number;
}

/** What a unit measures; `null` where it is none that a channel may have. */
function measureOf(unit: string): Measure | null {
  const quantity = quantityOf(unit, CHANNEL_QUANTITIES);
  const convert = quantity === null ? null : converter(unit, quantity);
  return quantity === null || convert === null ? null : { quantity, convert };
}

/**
 * Which columns of the record are the time and the channels. Without a mapping, that is `time`, or `date` and
 * `time`, and every other column, each with its unit in brackets; with one, what the mapping names.
 *
 * @param layout the header, and the line where it stands
 * @returns the columns, date and time first, or `null` where there is a fault, which is reported
 */
export function recordColumns(
  layout: RecordLayout,
  file: string,
  mapping: SourceMap | null,
  findings: Findings,
): RecordColumn[] | null {
  const before = findings.issues.length;
  const { headers, headerLine } = layout;
  const header = (index: number): Place => ({
    file,
    line: Math.max(1, headerLine),
    column: headers.slice(0, index).join(',').length + (index === 0 ? 1 : 2),
    cell: cellName(index, Math.max(1, headerLine)),
  });
  const columns =
    mapping === null
      ? headers.map((text, index) => plainColumn(text, index, header(index), findings))
      : mappedColumns(headers, mapping, findings);
  const found = columns.filter((column) => column !== null);
  const names = found.map(({ name }) => name);
  const time = found.filter(({ measure }) => measure === null);
  const twice = found.find(({ name }, i) => names.indexOf(name) !== i);
  if (twice !== undefined) {
    const place = mapping?.place ?? header(twice.index);
    report(findings, place, { found: twice.name, expected: 'each channel once, and one time' });
  } else if (time.length === 0 && findings.issues.length === before) {
    reportNoTime(headers, mapping?.place ?? header(0), findings);
  }
  if (findings.issues.length > before) return null;
  const date = time.filter(({ name }) => name === 'date');
  const clock = time.filter(({ name }) => name === 'time');
  return [...date, ...clock, ...found.filter(({ measure }) => measure !== null)];
}

function plainColumn(
  text: string,
  index: number,
  place: Place,
  findings: Findings,
): RecordColumn | null {
  const { name, unit } = readHeader(text);
  if (isTime(name)) return { name, index, header: text, measure: null };
  // Lines that end in a separator leave a last column without a name.
  if (text === '') return null;
  const measure = measureOf(unit ?? '');
  if (name !== '' && measure !== null) return { name, index, header: text, measure };
  return report(findings, place, {
    found: text,
    expected:
      'a channel with its unit in brackets, such as deck [degC], global [W/m^2] or wind [m/s]',
    hint: 'For a file with headers of its own, name its columns under record.columns.',
  });
}

function mappedColumns(
  headers: readonly string[],
  mapping: SourceMap,
  findings: Findings,
): (RecordColumn | null)[] {
  return [...mapping.entries].map(([header, { place }]) => {
    const named = headers.indexOf(header);
    // A column whose header is blank or stands twice may be named by its number.
    const isNumber = named < 0 && /^[1-9]\d{0,3}$/.test(header) && Number(header) <= headers.length;
    const index = isNumber ? Number(header) - 1 : named;
    if (!isNumber && headers.lastIndexOf(header) > index) {
      return report(findings, place, {
        found: header,
        expected: 'a header that stands once',
        hint: `Name the column by its number from the left instead: ${index + 1}.`,
      });
    }
    if (index >= 0) return mappedColumn(header, index, mapping, findings);
    const nearest = nearestName(header, headers);
    return report(findings, place, {
      found: header,
      expected: `a column of the record: ${listed(headers)}`,
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
  if (value?.type === 'text' && isTime(value.text)) {
    return { name: value.text, index, header, measure: null };
  }
  if (value?.type !== 'map') {
    const expected = 'time, date, or a mapping such as { channel: air, unit: degC }';
    return report(findings, placeOf(mapping, header), {
      ...(value?.type === 'text' && value.text !== '' ? { found: value.text } : {}),
      expected,
    });
  }
  const { complete, values } = readKeys(COLUMN_KEYS, value, '', findings);
  if (!complete) return null;
  const measure = measureOf(values.unit ?? readHeader(header).unit ?? '');
  if (measure !== null) return { name: values.channel, index, header, measure };
  const found = values.unit === null ? {} : { found: values.unit };
  const expected = 'a unit of temperature, irradiance or speed, such as degC, W/m^2 or m/s';
  return report(findings, placeOf(value, 'unit'), { ...found, expected });
}

/** A header or a mapping's word for the time; of a time in two columns, `date` is the day and `time` the clock. */
function isTime(name: string): boolean {
  return name === 'time' || name === 'date';
}

/** The first headers, enough to see what the file is. */
function listed(headers: readonly string[]): string {
  return headers.length > 12 ? `${headers.slice(0, 12).join(', ')}, …` : headers.join(', ');
}

function reportNoTime(headers: readonly string[], place: Place, findings: Findings): void {
  report(findings, place, {
    found: headers.join(','),
    expected: 'a column time',
    hint: 'For a file with headers of its own, name its columns under record.columns.',
  });
}
