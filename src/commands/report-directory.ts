import { stat } from 'node:fs/promises';
import { basename, dirname, join, resolve } from 'node:path';

/**
 * Where a job's results go unless the user names a folder: `reports/` and the folder's name, with the job file's name
 * where that is not job.yaml.
 *
 * @param jobPath the job file, or a folder that holds job.yaml
 */
export async function reportDirectory(jobPath: string): Promise<string> {
  const path = resolve(jobPath);
  if ((await stat(path)).isDirectory()) return join('reports', basename(path));
  const folder = basename(dirname(path));
  const name = basename(path);
  const own = `${folder}-${name.replace(/\.[^.]*$/, '')}`;
  return join('reports', name === 'job.yaml' ? folder : own);
}
