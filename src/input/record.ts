import { readFileRows } from './file-rows.ts';
import type { FindingList } from './finding-list.ts';
import { type Findings, report } from './findings.ts';
import { formWords } from './form-words.ts';
import type { JudgingRules } from './judging-rules.ts';
import { orderRows } from './order-rows.ts';
import { prepareFile } from './prepare-file.ts';
import { RecordClock } from './record-clock.ts';
import type { ChannelQuantity } from './record-columns.ts';
import type { PreparedFile, RecordFile, RecordReading } from './record-file.ts';
import type { RecordForm } from './record-form.ts';
import { RecordRows } from './record-rows.ts';
import { repeatedFaults } from './repeated-faults.ts';
import { type LeftOut, valueBounds } from './value-bounds.ts';
import { type ZoneClock, zoneClock } from './zone-clock.ts';

/** The record as it stands in its files: times that rise, and channels with blanks. */
export interface RecordTable {
  /** Time of each row [ms since 1970 on the record's own clock]. */
  readonly times: Float64Array;
  /** Value in each row [°C, W/m² or m/s], `NaN` where the cell is blank. */
  readonly channels: ReadonlyMap<string, Float64Array>;
  /** What each channel measures. */
  readonly quantities: ReadonlyMap<string, ChannelQuantity>;
  /** Offset of the record's clock from UTC [ms]; `null` where the record names none. */
  readonly offset: number | null;
  /** The clock that the record was written by, where the job names its zone. */
  readonly zone: ZoneClock | null;
  /** Time of the first row of each file but the first [ms]. */
  readonly fileStarts: readonly number[];
  /** How each file was read that is not in the plain form, a sentence each. */
  readonly readAs: readonly string[];
}

/** How a record is written and what is done about doubtful rows. */
export interface RecordRules {
  readonly form: RecordForm;
  readonly judging: JudgingRules;
}

/** Hardly a row takes fewer bytes: how long the columns are made to begin with. */
const BYTES_A_ROW = 20;

/**
 * Reads a record from the files of a logger, one after another.
 *
 * @param files at least one
 * @param list takes what was done about single rows
 * @returns the record, or `null` where it has faults, which are reported
 */
export async function readRecord(
  files: readonly RecordFile[],
  { form, judging }: RecordRules,
  list: FindingList,
  findings: Findings,
): Promise<RecordTable | null> {
  const before = findings.issues.length;
  const faults = repeatedFaults(findings);
  const expected = files.reduce((sum, { bytes }) => sum + bytes.size / BYTES_A_ROW, 0);
  const rows = new RecordRows(expected);
  const leaveOut = ({ time, channel, value }: LeftOut) =>
    list.add({ kind: 'out of band', time, channel, value, hours: null, done: 'left out' });
  const { band, repeats, disorder } = judging;
  const reading: RecordReading = {
    form,
    bounds: valueBounds(band.from, band.to, band.leaveOut ? leaveOut : null),
    refuses: { repeats: repeats === 'refuse', disorder: disorder === 'refuse' },
    findings,
    faults,
  };
  let clock: RecordClock | null = null;
  let zone: ZoneClock | null = null;
  const readAs: string[] = [];
  for (const file of files) {
    const prepared = await prepareFile(file, reading);
    if (prepared === null) continue;
    if (clock === null) {
      const start = prepared.firstTime?.local ?? 0;
      zone = form.zone && (await namedZone(form.zone, start, findings));
      clock = new RecordClock(zone);
    }
    if (!matchChannels(prepared, rows, findings)) continue;
    await readFileRows(prepared, rows, clock, reading);
    readAs.push(formWords(prepared));
  }
  faults.finish();
  if (findings.issues.length === before && rows.times.length < 2) {
    const found = `${rows.times.length} rows`;
    report(findings, { file: files[0].name }, { found, expected: 'two rows or more' });
  }
  if (findings.issues.length > before || clock === null) return null;
  const table = tableOf(rows, clock, zone, { judging, list, findings, file: files[0].name });
  if (zone !== null) readAs.push(`Times are on the standard time of ${zone.zone} all year.`);
  return table && { ...table, readAs: readAs.filter((text) => text !== '') };
}

async function namedZone(
  { name, place }: NonNullable<RecordForm['zone']>,
  around: number,
  findings: Findings,
): Promise<ZoneClock | null> {
  const zone = await zoneClock(name, around);
  if (zone !== null) return zone;
  const expected = 'a time zone by its place, such as Europe/London or America/Denver';
  return report(findings, place, { found: name, expected });
}

/** Sees to it that all files hold the same channels. */
function matchChannels(
  { name, layout, channels }: PreparedFile,
  rows: RecordRows,
  findings: Findings,
) {
  if (rows.fileStarts.length === 0) {
    for (const column of channels) rows.addChannel(column.name, column.measure!.quantity);
    return true;
  }
  const first = [...rows.channels.keys()];
  const isAlike = channels.every((column) => {
    return rows.quantities.get(column.name) === column.measure!.quantity;
  });
  if (isAlike && channels.length === first.length) return true;
  const place = { file: name, line: Math.max(1, layout.headerLine) };
  const words = first.map((one) => `${one} (${rows.quantities.get(one)})`);
  const expected = `the channels of the first file: ${words.join(', ')}`;
  const found = channels.map((column) => `${column.name} (${column.measure!.quantity})`).join(', ');
  report(findings, place, { found, expected });
  return false;
}

interface Ordering {
  readonly judging: JudgingRules;
  readonly list: FindingList;
  readonly findings: Findings;
  /** The first file, for the place of a fault. */
  readonly file: string;
}

function tableOf(
  rows: RecordRows,
  clock: RecordClock,
  zone: ZoneClock | null,
  { judging, list, findings, file }: Ordering,
): Omit<RecordTable, 'readAs'> | null {
  const columns = [...rows.channels].map(([name, values]) => [name, values.taken()] as const);
  const taken = { times: rows.times.taken(), channels: new Map(columns) };
  for (const time of clock.doubledOnce) {
    const [kind, done] = ['doubled hour once', 'taken as the first time, in summer time'] as const;
    list.add({ kind, time, channel: '', value: null, hours: null, done });
  }
  const ordered = orderRows(taken, judging.repeats, list);
  if ('repeated' in ordered) {
    const found = `${new Date(ordered.repeated).toISOString().slice(0, 19)} twice, once sorted`;
    const hint = 'Say record.repeats: first or last.';
    return report(findings, { file }, { found, expected: 'each time once', hint });
  }
  const fileStarts = rows.fileStarts.slice(1).map((row) => taken.times[row]);
  return { ...ordered, quantities: rows.quantities, offset: clock.utcOffset, zone, fileStarts };
}
