import { FindingList } from '../../src/input/finding-list.ts';
import { noFindings } from '../../src/input/findings.ts';
import { judgingRules } from '../../src/input/judging-rules.ts';
import { RECORD_KEYS } from '../../src/input/keys.ts';
import { readKeys } from '../../src/input/read-keys.ts';
import { readRecord } from '../../src/input/record.ts';
import { recordForm } from '../../src/input/record-form.ts';
import { readYaml } from '../../src/input/yaml.ts';

/**
 * Reads a record from texts or bytes under their names.
 *
 * @param files as the record's files, in order
 * @param keys keys of the job's `record` beside the files, as YAML
 * @param blockSize the files come in blocks of so many bytes
 */
export async function readText(
  files: Readonly<Record<string, string | Uint8Array>>,
  keys = '',
  blockSize = 1 << 20,
) {
  const findings = noFindings();
  const names = Object.keys(files);
  const map = readYaml(`files: [${names.join(', ')}]\n${keys}`, 'job.yaml', findings)!;
  const { values } = readKeys(RECORD_KEYS, map, 'record.', findings);
  const form = recordForm(values, map, findings)!;
  const judging = judgingRules(values, map, findings)!;
  const list = new FindingList();
  const opened = names.map((name) => ({ name, bytes: blocksOf(files[name], blockSize) }));
  const record = await readRecord(opened, { form, judging }, list, findings);
  return { record, findings, list, judging };
}

function blocksOf(content: string | Uint8Array, blockSize: number) {
  const bytes = Buffer.from(content);
  return {
    size: bytes.length,
    async *blocks() {
      for (let at = 0; at < bytes.length; at += blockSize) yield bytes.subarray(at, at + blockSize);
    },
  };
}
