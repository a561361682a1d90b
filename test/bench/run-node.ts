import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/** The repository's root, from where the bundled bench stands. */
const ROOT = fileURLToPath(new URL('..', import.meta.url));

/**
 * Runs Node to its end in a process of its own, from the repository's root.
 *
 * @throws Error with what it said, where it ends with anything but 0
 */
export function runNode(...args: string[]): void {
  const { status, stderr } = spawnSync(process.execPath, args, { cwd: ROOT, encoding: 'utf8' });
  if (status !== 0) throw new Error(stderr);
}

/** Runs the bundled program to its end. */
export function runProgram(...args: string[]): void {
  runNode('dist/cli.js', ...args);
}
