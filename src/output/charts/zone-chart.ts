import type { ZonesJob } from '../../model.ts';
import type { ZoneFacts } from '../../verdict/zone-facts.ts';
import { amount, stamp } from '../names.ts';
import { inUnits, unitOf } from '../quantity.ts';
import type { Chart, Point } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { axis, baseOptions, COLOUR, line, spacer, TICKS } from './theme.ts';
import { timeTicks } from './time-ticks.ts';

const NOON = 43_200_000;

/** A zone over the record: the band from each day's coldest to its warmest temperature, and below it the daily swing. */
export function zoneChart(facts: ZoneFacts, job: ZonesJob, name: string): Chart {
  const { zone, days, coldest, warmest, largestSwing } = facts;
  const { times } = job.axis;
  const [from, to] = [times[0], times[times.length - 1]];
  const degrees = (value: number) => inUnits(value, 'temperature', job.units);
  const daily = (of: (d: number) => number): Point[] =>
    Array.from(days.days, (day, d) => ({ x: day + NOON, y: of(d) }));
  const low = daily((d) => degrees(days.coldest[d]));
  const high = daily((d) => degrees(days.warmest[d]));
  const swing = daily((d) =>
    inUnits(days.warmest[d] - days.coldest[d], 'temperature difference', job.units),
  );
  const said = (value: number) => amount(value, 'temperature', job.units);
  const title = `${zone.name}: ${said(coldest.value)} to ${said(warmest.value)}`;
  const largest =
    largestSwing === null
      ? ''
      : ` Largest daily swing ${amount(largestSwing.value, 'temperature difference', job.units)}, ${stamp(largestSwing.time).slice(0, 10)}.`;
  const subtitle = `Band: from each day's coldest to its warmest temperature.${largest}`;
  const base = baseOptions(title, subtitle, { right: 40 });
  const label = (at: { value: number; time: number }, down: number): DirectLabel => ({
    text: `${said(at.value)}, ${stamp(at.time)}`,
    xAxis: 'x',
    yAxis: 'temperature',
    x: at.time,
    y: degrees(at.value),
    side: sideOf((at.time - from) / (to - from)),
    shift: [0, down],
  });
  const room = 0.15 * (degrees(warmest.value) - degrees(coldest.value) || 1);
  return {
    name,
    configuration: {
      type: 'line',
      data: {
        datasets: [
          line(low, { label: 'coldest', yAxisID: 'temperature', borderWidth: 1 }),
          line(high, {
            label: 'warmest',
            yAxisID: 'temperature',
            borderWidth: 1,
            fill: '-1',
            backgroundColor: `${COLOUR.demand}40`,
          }),
          line(swing, { label: 'daily swing', yAxisID: 'swing', borderColor: COLOUR.second }),
        ],
      },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: { axes: { x: timeTicks(from, to) } },
          directLabels: { labels: [label(warmest, -13), label(coldest, 13)] },
        },
        scales: {
          x: axis('', { min: from, max: to }),
          swing: axis(`Daily swing [${unitOf('temperature difference', job.units)}]`, {
            position: 'left',
            stack: 'panels',
            stackWeight: 3,
            min: 0,
          }),
          gap: spacer(0.4),
          temperature: axis(`Temperature [${unitOf('temperature', job.units)}]`, {
            position: 'left',
            stack: 'panels',
            stackWeight: 6,
            min: degrees(coldest.value) - room,
            max: degrees(warmest.value) + room,
            ticks: { ...TICKS, includeBounds: false },
          }),
        },
      },
    },
  };
}

/** Near an end of the record a label lies inside it. */
function sideOf(share: number): 'left' | 'right' | 'middle' {
  return share < 0.12 ? 'right' : share > 0.88 ? 'left' : 'middle';
}
