import type { Connection, Result } from '../../src/model.ts';
import { remediedJobYaml } from '../../src/output/remedied-job/remedied-job-yaml.ts';
import { screen } from '../../src/verdict/screen.ts';
import { jobOf } from './temporary-job.ts';

/** Utilisation of one check as a remedy promises it, and in the job with the remedies in. */
export interface Kept {
  /** Connection, check and status. */
  readonly name: string;
  readonly promised: number | null;
  /** `undefined` where there is no such check, or of another status. */
  readonly kept: number | null | undefined;
}

/** What each check of each remedied run comes to once the job with the remedies in is written, read and screened. */
export async function keptPromises(
  result: Result,
  files: Readonly<Record<string, string>>,
): Promise<Kept[]> {
  const text = remediedJobYaml(result, files['job.yaml'], (name) => name);
  const again = screen(await jobOf({ ...files, 'job.yaml': text }), { remedies: false });
  const kept = new Map(again.runs.flatMap(({ connections }) => connections.flatMap(usesOf)));
  return result.runs.flatMap(({ remedy }) =>
    remedy === null || remedy.kind === 'rework'
      ? []
      : remedy.pieces
          .flatMap(({ connections }) => connections.flatMap(usesOf))
          .map(([name, promised]) => ({ name, promised, kept: kept.get(name) })),
  );
}

function usesOf({ run, number, checks }: Connection): [string, number | null][] {
  return checks.map(({ check, status, utilisation }) => [
    `${run}/${number} ${check} ${status}`,
    utilisation,
  ]);
}
