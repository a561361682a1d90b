import type { Job, RunResult } from '../../model.ts';
import { scaledFrom } from '../../temperature/short-season.ts';
import { connectionName } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import type { Chart } from './chart.ts';
import { type CurvePanel, curvePanel } from './curve-panel.ts';
import { type CurvePart, curveParts } from './curve-part.ts';
import type { FixedTicks } from './fixed-ticks.ts';
import { decadeTicks, roundTicks } from './log-ticks.ts';
import { axis, baseOptions, spacer } from './theme.ts';

/**
 * The counted ranges of a run's governing connection against the S-N curves of its fastener and member,
 * logarithmic both ways, with each bin's share of the damage beside it.
 */
export function curveChart(result: RunResult, job: Job): Chart {
  const all = curveParts(result, job);
  const withCurve = all.filter((part) => part.curve !== null);
  const parts = withCurve.length > 0 ? withCurve : all;
  const panels = parts.map((part) => curvePanel(part, job));
  const cycles = cyclesReach(panels);
  const base = baseOptions(title(result, all, job), subtitle(all, job), { right: 30 });
  return {
    name: `${result.run.id}-curve`,
    configuration: {
      type: 'line',
      data: { datasets: panels.flatMap(({ sets }) => sets) },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: {
            axes: {
              cycles: decadeTicks(...cycles),
              share: shareTicks(mostShare(parts)),
              ...Object.fromEntries(
                panels.map(({ part, ranges }) => [part, roundTicks(...ranges)]),
              ),
            },
          },
          directLabels: { labels: panels.flatMap(({ labels }) => labels) },
        },
        scales: {
          ...rangeAxes(panels),
          cycles: axis(cyclesTitle(withCurve, job), {
            ...ACROSS,
            type: 'logarithmic',
            min: cycles[0],
            max: cycles[1],
            stackWeight: 10,
          }),
          ...(withCurve.length === 0 ? {} : shareAxes(mostShare(parts))),
        },
      },
    },
  };
}

const ACROSS = { axis: 'x', position: 'bottom', stack: 'across' } as const;

const shareAxes = (max: number) => ({
  between: { ...spacer(0.5), ...ACROSS },
  share: axis('Share of the damage [%]', {
    ...ACROSS,
    min: 0,
    max,
    stackWeight: 4,
  }),
});

/** Whole tens of per cent, to over the largest share. */
function mostShare(parts: readonly CurvePart[]): number {
  const largest = Math.max(0.05, ...parts.flatMap(({ bins }) => bins.map(({ share }) => share)));
  return Math.min(100, 10 * Math.ceil(10 * largest * 1.05));
}

function shareTicks(most: number): FixedTicks {
  const step = most > 50 ? 20 : 10;
  return Array.from({ length: Math.floor(most / step) + 1 }, (_, i) => ({
    value: i * step,
    label: String(i * step),
  }));
}

function cyclesTitle(withCurve: readonly CurvePart[], job: Job): string {
  const counted = `Cycles in ${years(job)}`;
  return withCurve.length === 0 ? counted : `${counted}; of the curve: cycles to failure`;
}

/** One above the other; the library stacks them from the last one down. */
function rangeAxes(panels: readonly CurvePanel[]) {
  const axes = panels.toReversed().flatMap(({ part, title: name, ranges }, i) => {
    const scale = axis(name, {
      axis: 'y',
      type: 'logarithmic',
      position: 'left',
      stack: 'panels',
      stackWeight: 5,
      min: ranges[0],
      max: ranges[1],
    });
    const own: [string, object] = [part, scale];
    return i === 0 ? [own] : [['gap', { ...spacer(0.4), axis: 'y' }] as [string, object], own];
  });
  return Object.fromEntries(axes);
}

/** Whole powers of ten around everything that is drawn over cycles. */
function cyclesReach(panels: readonly CurvePanel[]): [number, number] {
  const xs = panels.flatMap(({ sets }) =>
    sets.filter((set) => set.xAxisID === 'cycles').flatMap(({ data }) => data.map(({ x }) => x)),
  );
  if (xs.length === 0) return [1, 1e6];
  const least = Math.max(0.1, Math.min(...xs));
  return [10 ** Math.floor(Math.log10(least)), 10 ** Math.ceil(Math.log10(Math.max(...xs)))];
}

function title(result: RunResult, parts: readonly CurvePart[], job: Job): string {
  const name = connectionName(result.connections[result.governing]);
  const lives = job.limits.designLife / result.years;
  const sums = parts.filter(({ curve }) => curve !== null);
  if (sums.length === 0) return `${name}: no curve was given, so damage is not judged`;
  const text = sums.map(({ part, damage }) => `${part} ${shortNumber((damage.sum ?? 0) * lives)}`);
  return `${name}: damage in ${years(job)}: ${text.join(', ')} (allowed ${shortNumber(job.limits.damage)})${scaled(result)}`;
}

function subtitle(parts: readonly CurvePart[], job: Job): string {
  const without = parts.filter(({ curve }) => curve === null).map(({ part }) => part);
  if (without.length === parts.length)
    return `Each point: a bin of counted ranges and its cycles in ${years(job)}.`;
  const missing = without.length === 0 ? '' : ` No curve was given for the ${without[0]}.`;
  return `Each point: a bin of counted ranges and its cycles in ${years(job)}; filled where it does damage.${missing}`;
}

/** The days that the damage was scaled from where the record is no whole year. */
function scaled(run: RunResult): string {
  const days = scaledFrom(run);
  return days === null ? '' : `, scaled from ${shortNumber(days)} days`;
}

function years({ limits }: Job): string {
  return `${shortNumber(limits.designLife)} years`;
}
