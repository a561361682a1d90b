/** Changes made at random to the texts of a job, as slips of people and programs make them. */

/** Numbers even over [0, 1). */
export type Random = () => number;

/** Names of files and what they hold. */
export type Texts = Readonly<Record<string, string>>;

export interface Mutant {
  readonly file: string;
  readonly text: string;
  /** What was changed, for whoever looks into it. */
  readonly how: string;
}

/** One file of the job, changed once or a few times. */
export function mutate(texts: Texts, random: Random): Mutant {
  const names = Object.keys(texts);
  const file = pick(names, random);
  let text = texts[file];
  const how: string[] = [];
  const times = random() < 0.75 ? 1 : 2 + below(3, random);
  for (let i = 0; i < times; i++) {
    const [name, change] = pick(CHANGES, random);
    text = change(text, random, file.endsWith('.csv'));
    how.push(name);
  }
  return { file, text, how: how.join(', ') };
}

type Change = (text: string, random: Random, csv: boolean) => string;

const CHARACTERS = [
  ...',;:"\'\t\n\r \u0000#[]{}()-–−+.%/\\*&!|>@`?=^_eEinNxX0123456789°µ²é∞\u00a0\ufeff\u2028\ud83d',
];

const VALUES = [
  ...[
    '',
    ' ',
    '-',
    '0',
    '-1',
    '1',
    '1e400',
    '-1e400',
    '1e-320',
    '1e9',
    '9'.repeat(300),
    '0x1f',
    '1_000',
  ],
  ...[
    'NaN',
    'Infinity',
    'null',
    'true',
    'undefined',
    '~',
    '=1+1',
    '#REF!',
    '#N/A',
    '1,250',
    '1.250,5',
    '16-Sep',
  ],
  ...[
    'all',
    'none',
    'middle',
    'first',
    'rigid',
    'EN',
    'AISC',
    'yes',
    'continue',
    'threshold',
    'net',
    'R1',
    'steel 80',
  ],
  ...[
    '__proto__',
    'constructor',
    'toString',
    'hasOwnProperty',
    '../../x',
    '/etc/passwd',
    'job.yaml',
    'record.csv',
    '.',
  ],
  ...[
    '600 mm',
    '24 in',
    '1/4"',
    '600 Mm',
    '15 degC',
    '1e5 degC',
    '-300 degC',
    '60 degF',
    '70 GPa',
    '70000 mPa',
    '12 / K',
  ],
  ...[
    '23e-6 / K',
    '2 kN/mm',
    '2 kN',
    '1 year',
    '1e9 years',
    '0 h',
    '450 mm^2',
    '1e12 MPa^3',
    '2.0 mm at 10 kN',
  ],
  ...[
    'at 2031-01-01T01:00',
    'at 1900-01-01T00:00',
    '2031-02-30T00:00',
    '2031-01-01T02:00',
    '5 degC to 25 degC',
  ],
  ...[
    '[1, 2]',
    '{ a: 1 }',
    '[[1e4, 16 kN], [1e6, 6.4 kN]]',
    '1 1',
    '1 3',
    '500',
    '501',
    '0 500 1100',
    '&a',
    '*a',
    '!!set',
  ],
  ...[
    '0.0001 mm',
    '1e8 mm',
    '1e-9 N',
    '1e12 N',
    '1e-300 MPa',
    'EN 1993-1-9 direct 80',
    'EN 1993-1-9 shear 100',
    'AISC 360 C',
  ],
  ...[
    '1e30',
    '100',
    '99.9 %',
    '0.5',
    '1e-12',
    '2',
    '3.5',
    '250',
    'open',
    'sealed',
    'lapped',
    'half',
    'repeat',
    'US',
  ],
];

const CHANGES: readonly (readonly [string, Change])[] = [
  [
    'a character more',
    (text, random) => splice(text, below(text.length + 1, random), 0, pick(CHARACTERS, random)),
  ],
  ['a character less', (text, random) => splice(text, below(text.length, random), 1, '')],
  [
    'another character',
    (text, random) => splice(text, below(text.length, random), 1, pick(CHARACTERS, random)),
  ],
  ['two characters swapped', swapCharacters],
  ['another value', (text, random) => atWord(text, random, () => pick(VALUES, random))],
  ['another number', anotherNumber],
  [
    'a value from elsewhere',
    (text, random) => atWord(text, random, () => pick(words(text), random).text),
  ],
  ['a cell blank', (text, random) => atWord(text, random, () => '')],
  [
    'a cell more',
    (text, random) => atWord(text, random, (word) => `${word},${pick(VALUES, random)}`),
  ],
  ['a line less', (text, random) => lines(text, (all) => all.splice(below(all.length, random), 1))],
  ['a line twice', doubleLine],
  ['two lines swapped', swapLines],
  ['a line from a number on', (text, random) => splice(text, below(text.length, random), 0, '\n')],
  ['cut off', (text, random) => text.slice(0, below(text.length, random))],
  ['cut off at the front', (text, random) => text.slice(below(text.length, random))],
  ['twice over', (text, random) => (random() < 0.2 ? '' : text + text)],
  ['a column less', columnLess],
  ['a key misspelt', misspeltKey],
  ['another unit', anotherUnit],
  [
    'other line ends',
    (text, random) => text.replaceAll('\n', pick(['\r\n', '\r', '\n\n'], random)),
  ],
  [
    'another separator',
    (text, random, csv) =>
      csv ? text.replaceAll(',', pick([';', '\t', '|', ', '], random)) : text,
  ],
];

