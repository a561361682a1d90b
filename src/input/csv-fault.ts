import { CsvError } from 'csv-parse/sync';
import { type Findings, report } from './findings.ts';

/**
 * Reports that a CSV text cannot be cut into cells; what follows the fault is lost.
 * @throws the error itself where it is none of the parser's
 */
export function reportCsvFault(error: unknown, file: string, findings: Findings): null {
  if (!(error instanceof CsvError)) throw error;
  const line = Number(error.lines);
  return report(findings, Number.isNaN(line) ? { file } : { file, line }, {
    found: 'a double quote out of place',
    expected: 'a cell that begins and ends with a double quote, or has none',
    hint: 'Write a double quote inside a quoted cell twice.',
  });
}
