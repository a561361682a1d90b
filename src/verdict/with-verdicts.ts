import type { Connection, RemediedPiece, Remedy, RunResult } from '../model.ts';

/** The run with what its remedy comes to at each connection. */
export function withVerdicts(result: RunResult): RunResult {
  const { remedy, connections } = result;
  if (remedy === null) return result;
  const verdicts =
    remedy.kind === 'rework' || remedy.added > 0
      ? reworked
      : (one: Connection, i: number) => remediedAt(remedy, one, i);
  return { ...result, connections: connections.map(verdicts) };
}

/** Where fasteners are added or nothing passes, the connections as drawn have no place of their own any more. */
function reworked(connection: Connection): Connection {
  return connection.verdict === 'ok' ? connection : { ...connection, verdict: 'rework' };
}

function remediedAt({ pieces, gap }: Remedy, connection: Connection, i: number): Connection {
  const { piece, place, last } = placeIn(pieces, i);
  const fastener = piece.run.fasteners[place];
  const slotted = piece.run.roles[place] === 'slotted';
  const joint = gap !== null && place === piece.run.roles.length - 1 && !last;
  const words = [
    ...(slotted ? [`slot, ${fastener.freePlay} mm each way`] : []),
    ...(joint ? [`joint of ${gap} mm to the right`] : []),
  ];
  return {
    ...connection,
    verdict: joint ? 'joint' : slotted ? 'slot' : 'ok',
    remedy: words.join('; '),
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
