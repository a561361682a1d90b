import { type OutputFile, writeFiles } from '../output/write-files.ts';

/** The user stopped the command before its results stood. */
export class Interrupted extends Error {
  constructor() {
    super('Interrupted. Nothing was written, and earlier results are as they were.');
    this.name = 'Interrupted';
  }
}

/**
 * Writes a command's results, all or none. An interrupt from the keyboard, or a polite end from outside, that arrives
 * meanwhile undoes the writing.
 *
 * @throws Interrupted where that happened
 * @throws InputError where the folder cannot be written
 */
export async function writeResults(
  directory: string,
  files: readonly OutputFile[],
  manifest: string,
): Promise<void> {
  const controller = new AbortController();
  const stop = () => controller.abort(new Interrupted());
  const signals = ['SIGINT', 'SIGTERM'] as const;
  for (const signal of signals) process.on(signal, stop);
  try {
    await writeFiles(directory, files, manifest, controller.signal);
  } finally {
    for (const signal of signals) process.off(signal, stop);
  }
}
