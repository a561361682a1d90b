/** How the numbers of a record are written. */
export interface NumberForm {
  readonly decimal: '.' | ',';
  /** What groups the thousands; blank where nothing does. */
  readonly thousands: '' | ',' | '.' | ' ' | "'";
}

/** What the job says of the numbers; `null` where it is to be found. */
export interface NumberFormGiven {
  readonly decimal: NumberForm['decimal'] | null;
  readonly thousands: NumberForm['thousands'] | null;
}

/** Marks that stand for the same group separator. */
const SPACES = /[\u00a0\u202f\u2009]/g;
const APOSTROPHES = /[\u2019\u02bc]/g;

/**
 * Finds how numbers are written from some of them. `12,5` has a decimal comma and `1,234.5` groups by commas;
 * `1,250` alone may be either.
 *
 * @param samples texts of cells, numbers or not
 * @param given what the job says
 * @returns the form, or the first text that can be read in two ways
 */
export function numberForm(
  samples: Iterable<string>,
  given: NumberFormGiven,
): NumberForm | { readonly unclear: string } {
  let unclear: string | null = null;
  let hasPoint = false;
  let decimal = given.decimal;
  let thousands = given.thousands;
  for (const sample of samples) {
    const text = plain(sample);
    if (!/^[+-]?\d[\d.,' ]*$/.test(text)) continue;
    const marks = text.replace(/[\d+-]/g, '');
    if (marks === '') continue;
    if (marks === '.') {
      hasPoint ||= !/^[+-]?[1-9]\d{0,2}\.\d{3}$/.test(text);
      continue;
    }
    if (marks === ',') {
      if (/^[+-]?[1-9]\d{0,2},\d{3}$/.test(text)) unclear ??= sample.trim();
      else decimal ??= ',';
      continue;
    }
    const last = marks[marks.length - 1];
    const [first] = marks;
    if (marks.length > 1 && first === last) thousands ??= first as NumberForm['thousands'];
    else if (last === '.' || last === ',') {
      decimal ??= last;
      if (marks.length > 1) thousands ??= first as NumberForm['thousands'];
    } else thousands ??= last as NumberForm['thousands'];
  }
  if (unclear !== null && decimal === null && thousands === null) {
    if (!hasPoint) return { unclear };
    thousands = ',';
  }
  if (decimal === null) decimal = thousands === '.' ? ',' : '.';
  return { decimal, thousands: thousands ?? '' };
}

/** A reader of numbers written in a form; it gives `NaN` for what is none. */
export function numberReader({ decimal, thousands }: NumberForm): (text: string) => number {
  const [point, group] = [escaped(decimal), escaped(thousands)];
  const whole = thousands === '' ? '\\d+' : `(?:\\d{1,3}(?:${group}\\d{3})+|\\d+)`;
  const form = new RegExp(`^[+-]?(?:${whole}(?:${point}\\d*)?|${point}\\d+)(?:e[+-]?\\d+)?$`, 'i');
  const pointCode = decimal.charCodeAt(0);
  return (text) => {
    const quick = readFigures(text, pointCode);
    if (!Number.isNaN(quick)) return quick;
    const written = plain(text);
    if (!form.test(written)) return Number.NaN;
    const ungrouped = thousands === '' ? written : written.replaceAll(thousands, '');
    return Number(ungrouped.replace(decimal, '.'));
  };
}

/** More figures than these are not exact as a whole number. */
const EXACT_FIGURES = 15;
const MINUS = 45;
const ZERO = 48;

/**
 * Reads figures with a decimal mark and a minus sign at most, which nearly all numbers of a record are: the same
 * value as `Number` gives, since both parts of the quotient are exact. `NaN` for any other text.
 */
function readFigures(text: string, point: number): number {
  const { length } = text;
  const negative = text.charCodeAt(0) === MINUS;
  let whole = 0;
  let figures = 0;
  let decimals = -1;
  for (let i = negative ? 1 : 0; i < length; i++) {
    const code = text.charCodeAt(i);
    const figure = code - ZERO;
    if (figure >= 0 && figure <= 9) {
      whole = whole * 10 + figure;
      figures++;
      if (decimals >= 0) decimals++;
    } else if (code === point && decimals < 0) decimals = 0;
    else return Number.NaN;
  }
  if (figures === 0 || figures > EXACT_FIGURES) return Number.NaN;
  const size = decimals > 0 ? whole / POWERS[decimals] : whole;
  return negative ? -size : size;
}

const POWERS = Array.from({ length: EXACT_FIGURES + 1 }, (_, i) => 10 ** i);

function plain(text: string): string {
  return text.replace(SPACES, ' ').replace(APOSTROPHES, "'").replace('−', '-').trim();
}

function escaped(mark: string): string {
  return mark === '.' ? '\\.' : mark;
}
