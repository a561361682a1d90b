import { stringify } from 'csv-stringify/sync';
import type { Season } from './invented-weather.ts';

/** How a season is written down. */
export interface RecordForm {
  readonly unit: 'degC' | 'degF';
  /** Hours in which a channel's sensor gave nothing. */
  readonly outages: readonly { channel: string; from: number; hours: number }[];
}

/** The season as CSV text: `time` and a column a channel, one decimal, blank where the sensor gave nothing. */
export function recordText(season: Season, { unit, outages }: RecordForm): string {
  const names = [...season.channels.keys()];
  const header = ['time', ...names.map((name) => `${name} [${unit}]`)];
  const rows = season.times.map((time, h) => {
    const out = outages.filter((o) => time >= o.from && time < o.from + o.hours * 3_600_000);
    const cells = names.map((name) =>
      out.some((o) => o.channel === name) ? '' : cellText(season.channels.get(name)![h], unit),
    );
    return [new Date(time).toISOString().slice(0, 16), ...cells];
  });
  return stringify([header, ...rows]);
}

function cellText(celsius: number, unit: 'degC' | 'degF'): string {
  const value = unit === 'degC' ? celsius : celsius * 1.8 + 32;
  return (Math.round(value * 10) / 10 || 0).toFixed(1);
}