function splice(text: string, at: number, less: number, more: string): string {
  return text.slice(0, at) + more + text.slice(at + less);
}

function swapCharacters(text: string, random: Random): string {
  const at = below(text.length - 1, random);
  return splice(text, at, 2, `${text[at + 1] ?? ''}${text[at] ?? ''}`);
}

interface Word {
  readonly text: string;
  readonly at: number;
}

/** The stretches between separators of both formats. */
function words(text: string): Word[] {
  const found = [...text.matchAll(/[^,;:[\]{}\n#]*[^,;:[\]{}\n#\s]/g)];
  if (found.length === 0) return [{ text: '', at: 0 }];
  return found.map((match) => {
    const start = match[0].length - match[0].trimStart().length;
    return { text: match[0].trimStart(), at: match.index + start };
  });
}

function atWord(text: string, random: Random, change: (word: string) => string): string {
  const word = pick(words(text), random);
  return splice(text, word.at, word.text.length, change(word.text));
}

function anotherNumber(text: string, random: Random): string {
  const numbers = [...text.matchAll(/\d+(?:\.\d+)?(?:e-?\d+)?/g)];
  if (numbers.length === 0) return text;
  const { 0: found, index } = pick(numbers, random);
  const factor = pick([0, -1, 0.1, 10, 1e3, 1e-3, 1e6, 1e-6, 1.0001, 2, 0.5, 1e12], random);
  return splice(text, index, found.length, String(Number(found) * factor));
}

function lines(text: string, change: (all: string[]) => unknown): string {
  const all = text.split('\n');
  change(all);
  return all.join('\n');
}

function doubleLine(text: string, random: Random): string {
  return lines(text, (all) => {
    const at = below(all.length, random);
    all.splice(below(all.length, random), 0, all[at]);
  });
}

function swapLines(text: string, random: Random): string {
  return lines(text, (all) => {
    const [a, b] = [below(all.length, random), below(all.length, random)];
    [all[a], all[b]] = [all[b], all[a]];
  });
}

function columnLess(text: string, random: Random, csv: boolean): string {
  if (!csv) return text;
  const column = below((text.split('\n')[0] ?? '').split(',').length, random);
  return lines(text, (all) => {
    for (let i = 0; i < all.length; i++) {
      all[i] = all[i]
        .split(',')
        .filter((_, j) => j !== column)
        .join(',');
    }
  });
}

function misspeltKey(text: string, random: Random): string {
  const keys = [...text.matchAll(/[a-z_]{2,}(?=\s*[:[,])/g)];
  if (keys.length === 0) return text;
  const { 0: found, index } = pick(keys, random);
  const at = below(found.length, random);
  const other = pick(
    [found.slice(1), splice(found, at, 1, ''), `${found}s`, '__proto__', found.toUpperCase()],
    random,
  );
  return splice(text, index, found.length, other);
}

const UNITS = [
  'mm',
  'm',
  'in',
  'Mm',
  'N',
  'kN',
  'kip',
  'MPa',
  'GPa',
  'mPa',
  'ksi',
  'K',
  'degC',
  'degF',
  'h',
  'years',
  'W',
  'kg',
];

function anotherUnit(text: string, random: Random): string {
  const units = [...text.matchAll(/\b(?:mm|in|ft|k?N|kip|MPa|GPa|ksi|deg[CF]|K|h|years?)\b/g)];
  if (units.length === 0) return text;
  const { 0: found, index } = pick(units, random);
  return splice(text, index, found.length, pick(UNITS, random));
}

/** A whole number under a bound. */
export function below(bound: number, random: Random): number {
  return Math.floor(random() * Math.max(1, bound));
}

export function pick<T>(items: readonly T[], random: Random): T {
  return items[below(items.length, random)];
}
