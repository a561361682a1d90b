/**
 * A cell as a spreadsheet names it: `A1` is the first of the first row, `AA1` the 27th.
 *
 * @param column from 0
 * @param row from 1
 */
export function cellName(column: number, row: number): string {
  let letters = '';
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26)) {
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  }
  return `${letters}${row}`;
}
