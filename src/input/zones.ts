import type { Zone } from '../model.ts';
import { constantZone, zoneOf } from '../temperature/zone.ts';
import { channelNamed } from './channel.ts';
import { type Findings, report } from './findings.ts';
import { ZONE_KEYS } from './keys.ts';
import type { Library } from './library.ts';
import { readKeys } from './read-keys.ts';
import type { RecordBasis } from './record-basis.ts';
import type { SourceMap } from './source.ts';
import { SUNLIT_ZONE_KEYS } from './sun-keys.ts';
import { readSunlitZone } from './sunlit-zone.ts';

/**
 * The job's zones, each from a channel of the record, constant, or from sun and air.
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
      const found = value.type === 'text' && value.text !== '' ? { found: value.text } : {};
      report(findings, value.place, {
        ...found,
        expected: 'a column, a constant or air, such as { column: deck } or { constant: 21 degC }',
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
  const ways = (['column', 'constant', 'air'] as const).filter((key) => values[key] !== null);
  if (ways.length !== 1) {
    return report(findings, map.place, {
      found: ways.length === 0 ? 'none' : ways.join(' and '),
      expected: 'one of column, constant and air',
    });
  }
  if (ways[0] === 'air') return readSunlitZone(name, values, map, basis, findings);
  refuseSunlit(ways[0], map, findings);
  if (basis === null) return null;
  if (values.constant !== null) return constantZone(name, values.constant, basis.axis);
  const column = channelNamed('column', map, basis.record, 'temperature', findings);
  const channel = column === null ? undefined : basis.record.channels.get(column);
  return channel === undefined ? null : zoneOf(name, channel, basis.axis, basis.fillUpTo);
}

/** The keys of a zone in the sun mean nothing for one whose temperature is given. */
function refuseSunlit(way: string, map: SourceMap, findings: Findings): void {
  for (const [key, { place }] of map.entries) {
    if (!Object.hasOwn(SUNLIT_ZONE_KEYS, key)) continue;
    report(findings, place, { found: key, expected: `no key of a zone in the sun beside ${way}` });
  }
}
