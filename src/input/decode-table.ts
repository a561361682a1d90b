import { type Findings, report } from './findings.ts';

/**
 * The text of a job or a table, without a byte order mark. Spreadsheets save CSV in UTF-8, in UTF-16 with its mark, or
 * in Windows-1252, in which figures and plain letters are the same; a job is UTF-8.
 *
 * @param name the file's name, for the place
 * @returns `null` where the bytes are no text, which is reported
 */
export function decodeTable(bytes: Uint8Array, name: string, findings: Findings): string | null {
  const wide = wideEncodingOf(bytes);
  if (wide !== null) return new TextDecoder(wide).decode(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    if (isCsv(name) && !bytes.includes(0)) return new TextDecoder('windows-1252').decode(bytes);
    const hint = 'Save the file again as UTF-8.';
    const found = 'bytes of another encoding';
    return report(findings, { file: name }, { found, expected: 'text in UTF-8', hint });
  }
}

function wideEncodingOf([first, second]: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  if (first === 0xff && second === 0xfe) return 'utf-16le';
  return first === 0xfe && second === 0xff ? 'utf-16be' : null;
}

function isCsv(name: string): boolean {
  return /\.(?:csv|txt|tsv)$/i.test(name);
}

/** First bytes of a zip archive and of a compound file, the forms that spreadsheets keep their sheets in. */
const WORKBOOKS = [
  [0x50, 0x4b, 0x03, 0x04],
  [0xd0, 0xcf, 0x11, 0xe0],
];

/** True where a file that begins so is a spreadsheet's own workbook. */
export function isWorkbook(start: Uint8Array): boolean {
  return WORKBOOKS.some((mark) => mark.every((byte, i) => start[i] === byte));
}
