import type { Site } from '../model.ts';
import { type Findings, report } from './findings.ts';
import { readKeys } from './read-keys.ts';
import { placeOf, type SourceMap } from './source.ts';
import { SITE_KEYS } from './sun-keys.ts';

const HOUR = 3_600_000;

/**
 * Where a record was taken, as the job says.
 *
 * @param map the job's `record.site`; `null` for none
 * @param offset of the record's clock from UTC [ms], where its times name it
 * @returns `null` for none or one with a fault, which is reported
 */
export function readSite(
  map: SourceMap | null,
  offset: number | null,
  findings: Findings,
): Site | null {
  if (map === null) return null;
  const { complete, values } = readKeys(SITE_KEYS, map, 'record.site.', findings);
  if (!complete) return null;
  const { latitude, longitude, utc_offset: given } = values;
  const utcOffset = given ?? (offset === null ? null : offset / HOUR);
  if (utcOffset !== null) return { latitude, longitude, utcOffset };
  return report(findings, placeOf(map, 'utc_offset'), {
    expected:
      "how far the record's clock runs ahead of UTC, such as 1 h, since its times do not say",
  });
}
