import { describe, expect, it } from 'vitest';
import { readCsv } from '../../src/input/csv.ts';
import { noFindings } from '../../src/input/findings.ts';
import type { Source, SourceMap } from '../../src/input/source.ts';
import { readYaml } from '../../src/input/yaml.ts';

/** What stands in the text at a place, as many characters as asked for. */
function standsAt(text: string, source: Source, length: number): string {
  const { line = 0, column = 0 } = source.place;
  return text
    .split('\n')
    .slice(line - 1)
    .join('\n')
    .slice(column - 1, column - 1 + length);
}

function cell(map: SourceMap | undefined, key: string): Source {
  const entry = map?.entries.get(key);
  if (entry === undefined) throw new Error(`no ${key}`);
  return entry.value;
}

describe('places in CSV', () => {
  const text =
    'id,area [mm²],note,free\n\n "R1" , 450,"a, ""b""\nsecond line",é\n   \n,,,\n01,460,é,7\n';
  const rows = readCsv(text, 'm.csv', noFindings());

  it('are those of the first character of each cell', () => {
    expect(rows.length).toBe(2);
    expect(standsAt(text, cell(rows[0], 'id'), 4)).toBe('"R1"');
    expect(standsAt(text, cell(rows[0], 'area'), 3)).toBe('450');
    expect(standsAt(text, cell(rows[0], 'note'), 9)).toBe('"a, ""b""');
    expect(standsAt(text, cell(rows[0], 'free'), 1)).toBe('é');
    expect(standsAt(text, cell(rows[1], 'id'), 2)).toBe('01');
    expect(standsAt(text, cell(rows[1], 'free'), 1)).toBe('7');
    expect(cell(rows[1], 'area').place).toEqual({
      file: 'm.csv',
      line: 7,
      column: 4,
      cell: 'B6',
      key: 'area [mm²]',
    });
  });

  it('come with the cell as typed and the unit of its column', () => {
    expect(cell(rows[0], 'note')).toMatchObject({ text: 'a, "b"\nsecond line' });
    expect(cell(rows[1], 'id')).toMatchObject({ text: '01' });
    expect(cell(rows[1], 'area')).toMatchObject({
      text: '460',
      column: { unit: 'mm²', place: { line: 1, column: 4 } },
    });
  });

  it('are the same with the line ends of another system', () => {
    const other = readCsv(text.replaceAll('\n', '\r\n'), 'm.csv', noFindings());
    expect(other).toEqual(rows);
  });

  it('name columns that stand twice, cells too many and quotes out of place', () => {
    const fault = (csv: string) => {
      const findings = noFindings();
      readCsv(csv, 'm.csv', findings);
      return findings.issues.map(({ place, found }) => `${place.line}:${place.column} ${found}`);
    };
    expect(fault('id,area,id\na,1,b')).toEqual(['1:9 id']);
    expect(fault('id,area\na,1,b')).toEqual(['2:5 b']);
    expect(fault('id,,area\na,1,b')).toEqual(['2:3 1']);
    expect(fault('id,area\na,"12')).toEqual(['2:undefined a double quote out of place']);
    expect(fault('id,area\na,"1"2')).toEqual(['2:undefined a double quote out of place']);
    expect(fault('')).toEqual(['1:undefined undefined']);
  });
});

describe('places in YAML', () => {
  const text = [
    'title: "Pier é" # invented',
    'runs:',
    '  - { id: 01, fixed: [1, 5], lock_in: 15 degC }',
    '  - id: 1e3',
    '    grip:',
    "    line: '2'",
  ].join('\n');
  const map = readYaml(text, 'job.yaml', noFindings());
  const runs = map?.entries.get('runs')?.value;
  const [first, second] = runs?.type === 'list' ? (runs.items as SourceMap[]) : [];

  it('are those of the first character of each value', () => {
    expect(standsAt(text, cell(first, 'lock_in'), 7)).toBe('15 degC');
    const fixed = cell(first, 'fixed');
    expect(fixed.type === 'list' && standsAt(text, fixed.items[1], 1)).toBe('5');
    expect(fixed.type === 'list' && fixed.items[1].place.key).toBe('runs[1].fixed[2]');
    expect(cell(second, 'line').place).toEqual({
      file: 'job.yaml',
      line: 6,
      column: 11,
      key: 'runs[2].line',
    });
  });

  it('come with the value as typed', () => {
    expect(cell(first, 'id')).toMatchObject({ text: '01' });
    expect(cell(second, 'id')).toMatchObject({ text: '1e3' });
    expect(cell(second, 'line')).toMatchObject({ text: '2' });
    expect(cell(second, 'grip')).toMatchObject({ text: '' });
    expect(map && cell(map, 'title')).toMatchObject({ text: 'Pier é' });
  });
});
