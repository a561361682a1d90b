import type { Run } from '../model.ts';

const FIXED = '■';
const SLOTTED = '○';
const MEMBER = '─';

/** What the marks of a drawing mean. */
export const DRAWING_LEGEND = `${FIXED} fixed  ${SLOTTED} slotted  ${MEMBER} member`;

/** Characters for the shortest span, where there is room. */
const SHORTEST_SPAN = 4;

/**
 * A run drawn in one line to scale, such as `─○───○───■───○───○─`. Fasteners that fall on one character are one mark,
 * fixed where any of them is.
 *
 * @param width most characters
 */
export function runDrawing({ positions, roles, overhangs }: Run, width: number): string {
  const first = positions[0];
  const along = Array.from(positions, (position) => position - first);
  const length = along[along.length - 1];
  const shortest = Math.min(...along.slice(1).map((x, i) => x - along[i]), length || 1);
  const whole = overhangs.left + length + overhangs.right || 1;
  // Whole characters a span draw even spacings even.
  const most = Math.min(SHORTEST_SPAN / shortest, (width - 2) / whole);
  const scale = Math.max(1, Math.floor(most * shortest)) / shortest;
  const perLength = Math.min(scale, (width - 2) / whole);
  const at = (distance: number) => Math.round(distance * perLength);
  const left = at(overhangs.left);
  const marks = new Array<string>(left + at(length) + at(overhangs.right) + 1).fill(MEMBER);
  for (const [i, distance] of along.entries()) {
    const place = left + at(distance);
    if (marks[place] !== FIXED) marks[place] = roles[i] === 'fixed' ? FIXED : SLOTTED;
  }
  return marks.join('');
}
