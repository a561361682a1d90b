import type { ZonesJob } from '../model.ts';
import { shortSeason } from '../temperature/short-season.ts';
import type { Moment, ZoneFacts } from '../verdict/zone-facts.ts';
import { amount, stamp } from './names.ts';
import { grouped, shortNumber } from './number-text.ts';
import { inUnits } from './quantity.ts';
import { defaultLines } from './summary/default-lines.ts';
import { findingCounts, ONE_BY_ONE } from './summary/found-lines.ts';
import { sourceLines, spanText } from './summary/record-lines.ts';
import { sunLines } from './summary/sun-lines.ts';
import { bullet, table, wrap } from './summary/text-layout.ts';
import { swingTable } from './swing-table.ts';

/**
 * The zones of a job for a person: extremes and their dates, daily swings, swings by size, what the sun adds, what was
 * missing, and what zones in the sun were reckoned from.
 *
 * @param facts of every zone that is not constant
 * @returns text of at most 100 columns in the units of the job, with LF line ends
 */
export function temperaturesText(job: ZonesJob, facts: readonly ZoneFacts[]): string {
  const zoneDefaults = job.defaults.filter(({ key }) => /^(?:zones |record)/.test(key));
  const sections = [
    [`${job.title}: temperatures`, '', ...sourceLines(job), wrap(spanText(job))].join('\n'),
    section('Each zone', [extremesTable(facts, job)]),
    section('Daily swing, whole days', [dailyTable(facts, job)]),
    section('Swings by size, a year', swingTable(facts, job.units)),
    section('What the sun does', gainTable(facts, job)),
    section('Zones reckoned from sun and air', sunLines(job)),
    section('To bear in mind', notes(facts, job)),
    section('Found in the record', foundInRecord(job)),
    section('Warnings', job.warnings.map(bullet)),
    section('Left at their defaults', defaultLines(zoneDefaults)),
  ];
  return `${sections.filter((text) => text !== '').join('\n\n')}\n`;
}

function extremesTable(facts: readonly ZoneFacts[], { units }: ZonesJob): string {
  const degrees = (value: number) => amount(value, 'temperature', units);
  const rows = facts.map(({ zone, coldest, warmest, mean }) => [
    zone.name,
    degrees(coldest.value),
    stamp(coldest.time),
    degrees(warmest.value),
    stamp(warmest.time),
    degrees(mean),
  ]);
  return table([['zone', 'coldest', 'at', 'warmest', 'at', 'mean'], ...rows], [1, 3, 5]);
}

function dailyTable(facts: readonly ZoneFacts[], { units }: ZonesJob): string {
  const swing = (value: number) => amount(value, 'temperature difference', units);
  const rows = facts.flatMap(({ zone, swings, largestSwing, days }) =>
    swings === null || largestSwing === null
      ? []
      : [
          [
            zone.name,
            grouped(days.days.length),
            swing(swings.half),
            swing(swings.most),
            swing(swings.nearlyAll),
            swing(largestSwing.value),
            stamp(largestSwing.time).slice(0, 10),
          ],
        ],
  );
  const header = ['zone', 'days', 'half under', '90 % under', '99 % under', 'largest', 'on'];
  return rows.length === 0 ? '' : table([header, ...rows], [1, 2, 3, 4, 5]);
}

function gainTable(facts: readonly ZoneFacts[], { units }: ZonesJob): string[] {
  const kelvin = ({ value }: Pick<Moment, 'value'>) =>
    amount(value, 'temperature difference', units);
  const rows = facts.flatMap(({ zone, gain }) =>
    gain === null
      ? []
      : [
          [
            zone.name,
            kelvin(gain.largest),
            stamp(gain.largest.time),
            kelvin({ value: gain.meanInLight }),
            kelvin(gain.smallest),
            shortNumber(inUnits(gain.brightest.value, 'irradiance', units)),
            grouped(Math.round(gain.lightPerYear)),
          ],
        ],
  );
  if (rows.length === 0) return [];
  const header = ['zone', 'most', 'at', 'mean in light', 'least', 'W/m², most', 'kWh/m² a year'];
  const how = 'Most, mean in light and least: over the air. W/m² and kWh/m²: light on the surface.';
  return [table([header, ...rows], [1, 3, 4, 5, 6]), bullet(how)];
}

function notes(facts: readonly ZoneFacts[], { axis, zones }: ZonesJob): string[] {
  const gaps = facts
    .filter(({ filled, bridged }) => filled + bridged > 0)
    .map(({ zone, filled, bridged }) => {
      const hours = (samples: number) => `${shortNumber(samples * axis.stepHours)} h`;
      return `${zone.name}: ${hours(filled)} filled and counted as covered, ${hours(bridged)} bridged and not.`;
    });
  const days = shortSeason(facts.reduce((most, { years }) => Math.max(most, years), 0) * 8766);
  const short =
    days === null
      ? []
      : [
          `The record covers ${shortNumber(days)} days: swings and light a year are scaled from them.`,
        ];
  const constant = zones.filter((zone) => zone.constant).map(({ name }) => name);
  const still = constant.length === 0 ? [] : [`Constant, and not shown: ${constant.join(', ')}.`];
  return [...gaps, ...short, ...still].map(bullet);
}

function foundInRecord({ recordFindings }: ZonesJob): string[] {
  return recordFindings.length === 0 ? [] : [...findingCounts(recordFindings), ONE_BY_ONE];
}

function section(title: string, lines: readonly string[]): string {
  const body = lines.filter((line) => line !== '');
  return body.length === 0 ? '' : [title, ...body].join('\n');
}
