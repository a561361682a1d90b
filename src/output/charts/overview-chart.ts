import type { Result, RunResult } from '../../model.ts';
import { shortNumber } from '../number-text.ts';
import { runFails } from '../run-fails.ts';
import type { Chart } from './chart.ts';
import type { DirectLabel } from './direct-labels.ts';
import { roundTicks } from './log-ticks.ts';
import { axis, baseOptions, COLOUR, DASH, type LineSet, line } from './theme.ts';

/** More runs than these do not fit: the ones with the largest utilisation are drawn. */
const MOST_RUNS = 30;

/** Utilisations under this are drawn at it. */
const LEAST = 0.01;

/** All runs of a job: the largest utilisation of each against the limit, and the check that governs it. */
export function overviewChart(result: Result): Chart {
  const shown = shownRuns(result.runs);
  const most =
    1.2 * Math.max(2, ...shown.map((run) => utilisation(run) ?? 0).filter(Number.isFinite));
  const base = baseOptions(title(result), subtitle(result, shown.length), { right: 390 });
  return {
    name: 'overview',
    configuration: {
      type: 'line',
      data: { datasets: [limitLine(shown.length), ...stems(shown, most), ...dots(shown, most)] },
      options: {
        ...base,
        plugins: {
          ...base.plugins,
          fixedTicks: {
            axes: {
              x: roundTicks(LEAST, most),
              y: shown.map(({ run }, i) => ({ value: i, label: clipped(run.id) })),
            },
          },
          directLabels: { labels: [...HEADINGS, ...shown.flatMap(rowLabels)] },
        },
        scales: {
          x: axis('Utilisation: demand / limit, logarithmic', {
            type: 'logarithmic',
            min: LEAST,
            max: most,
          }),
          y: axis('', {
            min: -0.6,
            max: shown.length - 0.4,
            reverse: true,
            grid: { display: false },
          }),
        },
      },
    },
  };
}

function shownRuns(runs: readonly RunResult[]): RunResult[] {
  const use = (run: RunResult) => utilisation(run) ?? -1;
  const worst = [...runs].sort((a, b) => use(b) - use(a)).slice(0, MOST_RUNS);
  return runs.filter((run) => worst.includes(run));
}

function utilisation({ connections, governing }: RunResult): number | null {
  return connections[governing].governing?.utilisation ?? null;
}

function title({ runs, governing }: Result): string {
  const failing = runs.filter(runFails).length;
  const verdict =
    failing === 0
      ? 'No run fails'
      : `${failing} of ${runs.length} ${runs.length === 1 ? 'run' : 'runs'} ${failing === 1 ? 'fails' : 'fail'}`;
  const use = utilisation(runs[governing]);
  if (use === null) return 'Nothing was checked: no limit was given';
  return `${verdict}; ${runs[governing].run.id} is used most, ${shortNumber(use)} times its limit`;
}

function subtitle({ job, runs }: Result, shown: number): string {
  const part =
    shown < runs.length ? ` The ${shown} of ${runs.length} runs that are used most.` : '';
  return `${job.title}. Largest utilisation in each run; a run right of the line fails.${part}`;
}

function limitLine(rows: number): LineSet {
  return line(
    [
      { x: 1, y: -0.6 },
      { x: 1, y: rows - 0.4 },
    ],
    { label: 'limit', borderColor: COLOUR.limit, borderDash: DASH.dashed, borderWidth: 2 },
  );
}

/** Where a utilisation is drawn: at the edge where it lies beyond the scale. */
function drawn(use: number, most: number): number {
  return Math.min(Math.max(use, LEAST), most);
}

/** From the limit to each run's point: how far it is from failing, or past it. */
function stems(runs: readonly RunResult[], most: number): LineSet[] {
  return runs.flatMap((run, y) => {
    const use = utilisation(run);
    if (use === null) return [];
    const ends = [
      { x: 1, y },
      { x: drawn(use, most), y },
    ];
    const borderColor = runFails(run) ? COLOUR.limit : COLOUR.demand;
    return [line(ends, { borderColor, borderWidth: runFails(run) ? 4 : 1.5 })];
  });
}

function dots(runs: readonly RunResult[], most: number): LineSet[] {
  const points = (failing: boolean) =>
    runs.flatMap((run, y) => {
      const use = utilisation(run);
      return use === null || runFails(run) !== failing ? [] : [{ x: drawn(use, most), y }];
    });
  const look = { showLine: false, pointRadius: 7, pointBorderWidth: 2 };
  return [
    line(points(false), {
      ...look,
      label: 'ok',
      pointStyle: 'circle',
      pointBackgroundColor: COLOUR.paper,
      pointBorderColor: COLOUR.demand,
    }),
    line(points(true), {
      ...look,
      label: 'fails',
      pointStyle: 'rectRot',
      pointBackgroundColor: COLOUR.limit,
      pointBorderColor: COLOUR.limit,
    }),
  ];
}

const HEADINGS: readonly DirectLabel[] = [
  {
    text: 'limit',
    xAxis: 'x',
    yAxis: 'y',
    x: 1,
    y: 'top',
    side: 'middle',
    shift: [0, -9],
    colour: COLOUR.limit,
  },
  {
    text: 'governing check',
    xAxis: 'x',
    yAxis: 'y',
    x: 'right',
    y: 'top',
    shift: [84, -9],
    colour: COLOUR.faint,
  },
];

/** The utilisation in figures, and beside it the check and connection that it belongs to. */
function rowLabels(run: RunResult, y: number): DirectLabel[] {
  const connection = run.connections[run.governing];
  const { governing } = connection;
  const failing = runFails(run);
  const look = { xAxis: 'x', yAxis: 'y', x: 'right', y, bold: failing } as const;
  const colour = failing ? COLOUR.limit : COLOUR.ink;
  if (governing === null) return [{ ...look, text: 'nothing to check', shift: [84, 0], colour }];
  const where = `${clipped(connection.run)}/${connection.number}`;
  const name = `${governing.check}, ${where}${failing ? ', fails' : ''}`;
  return [
    {
      ...look,
      text: shortNumber(governing.utilisation ?? 0),
      side: 'left',
      shift: [68, 0],
      colour,
    },
    { ...look, text: name, shift: [84, 0], colour },
  ];
}

function clipped(id: string): string {
  return id.length > 14 ? `${id.slice(0, 13)}…` : id;
}
