import type { Place } from '../issue.ts';
import { type Findings, report } from './findings.ts';
import { type LaidOutFile, placeIn, throughRows } from './record-file.ts';
import { timeText } from './row-time.ts';
import { type DateOrder, orderSaidBy } from './written-time.ts';

/**
 * The order of day and month, found from the first date with a day over 12.
 * @returns `null` where the dates need none; `undefined` where they leave it open, which is reported
 */
export async function dateOrder(
  file: LaidOutFile,
  findings: Findings,
): Promise<DateOrder | null | undefined> {
  let order: DateOrder | null = null;
  let open: { found: string; place: Place } | null = null;
  await throughRows(file, findings, (cells, line) => {
    const text = timeText(cells, file.time);
    const said = orderSaidBy(text);
    if (said === 'none') return open !== null;
    if (said === 'either' || said === 'open') {
      open ??= { found: text, place: placeIn(file.name, cells, line, file.time[0]) };
      return said === 'either';
    }
    order = said;
    return false;
  });
  if (order !== null || open === null) return order;
  const { found, place } = open as { found: string; place: Place };
  const why =
    orderSaidBy(found) === 'open' ? 'the year has two figures' : 'no day of the file is over 12';
  report(findings, place, {
    found,
    expected: `dates whose order of day, month and year is clear: ${why}`,
    hint: 'Say it in the job, such as record.time.order: day-first.',
  });
  return undefined;
}
