import { stringify } from 'csv-stringify/sync';
import { BRIDGED, FILLED, type Zone, type ZonesJob } from '../model.ts';
import { type ResultUnit, resultUnit } from '../units.ts';
import type { ZoneFacts } from '../verdict/zone-facts.ts';
import { stamp } from './names.ts';
import { cellNumber } from './number-text.ts';

/**
 * temperatures.csv: one row a sample and, for each zone that is not constant, its temperature, for one in the sun also
 * the air's and the irradiance on its surface, and a note where a sample was `filled` or `bridged`.
 *
 * @returns the CSV text with a header row and LF line ends
 */
export function temperaturesCsv({ axis, zones, units }: ZonesJob): string {
  const columns = zones
    .filter(({ constant }) => !constant)
    .flatMap((zone) => columnsOf(zone, units));
  const header = stringify([['time', ...columns.map(({ name }) => name)]]);
  const rows = Array.from(axis.times, (time, i) =>
    [stamp(time).replace(' ', 'T'), ...columns.map(({ cell }) => cell(i))].join(','),
  );
  return `${header}${rows.join('\n')}\n`;
}

interface Column {
  readonly name: string;
  readonly cell: (sample: number) => string;
}

function columnsOf(
  { name, temperature, standing, sunlit }: Zone,
  units: ZonesJob['units'],
): Column[] {
  const inUnit = (
    what: string,
    values: Float64Array,
    { name: unit, from }: ResultUnit,
  ): Column => ({
    name: `${what} [${unit}]`,
    cell: (i) => thousandths(from(values[i])),
  });
  const degrees = resultUnit('temperature', units);
  const light = resultUnit('irradiance', units);
  return [
    inUnit(name, temperature, degrees),
    ...(sunlit === null
      ? []
      : [
          inUnit(`${name} air`, sunlit.air, degrees),
          inUnit(`${name} irradiance`, sunlit.irradiance, light),
        ]),
    ...(standing.some((one) => one !== 0)
      ? [{ name: `${name} gaps`, cell: (i: number) => GAP_WORDS[standing[i]] ?? '' }]
      : []),
  ];
}

const GAP_WORDS: Readonly<Record<number, string>> = { [FILLED]: 'filled', [BRIDGED]: 'bridged' };

/** Thousandths of a degree are far finer than anybody measures. */
function thousandths(value: number): string {
  return String(Math.round(value * 1000) / 1000 + 0);
}

/**
 * days.csv: one row a zone and whole day with its coldest and warmest temperature and its swing.
 *
 * @returns the CSV text with a header row and LF line ends
 */
export function daysCsv(zones: readonly ZoneFacts[], units: ZonesJob['units']): string {
  const degrees = resultUnit('temperature', units);
  const difference = resultUnit('temperature difference', units);
  const header = [
    'zone',
    'day',
    `coldest [${degrees.name}]`,
    `warmest [${degrees.name}]`,
    `swing [${difference.name}]`,
  ];
  const rows = zones.flatMap(({ zone, days: { days, coldest, warmest } }) =>
    Array.from(days, (day, d) => [
      zone.name,
      stamp(day).slice(0, 10),
      cellNumber(degrees.from(coldest[d])),
      cellNumber(degrees.from(warmest[d])),
      cellNumber(difference.from(warmest[d] - coldest[d])),
    ]),
  );
  return stringify([header, ...rows]);
}
