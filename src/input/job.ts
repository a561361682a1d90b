import { stat } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { InputError, type Issue, wordIssue } from '../issue.ts';
import type { Job } from '../model.ts';
import { readCurveRows } from './curve-rows.ts';
import { readCurves } from './curves.ts';
import { doubtTogether } from './doubts.ts';
import { readExtremes } from './extremes.ts';
import { readFasteners } from './fasteners.ts';
import { type Files, filesOf } from './files.ts';
import { type Findings, noFindings, report } from './findings.ts';
import { JOB_KEYS } from './keys.ts';
import { readMembers } from './members.ts';
import { readKeys } from './read-keys.ts';
import { keptOf, readRecordBasis } from './record-basis.ts';
import { readRuns } from './runs.ts';
import { readCounting, readLimits, readRemedies, readWarming } from './settings.ts';
import { emptyMap, givenValue, placeOf, type Source, type SourceMap } from './source.ts';
import { readTable } from './table.ts';
import { readYaml } from './yaml.ts';
import { readZones } from './zones.ts';

/**
 * Reads a job and all the files that it names.
 *
 * @param path the job file, or a folder that holds job.yaml
 * @returns the job in base units
 * @throws InputError with every issue of the job and its files
 */
export function readJob(path: string): Promise<Job> {
  return readJobWith(path, readWhole);
}

/**
 * Opens a job file and has it read.
 *
 * @param path the job file, or a folder that holds job.yaml
 * @param read makes something of its mapping; `null` with a fault, which it reports
 * @throws InputError with every issue of the job and its files
 */
export async function readJobWith<T>(
  path: string,
  read: (map: SourceMap, files: Files, findings: Findings) => Promise<T | null>,
): Promise<T> {
  const found = await stat(path).catch(() => null);
  const jobFile = found?.isDirectory() ? join(path, 'job.yaml') : path;
  const name = basename(jobFile);
  const files = filesOf(dirname(jobFile));
  const findings = noFindings();
  const text = await files.read(name, { file: jobFile }, findings);
  const map = text === null ? null : readYaml(text, name, findings);
  const job = map === null ? null : await read(map, files, findings);
  if (job !== null && findings.issues.length === 0) return job;
  throw new InputError(inFileOrder(findings.issues, files));
}

/** The job from its mapping; `null` with a fault, which is reported. */
async function readWhole(map: SourceMap, files: Files, findings: Findings): Promise<Job | null> {
  const { complete, values } = readKeys(JOB_KEYS, map, '', findings);
  const part = (key: 'zones' | 'limits' | 'counting' | 'remedies') =>
    values[key] ?? emptyMap(map.place, key);
  const table = async (source: Source | null | undefined) =>
    source ? readTable(source, files, findings) : [];

  const basis = values.record ? await readRecordBasis(values.record, files, findings) : null;
  const zones = readZones(part('zones'), basis, findings);
  const limits = readLimits(part('limits'), findings);
  const counting = readCounting(part('counting'), findings);
  const remedies = readRemedies(part('remedies'), findings);
  const warming = readWarming(values.warming ?? null, findings);

  const curveRows = await readCurveRows(values.curves ?? null, files, findings);
  const curves = await readCurves(curveRows, findings);
  const members = readMembers(await table(values.members), curves, findings);
  const fasteners = readFasteners(await table(values.fasteners), curves, findings);

  const clock = basis && { axis: basis.axis, offset: basis.record.offset, zone: basis.record.zone };
  const parts = { members, fasteners, zones, clock };
  const runs = readRuns(await table(values.runs), parts, findings);
  if (runs.length === 0 && findings.issues.length === 0) {
    report(findings, placeOf(map, 'runs'), { found: 'none', expected: 'at least one run' });
  }
  const extremes = readExtremes(await table(values.extremes), zones, runs, findings);

  if (!complete || basis === null || limits === null) return null;
  if (counting === null || remedies === null) return null;
  doubtTogether([...zones.items.values()], runs, findings);
  return {
    title: values.title,
    units: values.units,
    ...keptOf(basis),
    zones: [...zones.items.values()],
    warming,
    extremes,
    limits,
    counting,
    remedies,
    unevenFriction: givenValue(part('remedies'), 'grip_spread') !== undefined,
    curves: [...curves.items.values()],
    runs,
    inputs: files.inputs,
    defaults: findings.defaults,
    derived: findings.derived,
    warnings: findings.warnings,
  };
}

/** Issues, each once, by file in the order that the files were read, and by line and column within each. */
function inFileOrder(issues: readonly Issue[], { inputs }: Files): Issue[] {
  const order = new Map(inputs.map(({ name }, i) => [name, i]));
  const rank = ({ place }: Issue) => order.get(place.file) ?? -1;
  // A column's header is one fault, however many rows there are below it.
  const distinct = new Map(issues.map((issue) => [wordIssue(issue), issue]));
  return [...distinct.values()].sort(
    (a, b) =>
      rank(a) - rank(b) ||
      (a.place.line ?? 0) - (b.place.line ?? 0) ||
      (a.place.column ?? 0) - (b.place.column ?? 0),
  );
}
