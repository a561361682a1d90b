import { quantityName } from '../units.ts';
import { type Findings, report } from './findings.ts';
import { nearestName } from './nearest-name.ts';
import type { RecordTable } from './record.ts';
import type { ChannelQuantity } from './record-columns.ts';
import { givenText, placeOf, type SourceMap } from './source.ts';

/**
 * The channel that a key names. Checked to be one of the record's, of the quantity that is wanted, with at least one
 * value.
 *
 * @param record `null` where it has faults: then nothing is checked
 * @returns its name, or `null` where the key is not given or has a fault, which is reported
 */
export function channelNamed(
  key: string,
  map: SourceMap,
  record: RecordTable | null,
  quantity: ChannelQuantity,
  findings: Findings,
): string | null {
  const name = givenText(map, key);
  if (name === undefined || record === null) return name ?? null;
  const { channels, quantities } = record;
  const values = channels.get(name);
  const fault = (expected: string) =>
    report(findings, placeOf(map, key), { found: name, expected });
  if (values === undefined) return reportNoChannel(key, name, map, record, findings);
  if (quantities.get(name) !== quantity) return fault(`a channel of ${nounOf(quantity)}`);
  if (!values.some((value) => !Number.isNaN(value))) {
    return fault('a channel that holds at least one value');
  }
  return name;
}

function reportNoChannel(
  key: string,
  name: string,
  map: SourceMap,
  { channels }: RecordTable,
  findings: Findings,
): null {
  const nearest = nearestName(name, channels.keys());
  return report(findings, placeOf(map, key), {
    found: name,
    expected: `a channel of the record: ${[...channels.keys()].join(', ')}`,
    ...(nearest === undefined ? {} : { nearest }),
  });
}

function nounOf(quantity: ChannelQuantity): string {
  return quantityName(quantity).replace(/^an? /, '');
}
