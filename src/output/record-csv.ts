import { stringify } from 'csv-stringify/sync';
import type { ZonesJob } from '../model.ts';
import { stamp } from './names.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, unitOf } from './quantity.ts';

/**
 * record.csv: one row for everything doubtful that judging the record found, in order of time, with what was done
 * about it. A blank channel is all of them.
 *
 * @returns the CSV text with a header row and LF line ends
 */
export function recordCsv({ recordFindings, units }: ZonesJob): string {
  const header = [
    'time',
    'channel',
    'found',
    `value [${unitOf('temperature', units)}]`,
    'lasts [h]',
    'done',
  ];
  const rows = recordFindings.map(({ time, channel, kind, value, hours, done }) => [
    stamp(time).replace(' ', 'T'),
    channel,
    kind,
    cellNumber(value === null ? null : inUnits(value, 'temperature', units)),
    cellNumber(hours),
    done,
  ]);
  return stringify([header, ...rows]);
}
