import type { ZonesJob } from '../model.ts';
import { readJobWith } from './job.ts';
import { JOB_KEYS, type Key } from './keys.ts';
import { readKeys } from './read-keys.ts';
import { keptOf, readRecordBasis } from './record-basis.ts';
import { emptyMap } from './source.ts';
import { readZones } from './zones.ts';

/**
 * Reads the record and the zones of a job, and nothing else: members, fasteners and runs may still be missing.
 *
 * @param path the job file, or a folder that holds job.yaml
 * @throws InputError with every issue of record and zones
 */
export function readZonesJob(path: string): Promise<ZonesJob> {
  return readJobWith(path, async (map, files, findings) => {
    const { complete, values } = readKeys(ZONES_JOB_KEYS, map, '', findings);
    const basis = values.record ? await readRecordBasis(values.record, files, findings) : null;
    const zones = readZones(values.zones ?? emptyMap(map.place, 'zones'), basis, findings);
    if (!complete || basis === null) return null;
    return {
      title: values.title,
      units: values.units,
      ...keptOf(basis),
      zones: [...zones.items.values()],
      inputs: files.inputs,
      defaults: findings.defaults,
      warnings: findings.warnings,
    };
  });
}

const ZONES_JOB_KEYS = {
  ...JOB_KEYS,
  members: optional(JOB_KEYS.members),
  fasteners: optional(JOB_KEYS.fasteners),
  runs: optional(JOB_KEYS.runs),
};

function optional<K extends Key>({ required: _, ...key }: K): Omit<K, 'required'> {
  return key;
}
