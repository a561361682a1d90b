import { readFile } from 'node:fs/promises';
import { readJob } from '../input/job.ts';
import type { Result } from '../model.ts';
import type { ChartChoice } from '../output/charts/choose-charts.ts';
import { checksCsv } from '../output/checks-csv.ts';
import { cyclesCsv } from '../output/cycles-csv.ts';
import { manifestJson } from '../output/manifest-json.ts';
import { recordCsv } from '../output/record-csv.ts';
import { remediedJobYaml } from '../output/remedied-job/remedied-job-yaml.ts';
import { type StagedFile, stageFile } from '../output/remedied-job/stage-file.ts';
import { remediesCsv } from '../output/remedies-csv.ts';
import { resultsCsv } from '../output/results-csv.ts';
import { runFails } from '../output/run-fails.ts';
import { summary } from '../output/summary/summary.ts';
import { warmingCsv } from '../output/warming-csv.ts';
import { MANIFEST, type OutputFile } from '../output/write-files.ts';
import { yearsCsv } from '../output/years-csv.ts';
import { screen } from '../verdict/screen.ts';
import { filesText } from './files-text.ts';
import { type RemediedTarget, remediedTarget } from './remedied-target.ts';
import { reportDirectory } from './report-directory.ts';
import { writeResults } from './write-results.ts';

export interface ScreenOptions {
  /** Folder for the results; by default one under `reports/` with the job's name. */
  readonly out?: string;
  readonly charts: ChartChoice;
  /** Whether remedies are looked for where a run fails; default true. */
  readonly remedies?: boolean;
  /** A job file to write the job to with its remedies in. */
  readonly writeRemedied?: string;
}

/** What a command has to say, for the entry point to print. */
export interface CommandOutcome {
  readonly lines: readonly string[];
  readonly warnings: readonly string[];
  /** True where any check of any connection fails. */
  readonly fails: boolean;
}

/**
 * `daystrain screen`: reads a job, screens it, and writes tables, summary, charts and manifest.
 *
 * @param jobPath the job file, or a folder that holds job.yaml
 * @throws InputError with every issue of the job, or where the results cannot be written
 */
export async function screenCommand(
  jobPath: string,
  options: ScreenOptions,
): Promise<CommandOutcome> {
  const job = await readJob(jobPath);
  const { writeRemedied } = options;
  const target =
    writeRemedied === undefined ? null : await remediedTarget(writeRemedied, jobPath, job);
  const result = screen(job, { remedies: options.remedies ?? true });
  const text = summary(result);
  const directory = options.out ?? (await reportDirectory(jobPath));
  const staged = target && (await stageRemedied(result, target));
  const files = await write(result, text, directory, options.charts).catch(async (error) => {
    await staged?.discard();
    throw error;
  });
  await staged?.place();
  const remediedLine = target === null ? [] : [`The job with its remedies in: ${target.path}`];
  return {
    lines: [text, `Results in ${directory}: ${filesText(files)}`, ...remediedLine],
    warnings: job.warnings,
    fails: result.runs.some(runFails),
  };
}

async function stageRemedied(result: Result, target: RemediedTarget): Promise<StagedFile> {
  const text = await readFile(target.jobFile, 'utf8');
  return stageFile(target.path, remediedJobYaml(result, text, target.relocate));
}

async function write(
  result: Result,
  text: string,
  directory: string,
  charts: ChartChoice,
): Promise<string[]> {
  const files: OutputFile[] = [
    { name: 'summary.txt', content: text },
    { name: 'results.csv', content: resultsCsv(result) },
    { name: 'checks.csv', content: checksCsv(result) },
    { name: 'cycles.csv', content: cyclesCsv(result) },
    { name: 'record.csv', content: recordCsv(result.job) },
    ...present('remedies.csv', remediesCsv(result)),
    ...present('years.csv', yearsCsv(result)),
    ...present('warming.csv', warmingCsv(result)),
    ...(await drawCharts(result, charts)),
  ];
  await writeResults(directory, files, manifestJson(result, files));
  return [...files.map((file) => file.name), MANIFEST];
}

/** A file that some jobs have no use for. */
function present(name: string, content: string | null): OutputFile[] {
  return content === null ? [] : [{ name, content }];
}

/** The canvas is loaded only where charts are wanted. */
async function drawCharts(result: Result, choice: ChartChoice): Promise<OutputFile[]> {
  if (choice === 'none') return [];
  const { chooseCharts } = await import('../output/charts/choose-charts.ts');
  const { renderPngs } = await import('../output/png.ts');
  return renderPngs(chooseCharts(result, choice));
}
