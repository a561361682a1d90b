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
 * `1,250` alone may be either, and so may `1.250` beside `980`.
 *
 * @param samples texts of cells, numbers or not
 * @param given what the job says
 * @returns the form, or the first text that can be read in two ways
 */
export function numberForm(
  samples: Iterable<string>,
  given: NumberFormGiven,
): NumberForm | { readonly unclear: string } {
  let { decimal, thousands } = given;
  const either = new Map<string, string>();
  let hasHundreds = false;
  for (const sample of samples) {
    const said = saidBy(plain(sample));
    decimal ??= said.decimal ?? null;
    thousands ??= said.thousands ?? null;
    if (said.either !== undefined && !either.has(said.either)) either.set(said.either, sample);
    hasHundreds ||= /^[+-]?[1-9]\d\d$/.test(sample);
  }
  const [comma, point] = [either.get(','), either.get('.')];
  if (decimal === null && thousands === null) {
    if (comma !== undefined) return { unclear: comma.trim() };
    // A logger of three decimals writes them throughout.
    if (point !== undefined && hasHundreds) return { unclear: point.trim() };
  }
  decimal ??= thousands === '.' ? ',' : '.';
  if (decimal === '.' && comma !== undefined) thousands ??= ',';
  if (decimal === ',' && point !== undefined) thousands ??= '.';
  if (decimal === thousands) return { unclear: `${decimal} between decimals and thousands` };
  return { decimal, thousands: thousands ?? '' };
}

interface Said {
  readonly decimal?: NumberForm['decimal'];
  readonly thousands?: NumberForm['thousands'];
  /** A mark that may be either. */
  readonly either?: NumberForm['decimal'];
}

/** What one text says of the form. */
function saidBy(text: string): Said {
  if (!/^[+-]?\d[\d.,' ]*$/.test(text)) return {};
  const marks = text.replace(/[\d+-]/g, '') as NumberForm['thousands'];
  const [first, last] = [marks[0], marks[marks.length - 1]] as NumberForm['thousands'][];
  if (marks === '.' || marks === ',') {
    return /^[+-]?[1-9]\d{0,2}.\d{3}$/.test(text) ? { either: marks } : { decimal: marks };
  }
  if (marks === '') return {};
  if (first === last) return { thousands: first };
  return last === '.' || last === ',' ? { decimal: last, thousands: first } : {};
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
