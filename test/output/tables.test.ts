import { parse } from 'csv-parse/sync';
import { expect, test } from 'vitest';
import { checksCsv } from '../../src/output/checks-csv.ts';
import { cyclesCsv } from '../../src/output/cycles-csv.ts';
import { resultsCsv } from '../../src/output/results-csv.ts';
import { makeResult } from './make-result.ts';

type Row = Record<string, string>;

/** Read back by a CSV reader, which the writer's rows must survive. */
const rowsOf = (text: string): Row[] => parse(text, { columns: true });
const headerOf = (text: string) => text.slice(0, text.indexOf('\n'));

// Exact by definition: the international yard and pound agreement (1959), 1 in = 25.4 mm and
// 1 lb = 0.45359237 kg, with standard gravity 9.80665 m/s² (CGPM 1901).
const INCH = 25.4;
const KIP = 1000 * 0.45359237 * 9.80665;

const si = makeResult();
const us = makeResult({ units: 'US' });

test('results.csv has the agreed columns, with the units of the job', () => {
  expect(headerOf(resultsCsv(si))).toBe(
    'run,connection,position [mm],fastener,role,shear_peak [kN],shear_range_max [kN],' +
      'shear_range_equivalent [kN],cycles_per_year,fastener_damage_per_year,' +
      'stress_range_max [MPa],stress_range_equivalent [MPa],member_damage_per_year,life [years],' +
      'slip_peak [mm],sliding_per_year [mm],buckling_utilisation,governing_check,utilisation,' +
      'passes,verdict,remedy,damage_scaled_from [days],fastener_damage_filled_share,member_damage_filled_share',
  );
  expect(headerOf(resultsCsv(us))).toBe(
    headerOf(resultsCsv(si))
      .replaceAll('[kN]', '[kip]')
      .replaceAll('[mm]', '[in]')
      .replaceAll('[MPa]', '[ksi]'),
  );
});

test('results.csv has one row a connection with the numbers of the result', () => {
  const rows = rowsOf(resultsCsv(si));
  const connections = si.runs.flatMap((run) => run.connections);
  expect(rows).toHaveLength(connections.length);
  for (const [i, connection] of connections.entries()) {
    const row = rows[i];
    expect(row.run).toBe(connection.run);
    expect(Number(row.connection)).toBe(connection.number);
    expect(Number(row['position [mm]'])).toBe(connection.position);
    expect(Number(row['shear_range_max [kN]'])).toBeCloseTo(connection.shearRange / 1000, 6);
    expect(Number(row['stress_range_max [MPa]'])).toBeCloseTo(connection.stressRange, 5);
    expect(row.governing_check).toBe(connection.governing?.check);
    expect(row.verdict).toBe(connection.verdict);
  }
});

test('results.csv names the days that damage was scaled from where the record is no whole year', () => {
  const days = (result: typeof si) =>
    rowsOf(resultsCsv(result)).map((row) => row['damage_scaled_from [days]']);
  expect(new Set(days(si))).toEqual(new Set(['']));
  expect(new Set(days(makeResult({ hours: 90 * 24 })))).toEqual(new Set(['90']));
});

test('US results are the SI ones by the exact inch and pound-force', () => {
  const [siRows, usRows] = [rowsOf(resultsCsv(si)), rowsOf(resultsCsv(us))];
  for (const [i, row] of usRows.entries()) {
    const newton = 1000 * Number(siRows[i]['shear_peak [kN]']);
    expect(Number(row['shear_peak [kip]']) * KIP).toBeCloseTo(newton, 3);
    const stress = Number(siRows[i]['stress_range_max [MPa]']);
    expect((Number(row['stress_range_max [ksi]']) * KIP) / INCH ** 2).toBeCloseTo(stress, 5);
    const position = Number(siRows[i]['position [mm]']);
    expect(Number(row['position [in]']) * INCH).toBeCloseTo(position, 3);
  }
});

test('no damage is 0, no curve is blank, and an endless life is unlimited', () => {
  const run = si.runs[0];
  const unlimited = { ...run.connections[0], life: Infinity };
  const result = { ...si, runs: [{ ...run, connections: [unlimited] }, si.runs[1]] };
  const [first, second] = rowsOf(resultsCsv(result));
  expect(first['life [years]']).toBe('unlimited');
  expect(first.member_damage_per_year).toBe('0');
  expect(second['life [years]']).toBe('');
  expect(second.member_damage_per_year).toBe('');
  expect(second['shear_range_equivalent [kN]']).toBe('');
});

test('checks.csv has one row a check, with its unit beside it', () => {
  const text = checksCsv(us);
  expect(headerOf(text)).toBe('run,connection,check,demand,limit,unit,utilisation,status,when');
  const rows = rowsOf(text);
  expect(rows).toHaveLength(
    us.runs.flatMap((run) => run.connections.flatMap(({ checks }) => checks)).length,
  );
  const find = (name: string) => rows.find(({ check, run }) => check === name && run === 'R3')!;
  expect(find('peak shear').unit).toBe('kip');
  expect(Number(find('peak shear').limit) * KIP).toBeCloseTo(18000, 2);
  expect(find('yield range').unit).toBe('ksi');
  expect(find('slot travel').unit).toBe('in');
  expect(find('combined')).toMatchObject({
    unit: '1',
    demand: '',
    utilisation: '',
    status: 'not given',
  });
  expect(find('shear range')).toMatchObject({ limit: '', status: 'not given' });
});

test('cycles.csv has the bins of each governing connection, and their damage adds up', () => {
  const rows = rowsOf(cyclesCsv(si));
  expect(headerOf(cyclesCsv(si))).toBe(
    'run,connection,part,curve,range_from,range_to,unit,cycles,cycles_to_failure,damage',
  );
  const fastener = rows.filter(({ run, part }) => run === 'R1' && part === 'fastener');
  expect(fastener.map(({ cycles }) => Number(cycles))).toEqual(
    si.runs[0].fastenerBins.map(({ count }) => count),
  );
  expect(fastener.every(({ unit, curve }) => unit === 'kN' && curve === 'anchor M12')).toBe(true);
  const sum = fastener.reduce((total, { damage }) => total + Number(damage), 0);
  expect(sum).toBeCloseTo(si.runs[0].connections[0].fastenerDamage.sum!, 9);
  expect(fastener[0].cycles_to_failure).toBe('unlimited');
  const uncurved = rows.filter(({ run, part }) => run === 'R2' && part === 'member');
  expect(uncurved.length).toBeGreaterThan(0);
  expect(uncurved.every((row) => row.curve === '' && row.damage === '' && row.unit === 'MPa')).toBe(
    true,
  );
});

test('an id with a comma or a quote comes back as it was', () => {
  const run = si.runs[0];
  const odd = { ...run.connections[0], run: 'north, "upper"' };
  const result = { ...si, runs: [{ ...run, connections: [odd] }] };
  expect(rowsOf(resultsCsv(result))[0].run).toBe('north, "upper"');
});
