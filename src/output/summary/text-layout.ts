const WIDTH = 96;

/**
 * Words wrapped at 96 columns; lines after the first begin under `hang` columns.
 *
 * @param start what the first line begins with, such as an indent or a bullet
 */
export function wrap(text: string, start = '', hang = start.length): string {
  const lines: string[] = [];
  let line = start;
  let empty = true;
  for (const word of text.split(' ')) {
    if (!empty && line.length + 1 + word.length > WIDTH) {
      lines.push(line);
      line = ' '.repeat(hang);
      empty = true;
    }
    line += empty ? word : ` ${word}`;
    empty = false;
  }
  return [...lines, line].join('\n');
}

/** One point of a list. */
export function bullet(text: string): string {
  return wrap(text, '  - ', 4);
}

/**
 * Rows as columns of text, two spaces apart and indented by two.
 *
 * @param rows equally long; the first is the header
 * @param right indices of the columns that are set right, such as numbers
 */
export function table(rows: readonly (readonly string[])[], right: readonly number[]): string {
  const widths = rows[0].map((_, i) => Math.max(...rows.map((row) => row[i].length)));
  const lines = rows.map((row) => {
    const cells = row.map((cell, i) =>
      right.includes(i) ? cell.padStart(widths[i]) : cell.padEnd(widths[i]),
    );
    return `  ${cells.join('  ')}`.trimEnd();
  });
  return lines.join('\n');
}
