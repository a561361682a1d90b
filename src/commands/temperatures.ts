import { readZonesJob } from '../input/zones-job.ts';
import type { ZonesJob } from '../model.ts';
import { fileStems } from '../output/file-stems.ts';
import { zonesManifest } from '../output/manifest-json.ts';
import { recordCsv } from '../output/record-csv.ts';
import { temperaturesText } from '../output/temperatures-text.ts';
import { MANIFEST, type OutputFile } from '../output/write-files.ts';
import { daysCsv, temperaturesCsv } from '../output/zones-csv.ts';
import { type ZoneFacts, zoneFacts } from '../verdict/zone-facts.ts';
import { filesText } from './files-text.ts';
import { reportDirectory } from './report-directory.ts';
import type { CommandOutcome } from './screen.ts';
import { writeResults } from './write-results.ts';

export interface TemperaturesOptions {
  /** Folder for the results; by default one under `reports/` with the job's name and `-temperatures`. */
  readonly out?: string;
  readonly charts: 'all' | 'none';
}

/**
 * `daystrain temperatures`: shows the zones of a job alone, with tables of every sample and day, a summary, charts and
 * manifest. The job needs a record and zones; the rest may still be missing.
 *
 * @param jobPath the job file, or a folder that holds job.yaml
 * @throws InputError with every issue of record and zones, or where the results cannot be written
 */
export async function temperaturesCommand(
  jobPath: string,
  options: TemperaturesOptions,
): Promise<CommandOutcome> {
  const job = await readZonesJob(jobPath);
  const facts = job.zones
    .filter(({ constant }) => !constant)
    .map((zone) => zoneFacts(zone, job.axis, job.represents));
  const text = temperaturesText(job, facts);
  const directory = options.out ?? `${await reportDirectory(jobPath)}-temperatures`;
  const files: OutputFile[] = [
    { name: 'summary.txt', content: text },
    { name: 'temperatures.csv', content: temperaturesCsv(job) },
    { name: 'days.csv', content: daysCsv(facts, job.units) },
    { name: 'record.csv', content: recordCsv(job) },
    ...(options.charts === 'none' ? [] : await drawCharts(job, facts)),
  ];
  await writeResults(directory, files, zonesManifest(job, files));
  const names = [...files.map((file) => file.name), MANIFEST];
  return {
    lines: [text, `Results in ${directory}: ${filesText(names)}`],
    warnings: job.warnings,
    fails: false,
  };
}

/** The canvas is loaded only where charts are wanted. */
async function drawCharts(job: ZonesJob, facts: readonly ZoneFacts[]): Promise<OutputFile[]> {
  const { zoneChart } = await import('../output/charts/zone-chart.ts');
  const { daysChart } = await import('../output/charts/days-chart.ts');
  const { renderPngs } = await import('../output/png.ts');
  const stems = fileStems(facts.map(({ zone }) => zone.name));
  return renderPngs(
    facts.flatMap((one, z) => [
      zoneChart(one, job, `${stems[z]}-record`),
      daysChart(one, job, `${stems[z]}-days`),
    ]),
  );
}
