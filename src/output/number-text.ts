/**
 * The number for a CSV cell: up to 8 significant digits, no trailing zeros, plain digits down to 1e-6.
 *
 * @param value any number; `null` is blank and `Infinity` is `unlimited`
 */
export function cellNumber(value: number | null): string {
  if (value === null) return '';
  return rounded(value, 8);
}

/**
 * The number for a person to read: up to 3 significant digits, whole from 1,000 on.
 *
 * @param value any number; `Infinity` is `unlimited`
 */
export function shortNumber(value: number): string {
  return Math.abs(value) >= 999.5 ? grouped(Math.round(value)) : rounded(value, 3);
}

/** The whole number with a comma between thousands. */
export function grouped(value: number): string {
  return Number.isFinite(value) ? value.toLocaleString('en-GB') : rounded(value, 3);
}

function rounded(value: number, digits: number): string {
  if (value === Number.POSITIVE_INFINITY) return 'unlimited';
  // Adding zero turns −0 into 0.
  return String(Number(value.toPrecision(digits)) + 0);
}
