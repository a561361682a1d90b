import type { NumberForm } from './number-form.ts';
import type { PreparedFile } from './record-file.ts';
import type { Encoding } from './text-blocks.ts';

const ENCODINGS: Readonly<Record<Encoding, string>> = {
  'utf-8': '',
  'utf-16le': 'UTF-16 characters',
  'utf-16be': 'UTF-16 characters',
  'windows-1252': 'Windows-1252 characters',
};
const SEPARATORS: Readonly<Record<string, string>> = {
  ';': 'semicolons between cells',
  '\t': 'tabs between cells',
  '|': 'bars between cells',
};
const THOUSANDS: Readonly<Record<NumberForm['thousands'], string>> = {
  '': '',
  ',': 'commas between thousands',
  '.': 'points between thousands',
  ' ': 'spaces between thousands',
  "'": 'apostrophes between thousands',
};

/** How a file of the record was read, in words, where that is not the plain form; blank where it is. */
export function formWords({ encoding, layout, numbers, order, name }: PreparedFile): string {
  const { separator, headerLine } = layout;
  const words = [
    ENCODINGS[encoding],
    SEPARATORS[separator] ?? '',
    headerLine === 0 ? 'no header' : headerLine === 1 ? '' : `header in line ${headerLine}`,
    numbers.decimal === ',' ? 'decimal commas' : '',
    THOUSANDS[numbers.thousands],
    order === null ? '' : `dates ${order}`,
  ].filter((word) => word !== '');
  return words.length === 0 ? '' : `${name} is read with ${words.join(', ')}.`;
}
