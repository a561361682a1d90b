import type { Site } from '../src/model.ts';
import type { StationYear } from './invented-station.ts';

/**
 * A station's year in the open EPW layout: eight lines of header, then a row an hour of 35 fields. What was not invented
 * bears the layout's marks for missing values.
 */
export function epwText(name: string, { latitude, longitude, utcOffset }: Site, year: StationYear) {
  const header = [
    `LOCATION,${name},-,Nowhere,invented,000000,${latitude},${longitude},${utcOffset},0`,
    'DESIGN CONDITIONS,0',
    'TYPICAL/EXTREME PERIODS,0',
    'GROUND TEMPERATURES,0',
    'HOLIDAYS/DAYLIGHT SAVINGS,No,0,0,0',
    `COMMENTS 1,${name} and its weather are invented`,
    'COMMENTS 2,made by a seeded generator',
    'DATA PERIODS,1,1,Data,Sunday,1/1,12/31',
  ];
  const rows = year.times.map((time, h) => {
    // The hour that ends at midnight is the 24th of the day before.
    const begun = new Date(time - 3_600_000);
    const date = [begun.getUTCFullYear(), begun.getUTCMonth() + 1, begun.getUTCDate()];
    const light = [year.global[h], year.direct[h], year.diffuse[h]].map(Math.round);
    return [
      ...[...date, begun.getUTCHours() + 1, 0, 'E'],
      ...[year.air[h].toFixed(1), '99.9', 999, 999_999, 9999, 9999, 9999],
      ...light,
      ...[999_999, 999_999, 999_999, 9999, 999, year.wind[h].toFixed(1)],
      ...[99, 99, 9999, 99_999, 9, 999_999_999, 999, '.999', 999, 99, 999, 999, 99],
    ].join(',');
  });
  return `${[...header, ...rows].join('\n')}\n`;
}
