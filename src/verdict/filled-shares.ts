import { minerDamage } from '../damage/miner.ts';
import type { Chain } from '../mechanics/chain.ts';
import { passAgain } from '../mechanics/history.ts';
import type { StrainPath } from '../mechanics/strain-path.ts';
import type { Connection, FilledShare } from '../model.ts';
import { gapEdges } from '../temperature/gap-edges.ts';
import { fastenerSpectrum, fastenerUse } from './connection.ts';
import { createPassCounters } from './pass-counters.ts';
import type { RunScene } from './run-scene.ts';
import { memberUse, type SpanLoad, spanSpectrum, worseSpan } from './span-load.ts';

/** Marks this close to a whole number are at the end of their leg, which is a turning point of the strain. */
const ROUNDING = 1e-9;
/** A smaller share is the rounding of two sums. */
const NOISE = 1e-9;

/**
 * The share of each connection's damage that rests on the gaps of the record: what is lost where the turning points
 * of the strain that lie in a gap or at its edge are left out of the count. A straight line across a gap does no
 * damage itself; the swings that end at it do, and nobody knows how far they went.
 *
 * @param scene the run with the counters of the whole record
 * @param connections their damage from the whole record
 */
export function filledShares(
  scene: RunScene,
  spans: readonly SpanLoad[],
  connections: readonly Connection[],
  { chain, path }: { readonly chain: Chain; readonly path: StrainPath },
): FilledShare[] {
  const { run, job } = scene;
  const zones = run.structure === null ? [run.zone] : [run.zone, run.structure.zone];
  const edges = gapEdges(job.axis, zones);
  if (edges === null || path.turns.every((turn) => edges[turn] === 0)) {
    return connections.map(({ fastenerDamage, memberDamage }) => ({
      fastener: shareOf(fastenerDamage.sum, fastenerDamage.sum),
      member: shareOf(memberDamage.sum, memberDamage.sum),
    }));
  }
  const sure = { ...scene, counters: countAway(edges, scene, chain, path) };
  return connections.map(({ fastenerDamage, memberDamage }, i) => {
    const span = worseSpan(spans, i);
    const member = span && minerDamage(spanSpectrum(sure, span.index), memberUse(sure));
    const fastener = minerDamage(fastenerSpectrum(sure, i), fastenerUse(sure, i));
    return {
      fastener: shareOf(fastenerDamage.sum, fastener.sum),
      member: shareOf(memberDamage.sum, member === null ? memberDamage.sum : member.sum),
    };
  });
}

/** Counts the last pass once more, without the turning points at the edges of gaps. */
function countAway(edges: Uint8Array, { run, job }: RunScene, chain: Chain, path: StrainPath) {
  const { count } = chain;
  const counters = createPassCounters(count, run.member.curve?.compressionShare ?? 1);
  const isSure = (mark: number) => {
    const turn = Math.round(mark) - 1;
    const isTurn = Math.abs(mark - Math.round(mark)) < ROUNDING && turn >= 0;
    return !isTurn || edges[path.turns[turn]] === 0;
  };
  passAgain(chain, path, job.counting.residue, {
    begin: () => counters.begin(),
    take(shears, spans, rows, marks) {
      for (let from = 0; from < rows; from++) {
        if (!isSure(marks[from])) continue;
        let to = from + 1;
        while (to < rows && isSure(marks[to])) to++;
        const part = (values: Float64Array, columns: number) =>
          values.subarray(from * columns, to * columns);
        counters.take(part(shears, count), part(spans, count - 1), to - from, marks);
        from = to;
      }
    },
  });
  return counters;
}

function shareOf(all: number | null, sure: number | null): number | null {
  if (all === null || sure === null) return null;
  const share = all === 0 ? 0 : 1 - sure / all;
  return share > NOISE ? share : 0;
}
