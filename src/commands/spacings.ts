import { readJob } from '../input/job.ts';
import { InputError } from '../issue.ts';
import { manifestText } from '../output/manifest-json.ts';
import { spacingsCsv } from '../output/spacings-csv.ts';
import { notComparedText, spacingsText } from '../output/spacings-text.ts';
import { MANIFEST, type OutputFile } from '../output/write-files.ts';
import { compareSpacings, type SpacingComparison } from '../verdict/spacings.ts';
import { filesText } from './files-text.ts';
import { reportDirectory } from './report-directory.ts';
import type { CommandOutcome } from './screen.ts';
import { chooseRuns, readSpacings, type SpacingOptions } from './spacing-options.ts';
import { writeResults } from './write-results.ts';

export interface SpacingsOptions extends SpacingOptions {
  /** Folder for the results; by default one under `reports/` with the job's name and `-spacings`. */
  readonly out?: string;
  readonly charts: 'all' | 'none';
}

/**
 * `daystrain spacings`: screens the runs of a job at several spacings of their fasteners, and writes a table, the
 * answer in words, charts and manifest.
 *
 * @param jobPath the job file, or a folder that holds job.yaml
 * @throws InputError with every fault of the options or the job, where nothing can be compared, or where the results
 *   cannot be written
 */
export async function spacingsCommand(
  jobPath: string,
  options: SpacingsOptions,
): Promise<CommandOutcome> {
  const asked = readSpacings(options);
  const job = await readJob(jobPath);
  const runs = chooseRuns(job, options, asked.spacings);
  const comparison = compareSpacings(job, { ...asked, runs });
  const left = comparison.notCompared.map((one) => notComparedText(one, comparison));
  if (comparison.cases.length === 0) throw nothingToCompare(left);
  const text = spacingsText(comparison);
  const directory = options.out ?? `${await reportDirectory(jobPath)}-spacings`;
  const files = await write(comparison, text, directory, options.charts);
  return {
    lines: [text, `Results in ${directory}: ${filesText(files)}`],
    warnings: [...job.warnings, ...left],
    fails: runs.some((run) => passesNowhere(run.id, comparison)),
  };
}

/** True where none of the run's cases passes at any spacing; a run that was not compared passes nowhere. */
function passesNowhere(id: string, { cases }: SpacingComparison): boolean {
  const rows = cases.filter(({ run }) => run.id === id).flatMap((one) => one.rows);
  return rows.every(({ passes }) => passes === false);
}

async function write(
  comparison: SpacingComparison,
  text: string,
  directory: string,
  charts: SpacingsOptions['charts'],
): Promise<string[]> {
  const files: OutputFile[] = [
    { name: 'spacings.txt', content: text },
    { name: 'spacings.csv', content: spacingsCsv(comparison) },
    ...(charts === 'none' ? [] : await drawCharts(comparison)),
  ];
  await writeResults(
    directory,
    files,
    manifestText(comparison.job, { spacings: made(comparison) }, files),
  );
  return [...files.map((file) => file.name), MANIFEST];
}

/** What was compared, for the manifest. */
function made({ question }: SpacingComparison) {
  return {
    runs: question.runs.map(({ id }) => id),
    asked_mm: question.spacings,
    fixed: question.arrangements ?? 'as in the job',
    cuts: question.cuts.map((cut) =>
      'pieces' in cut ? { pieces: cut.pieces } : { longest_mm: cut.longest },
    ),
  };
}

/** The canvas is loaded only where charts are wanted. */
async function drawCharts(comparison: SpacingComparison): Promise<OutputFile[]> {
  const { spacingsCharts } = await import('../output/charts/spacings-charts.ts');
  const { renderPngs } = await import('../output/png.ts');
  return renderPngs(spacingsCharts(comparison));
}

function nothingToCompare(left: readonly string[]): InputError {
  return new InputError([
    {
      place: { file: 'spacings' },
      found: 'nothing that can be compared',
      expected: 'a run that another spacing can be given to',
      hint: left.join('\n    '),
    },
  ]);
}
