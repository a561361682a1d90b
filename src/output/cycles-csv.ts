import { stringify } from 'csv-stringify/sync';
import type { RangeBin, Result, RunResult } from '../model.ts';
import type { UnitSystem } from '../units.ts';
import { cellNumber } from './number-text.ts';
import { inUnits, unitOf, type Written } from './quantity.ts';

/**
 * cycles.csv: the counted ranges of each run's governing connection in bins, for its fastener's shear
 * and for the member's stress. Ranges are unfactored; cycles and damage are those of the counted pass.
 * `cycles_to_failure` is `unlimited` where a bin does no damage, and blank, as `damage`, without a curve.
 *
 * @returns the CSV text with a header row and LF line ends
 */
export function cyclesCsv(result: Result): string {
  const { units } = result.job;
  return stringify([HEADER, ...result.runs.flatMap((run) => runRows(run, units))]);
}

const HEADER = [
  'run',
  'connection',
  'part',
  'curve',
  'range_from',
  'range_to',
  'unit',
  'cycles',
  'cycles_to_failure',
  'damage',
];

function runRows(result: RunResult, units: UnitSystem): string[][] {
  const connection = result.connections[result.governing];
  const start = [connection.run, String(connection.number)];
  const rows = (bins: readonly RangeBin[], quantity: Written, names: string[]) =>
    bins.map((bin) => [
      ...start,
      ...names,
      cellNumber(inUnits(bin.from, quantity, units)),
      cellNumber(inUnits(bin.to, quantity, units)),
      unitOf(quantity, units),
      cellNumber(bin.count),
      cellNumber(bin.cyclesToFailure, 'unlimited'),
      cellNumber(bin.damage),
    ]);
  const fastenerCurve = connection.fastener.curve?.id ?? '';
  const memberCurve = result.run.member.curve?.id ?? '';
  return [
    ...rows(result.fastenerBins, 'force', ['fastener', fastenerCurve]),
    ...rows(result.memberBins, 'stress', ['member', memberCurve]),
  ];
}
