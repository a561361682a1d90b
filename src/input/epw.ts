import type { Site } from '../model.ts';
import { type Dating, dateRows } from './epw-dates.ts';
import { columnOf, type EpwColumns, readRows } from './epw-rows.ts';
import { type Findings, report } from './findings.ts';

/** What a weather file in the EPW layout holds. Its hours end at their times; its clock keeps standard time. */
export interface EpwWeather extends Dating {
  /** The place as the header names it: town, region and country where given. */
  readonly name: string;
  readonly site: Site;
  readonly columns: EpwColumns;
}

/**
 * Reads an hourly weather file in the open EPW layout.
 *
 * @param text the file's text
 * @param file its name, for the places
 * @returns `null` where the file cannot be used; every fault is reported
 */
export function readEpw(text: string, file: string, findings: Findings): EpwWeather | null {
  const lines = text.split(/\r\n?|\n/);
  const faults = findings.issues.length;
  const location = readLocation(lines[0], file, findings);
  const first = findData(lines, file, findings);
  if (first === null) return null;
  const rows = readRows({ lines, first, file }, findings);
  if (location === null || findings.issues.length > faults) return null;
  const dating = dateRows(rows, file, findings);
  return dating === null ? null : { ...location, ...dating, columns: rows.columns };
}

function readLocation(
  line: string,
  file: string,
  findings: Findings,
): Pick<EpwWeather, 'name' | 'site'> | null {
  const cells = line.split(',').map((cell) => cell.trim());
  if (cells[0].toUpperCase() !== 'LOCATION') {
    return report(
      findings,
      { file, line: 1, column: 1 },
      {
        found: cells[0],
        expected: 'a header that begins with LOCATION, as the EPW layout has it',
      },
    );
  }
  const number = (index: number, [low, high]: readonly [number, number], name: string): number => {
    const found = cells[index] ?? '';
    if (found !== '' && Number(found) >= low && Number(found) <= high) return Number(found);
    const place = { file, line: 1, column: columnOf(line, index), key: `LOCATION ${name}` };
    report(findings, place, { found, expected: `a number from ${low} to ${high}` });
    return 0;
  };
  const site = {
    latitude: number(6, [-90, 90], 'latitude'),
    longitude: number(7, [-180, 180], 'longitude'),
    utcOffset: number(8, [-12, 14], 'time zone'),
  };
  return { name: cells.slice(1, 4).filter(isName).join(', '), site };
}

function isName(text: string): boolean {
  return text !== '' && text !== '-';
}

/** Index of the first data line: the one behind DATA PERIODS, which must have one row an hour. */
function findData(lines: readonly string[], file: string, findings: Findings): number | null {
  const at = lines.findIndex((line) => /^DATA PERIODS\s*,/i.test(line));
  if (at < 0) {
    return report(findings, { file }, { expected: 'a line that begins with DATA PERIODS' });
  }
  const perHour = lines[at].split(',')[2] ?? '';
  if (Number(perHour) === 1) return at + 1;
  const column = columnOf(lines[at], 2);
  return report(
    findings,
    { file, line: at + 1, column, key: 'records per hour' },
    {
      found: perHour.trim(),
      expected: '1: one row an hour',
    },
  );
}
