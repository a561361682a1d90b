import type { Run } from '../model.ts';

const FIXED = '■';
const SLOTTED = '○';
const MEMBER = '─';

/** What the marks of a drawing mean. */
export const DRAWING_LEGEND = `${FIXED} fixed  ${SLOTTED} slotted  ${MEMBER} member`;

/**
 * A run drawn in one line to scale, such as `──○───○───■───○───○──`. Fasteners that fall on one character are one
 * mark, fixed where any of them is.
 *
 * @param width most characters
 */
export function runDrawing({ positions, roles, overhangs }: Run, width: number): string {
  const first = positions[0];
  const length = overhangs.left + positions[positions.length - 1] - first + overhangs.right;
  // Two characters a fastener are enough to see them apart, and a short run need not fill the line.
  const columns = Math.min(width, Math.max(5, 4 * positions.length + 1));
  const marks = new Array<string>(columns).fill(MEMBER);
  for (let i = 0; i < positions.length; i++) {
    const share = length === 0 ? 0.5 : (overhangs.left + positions[i] - first) / length;
    const at = Math.round(share * (columns - 1));
    if (marks[at] !== FIXED) marks[at] = roles[i] === 'fixed' ? FIXED : SLOTTED;
  }
  return marks.join('');
}
