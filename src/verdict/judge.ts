import type { Check, Connection } from '../model.ts';
import { governingCheck } from './checks.ts';

/** What a connection's checks come to, before any remedy. */
export function judge(
  checks: readonly Check[],
): Pick<Connection, 'checks' | 'governing' | 'verdict'> {
  const fails = checks.some(({ status }) => status === 'fail');
  return { checks, governing: governingCheck(checks), verdict: fails ? 'fails' : 'ok' };
}
