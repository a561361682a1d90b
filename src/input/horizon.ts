import { type Findings, report } from './findings.ts';
import type { Key } from './keys.ts';
import { readValue } from './read-value.ts';
import type { Source, SourceList } from './source.ts';

/** A point of the horizon as seen from a surface [degrees]. */
export interface HorizonPoint {
  readonly azimuth: number;
  readonly altitude: number;
}

const AZIMUTH = {
  kind: 'angle',
  from: 0,
  under: 360,
  example: '90 deg',
  meaning: 'Clockwise from north.',
} as const satisfies Key;
const ALTITUDE = {
  kind: 'angle',
  from: 0,
  to: 90,
  example: '10 deg',
  meaning: 'Over the level.',
} as const satisfies Key;

/**
 * Pairs of azimuth and altitude, azimuths rising.
 *
 * @param list what the user wrote; `null` is a free horizon
 * @returns `null` with a fault, which is reported
 */
export function readHorizon(list: SourceList | null, findings: Findings): HorizonPoint[] | null {
  if (list === null) return [];
  const before = findings.issues.length;
  const points: HorizonPoint[] = [];
  for (const item of list.items) {
    const point = readPoint(item, findings);
    if (point === null) continue;
    const last = points.at(-1);
    if (last !== undefined && point.azimuth <= last.azimuth) {
      report(findings, item.place, {
        found: `${point.azimuth} deg`,
        expected: 'azimuths that rise',
      });
    }
    points.push(point);
  }
  return findings.issues.length > before ? null : points;
}

function readPoint(item: Source, findings: Findings): HorizonPoint | null {
  if (item.type !== 'list' || item.items.length !== 2) {
    const expected = 'a pair of azimuth and altitude, such as [90 deg, 10 deg]';
    const found = item.type === 'text' ? { found: item.text } : {};
    return report(findings, item.place, { ...found, expected });
  }
  const azimuth = readAngle(AZIMUTH, item.items[0], findings);
  const altitude = readAngle(ALTITUDE, item.items[1], findings);
  return azimuth === null || altitude === null ? null : { azimuth, altitude };
}

function readAngle(
  key: typeof AZIMUTH | typeof ALTITUDE,
  source: Source,
  findings: Findings,
): number | null {
  const outcome = readValue(key, source);
  if ('value' in outcome) return outcome.value;
  for (const { place, ...fault } of outcome.faults) {
    report(findings, place ?? source.place, fault);
  }
  return null;
}
