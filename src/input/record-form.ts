import type { Place } from '../issue.ts';
import { type Findings, report } from './findings.ts';
import type { RECORD_KEYS } from './keys.ts';
import type { NumberForm, NumberFormGiven } from './number-form.ts';
import { readKeys } from './read-keys.ts';
import { TIME_KEYS } from './record-keys.ts';
import type { LayoutGiven } from './record-layout.ts';
import { placeOf, type SourceMap } from './source.ts';
import type { Encoding } from './text-blocks.ts';
import type { Values } from './values.ts';
import type { DateOrder, TimeNumbers } from './written-time.ts';

/** What the job says of how its record is written; `null` where it is to be found. */
export interface RecordForm {
  readonly encoding: Encoding | null;
  readonly layout: LayoutGiven;
  readonly numbers: NumberFormGiven;
  /** Words and numbers that stand for a missing value. */
  readonly missing: readonly string[];
  readonly order: DateOrder | null;
  readonly timeNumbers: TimeNumbers | null;
  /** Time zone of the clock, with the place where the job names it. */
  readonly zone: { readonly name: string; readonly place: Place } | null;
  /** The job's `record.columns`. */
  readonly mapping: SourceMap | null;
}

const SEPARATORS = { comma: ',', semicolon: ';', tab: '\t', bar: '|' } as const;
const DECIMALS = { point: '.', comma: ',' } as const;
const THOUSANDS = { none: '', comma: ',', point: '.', space: ' ', apostrophe: "'" } as const;

/**
 * How the record is written, as the job says.
 *
 * @param values the keys of the job's `record` that have no fault
 * @returns `null` with a fault, which is reported
 */
export function recordForm(
  values: Partial<Values<typeof RECORD_KEYS>>,
  map: SourceMap,
  findings: Findings,
): RecordForm | null {
  const before = findings.issues.length;
  const time = timeForm(values.time ?? null, findings);
  const headerLine = headerLineOf(values.header_line ?? null, map, findings);
  const word = <T>(key: string | null | undefined, words: Readonly<Record<string, T>>) =>
    key == null ? null : words[key];
  const numbers = {
    decimal: word<NumberForm['decimal']>(values.decimal, DECIMALS),
    thousands: word<NumberForm['thousands']>(values.thousands, THOUSANDS),
  };
  if (numbers.decimal !== null && numbers.decimal === numbers.thousands) {
    const expected = 'another mark than that of the decimals';
    report(findings, placeOf(map, 'thousands'), { found: values.thousands ?? '', expected });
  }
  const dataLine = values.data_line ?? null;
  if (dataLine !== null && headerLine !== null && dataLine <= headerLine) {
    const expected = `a line below the header's, ${headerLine}`;
    report(findings, placeOf(map, 'data_line'), { found: String(dataLine), expected });
  }
  if (findings.issues.length > before) return null;
  return {
    encoding: values.encoding ?? null,
    layout: { separator: word(values.separator, SEPARATORS), headerLine, dataLine },
    numbers,
    missing: values.missing ?? [],
    ...time,
    mapping: values.columns ?? null,
  };
}

type TimeForm = Pick<RecordForm, 'order' | 'timeNumbers' | 'zone'>;

function timeForm(map: SourceMap | null, findings: Findings): TimeForm {
  if (map === null) return { order: null, timeNumbers: null, zone: null };
  const { values } = readKeys(TIME_KEYS, map, 'record.time.', findings);
  return {
    order: values.order ?? null,
    timeNumbers: values.numbers ?? null,
    zone: values.zone ? { name: values.zone, place: placeOf(map, 'zone') } : null,
  };
}

/** 0 for a record without a header. */
function headerLineOf(text: string | null, map: SourceMap, findings: Findings): number | null {
  if (text === null) return null;
  const place = placeOf(map, 'header_line');
  if (text === 'none') {
    if (map.entries.has('columns')) return 0;
    const expected = 'the line of the header, since record.columns names no columns by number';
    return report(findings, place, { found: text, expected });
  }
  if (/^[1-9]\d{0,5}$/.test(text)) return Number(text);
  const expected = 'the number of a line, such as 12, or none';
  return report(findings, place, { found: text, expected });
}
