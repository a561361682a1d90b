import type { Zone } from '../model.ts';
import { constantZone, zoneOf } from '../temperature/zone.ts';
import { type Findings, report } from './findings.ts';
import { ZONE_KEYS } from './keys.ts';
import type { Library } from './library.ts';
import { nearestName } from './nearest-name.ts';
import { readKeys } from './read-keys.ts';
import type { RecordTable } from './record.ts';
import type { RecordBasis } from './record-basis.ts';
import { placeOf, type SourceMap } from './source.ts';

/**
 * The job's zones, each from a channel of the record or constant.
 *
 * @param map the job's `zones`
 * @param basis `null` where the record itself has faults: then no zone is built
 */
export function readZones(
  map: SourceMap,
  basis: RecordBasis | null,
  findings: Findings,
): Library<Zone> {
  const items = new Map<string, Zone>();
  for (const [name, { value, place }] of map.entries) {
    if (name === 'name' || name === '') {
      report(findings, place, { found: name, expected: 'another name: extremes use this one' });
    }
    if (value.type !== 'map') {
      report(findings, value.place, {
        expected: 'a column or a constant, such as { column: deck } or { constant: 21 degC }',
      });
      continue;
    }
    const zone = readZone(name, value, basis, findings);
    if (zone !== null) items.set(name, zone);
  }
  return { noun: 'zone', ids: [...map.entries.keys()], items };
}

function readZone(
  name: string,
  map: SourceMap,
  basis: RecordBasis | null,
  findings: Findings,
): Zone | null {
  const { complete, values } = readKeys(ZONE_KEYS, map, `zones.${name}.`, findings);
  if (!complete) return null;
  if ((values.column === null) === (values.constant === null)) {
    return report(findings, map.place, {
      found: values.column === null ? 'neither' : 'both',
      expected: 'either column or constant',
    });
  }
  if (basis === null) return null;
  if (values.constant !== null) return constantZone(name, values.constant, basis.axis);
  const column = values.column ?? '';
  const channel = basis.record.channels.get(column);
  if (channel === undefined) return reportNoChannel(column, map, basis.record, findings);
  if (channel.some((value) => !Number.isNaN(value))) {
    return zoneOf(name, channel, basis.axis, basis.fillUpTo);
  }
  const expected = 'a channel that holds at least one value';
  return report(findings, placeOf(map, 'column'), { found: column, expected });
}

function reportNoChannel(
  column: string,
  map: SourceMap,
  { channels }: RecordTable,
  findings: Findings,
): null {
  const nearest = nearestName(column, channels.keys());
  return report(findings, placeOf(map, 'column'), {
    found: column,
    expected: `a channel of the record: ${[...channels.keys()].join(', ')}`,
    ...(nearest === undefined ? {} : { nearest }),
  });
}
