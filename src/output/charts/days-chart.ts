import type { ZonesJob } from '../../model.ts';
import type { ZoneFacts } from '../../verdict/zone-facts.ts';
import { amount, stamp } from '../names.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Chart, Point } from './chart.ts';
import { axis, baseOptions, COLOUR, DASH, type LineSet, line } from './theme.ts';

const DAY = 86_400_000;
const HOUR = 3_600_000;

/**
 * Three days of a zone by the hour: the one with its warmest, the one with its coldest temperature, and the one of its
 * largest swing; the air of each beside it where the zone was reckoned from sun and air.
 */
export function daysChart(facts: ZoneFacts, job: ZonesJob, name: string): Chart {
  const { zone, warmest, coldest, largestSwing } = facts;
  const days = [
    { words: 'warmest day', at: warmest.time, colour: COLOUR.limit, dash: DASH.solid },
    { words: 'coldest day', at: coldest.time, colour: COLOUR.demand, dash: DASH.solid },
    ...(largestSwing === null
      ? []
      : [
          {
            words: 'largest swing',
            at: largestSwing.time,
            colour: COLOUR.second,
            dash: DASH.dashed,
          },
        ]),
  ];
  const lines = days.flatMap(({ words, at, colour, dash }) => {
    const day = Math.floor(at / DAY) * DAY;
    const own = dayLine(zone.temperature, job, day);
    const air = zone.sunlit === null ? [] : dayLine(zone.sunlit.air, job, day);
    const date = stamp(day).slice(0, 10);
    return [
      {
        set: line(own, {
          label: `${words}, ${date}`,
          borderColor: colour,
          borderDash: dash,
          borderWidth: 2,
        }),
        text: `${words}, ${date}`,
      },
      ...(air.length === 0
        ? []
        : [
            {
              set: line(air, {
                label: `air, ${date}`,
                borderColor: colour,
                borderDash: DASH.dotted,
              }),
              text: 'its air',
            },
          ]),
    ];
  });
  const title = `${zone.name}: the days of the warmest and coldest hour and of the largest swing`;
  const subtitle = `Warmest ${amount(warmest.value, 'temperature', job.units)}, coldest ${amount(coldest.value, 'temperature', job.units)}. Hours on the record's own clock.`;
  const base = baseOptions(title, subtitle, { right: 250 });
  return {
    name,
    configuration: {
      type: 'line',
      data: { datasets: lines.map(({ set }) => set) },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: { axes: { x: hourTicks() } },
          directLabels: { labels: lines.map(({ set, text }) => labelOf(set, text)) },
        },
        scales: {
          x: axis('Hour of the day', { min: 0, max: 24 }),
          y: axis(`Temperature [${unitOf('temperature', job.units)}]`),
        },
      },
    },
  };
}

/** The samples of a day, by its hours. */
function dayLine(values: Float64Array, { axis: { times }, units }: ZonesJob, day: number): Point[] {
  const points: Point[] = [];
  for (let i = 0; i < times.length; i++) {
    if (times[i] < day || times[i] > day + DAY) continue;
    points.push({ x: (times[i] - day) / HOUR, y: inUnits(values[i], 'temperature', units) });
  }
  return points;
}

function labelOf({ data, borderColor }: LineSet, text: string) {
  return {
    text,
    xAxis: 'x',
    yAxis: 'y',
    x: 'right' as const,
    y: data[data.length - 1].y,
    shift: [14, 0] as const,
    colour: String(borderColor),
    group: 'days',
  };
}

function hourTicks() {
  return Array.from({ length: 9 }, (_, i) => ({ value: 3 * i, label: `${3 * i}:00` }));
}
