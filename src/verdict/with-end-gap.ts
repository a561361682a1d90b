import type { RunResult } from '../model.ts';

/** The run with the wider gap that its remedy gives its right end said at the connection beside it. */
export function withEndGap(result: RunResult): RunResult {
  const { remedy, connections } = result;
  if (remedy === null || remedy.kind === 'rework' || remedy.endGap === undefined) return result;
  const last = connections.at(-1)!;
  const joint = `joint of ${remedy.endGap} mm to the right`;
  const words = last.remedy === '' ? joint : `${last.remedy}; ${joint}`;
  return {
    ...result,
    connections: connections.with(-1, { ...last, verdict: 'joint', remedy: words }),
  };
}
