import type { Connection, ConnectionChange, RemediedPiece, Remedy, RunResult } from '../model.ts';

/** The run with what its remedy comes to at each connection. */
export function withVerdicts(result: RunResult): RunResult {
  const { remedy, connections } = result;
  if (remedy === null) return result;
  if (remedy.kind === 'rework') return { ...result, connections: connections.map(reworked(null)) };
  const verdicts =
    remedy.added > 0
      ? reworked(setAnew(remedy))
      : (one: Connection, i: number) => remediedAt(remedy, one, i);
  return { ...result, connections: connections.map(verdicts) };
}

/** Where fasteners are added or nothing passes, a connection as drawn has no place of its own any more. */
function reworked(change: ConnectionChange | null): (connection: Connection) => Connection {
  return (connection) =>
    connection.verdict === 'ok' ? connection : { ...connection, verdict: 'rework', change };
}

function setAnew({ pieces }: Remedy): ConnectionChange {
  const { positions } = pieces[0].run;
  const widest = positions.slice(1).reduce((most, x, i) => Math.max(most, x - positions[i]), 0);
  const spacing = { count: positions.length, widest };
  return { slot: null, fixed: false, joint: null, spacing };
}

function remediedAt(remedy: Remedy, connection: Connection, i: number): Connection {
  const { piece, place, last } = placeIn(remedy.pieces, i);
  const slotted = piece.run.roles[place] === 'slotted';
  const atCut = place === piece.run.roles.length - 1;
  const joint = !atCut ? null : last ? (remedy.endGap ?? null) : remedy.gap;
  const fixed = !slotted && connection.role === 'slotted';
  const freePlay = slotted ? piece.run.fasteners[place].freePlay : null;
  const kept = connection.role === 'slotted' && connection.fastener.freePlay === freePlay;
  const slot = kept ? null : freePlay;
  if (slot === null && !fixed && joint === null) return { ...connection, verdict: 'ok' };
  return {
    ...connection,
    verdict: joint !== null ? 'joint' : slot !== null ? 'slot' : 'rework',
    change: { slot, fixed, joint, spacing: null },
  };
}

/** The piece that holds the run's fastener i, its place in it, and whether it is the last piece. */
function placeIn(
  pieces: readonly RemediedPiece[],
  i: number,
): { readonly piece: RemediedPiece; readonly place: number; readonly last: boolean } {
  let before = 0;
  for (const [p, piece] of pieces.entries()) {
    const { length } = piece.run.roles;
    if (i < before + length) return { piece, place: i - before, last: p === pieces.length - 1 };
    before += length;
  }
  throw new RangeError(`no piece holds fastener ${i + 1}`);
}
