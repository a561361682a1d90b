import { STARTER_JOB } from '../output/starter/starter-job.ts';
import { starterRecord } from '../output/starter/starter-record.ts';
import { writeNewFiles } from '../output/write-new-files.ts';
import type { CommandOutcome } from './screen.ts';

/**
 * `daystrain start`: writes a commented job with an invented record into a folder, ready to be screened.
 *
 * @param directory made where it does not exist
 * @throws InputError where one of the files stands there already, or the folder cannot be written
 */
export async function startCommand(directory: string): Promise<CommandOutcome> {
  await writeNewFiles(directory, [
    { name: 'record.csv', content: starterRecord() },
    { name: 'job.yaml', content: STARTER_JOB },
  ]);
  const lines = [
    `In ${directory}: job.yaml, record.csv. All figures are invented.`,
    'Put your own in, then:',
    `  daystrain check ${quoted(directory)}`,
    `  daystrain screen ${quoted(directory)}`,
  ];
  return { lines, warnings: [], fails: false };
}

/** The path as it may be pasted into a shell. */
function quoted(path: string): string {
  return /^[\w./~-]+$/.test(path) ? path : `'${path.replaceAll("'", "'\\''")}'`;
}
