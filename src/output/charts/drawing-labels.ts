import type { Role } from '../../model.ts';
import type { DirectLabel } from './direct-labels.ts';
import type { DrawnPiece } from './drawing-marks.ts';
import { COLOUR } from './theme.ts';

/** Width of a character of a label, on average [px]. */
const CHARACTER = 7.6;

/**
 * Numbers and roles over a drawn run, neighbours of one role together: `1 to 7 slotted`. Shorter words, or none, where
 * there is no room.
 *
 * @param pixels that one unit of the x axis takes
 */
export function roleLabels(
  pieces: readonly DrawnPiece[],
  yAxis: string,
  pixels: number,
): DirectLabel[] {
  let filled = Number.NEGATIVE_INFINITY;
  const places = pieces.flatMap(({ fasteners }) => fasteners);
  return groupsOf(pieces).flatMap(({ first, last, role }) => {
    const x = (places[first].x + places[last].x) / 2;
    const between = last === first + 1 ? ', ' : ' to ';
    const numbers = first === last ? `${first + 1}` : `${first + 1}${between}${last + 1}`;
    const text = [`${numbers} ${role}`, numbers].find(
      (words) => x * pixels - (words.length * CHARACTER) / 2 > filled,
    );
    if (text === undefined) return [];
    const half = (text.length * CHARACTER) / 2;
    const room = ((places[last].x - places[first].x) * pixels) / 2 + 40;
    if (half > room) return [];
    filled = x * pixels + half + 6;
    return [
      { text, xAxis: 'x', yAxis, x, y: 'top', side: 'middle', shift: [0, 10], colour: COLOUR.ink },
    ];
  });
}

interface Group {
  readonly first: number;
  last: number;
  readonly role: Role;
}

/** Neighbours of one role in one piece. */
function groupsOf(pieces: readonly DrawnPiece[]): Group[] {
  const groups: Group[] = [];
  let number = 0;
  for (const { fasteners } of pieces) {
    let group: Group | null = null;
    for (const { role } of fasteners) {
      if (group !== null && group.role === role) group.last = number;
      else {
        group = { first: number, last: number, role };
        groups.push(group);
      }
      number++;
    }
  }
  return groups;
}

/** The width of each new joint, under the gap between two pieces. */
export function gapLabels(
  pieces: readonly DrawnPiece[],
  text: string,
  yAxis: string,
): DirectLabel[] {
  return pieces.slice(1).map(({ from }, i) => ({
    text,
    xAxis: 'x',
    yAxis,
    x: (pieces[i].to + from) / 2,
    y: 'bottom',
    side: 'middle',
    shift: [0, -10],
    colour: COLOUR.ink,
  }));
}
