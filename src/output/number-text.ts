/**
 * The number for a CSV cell: up to 8 significant digits, no trailing zeros, plain digits down to 1e-6.
 *
 * @param value any number; `null` is blank
 * @param endless what stands for `Infinity`
 */
export function cellNumber(value: number | null, endless = 'infinite'): string {
  if (value === null) return '';
  return value === Number.POSITIVE_INFINITY ? endless : rounded(value, 8);
}

/**
 * The number for a person to read: up to 3 significant digits, whole from 1,000 on, with an exponent
 * under 0.0001.
 *
 * @param value any number; `Infinity` is `infinite`
 */
export function shortNumber(value: number): string {
  if (Math.abs(value) >= 999.5) return grouped(Math.round(value));
  const text = rounded(value, 3);
  return value !== 0 && Math.abs(value) < 1e-4 ? Number(text).toExponential() : text;
}

/** The number with a comma between thousands. */
export function grouped(value: number): string {
  if (!Number.isFinite(value)) return rounded(value, 3);
  // The language's own formatter takes longer to load than a run to screen.
  const [whole, part] = String(value).split('.');
  const thousands = whole.replace(/\B(?=(\d{3})+$)/g, ',');
  return part === undefined ? thousands : `${thousands}.${part}`;
}

function rounded(value: number, digits: number): string {
  if (value === Number.POSITIVE_INFINITY) return 'infinite';
  // Adding zero turns −0 into 0.
  return String(Number(value.toPrecision(digits)) + 0);
}
