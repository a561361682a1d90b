import { createHash } from 'node:crypto';
import { readdir, readFile, rename, rm } from 'node:fs/promises';
import { basename, join } from 'node:path';

/** A file under a temporary name: one that is to take its place, or an old one that was set aside. */
interface Leftover {
  readonly name: string;
  /** Names the run that wrote it: eight hexadecimal digits. */
  readonly tag: string;
  readonly kind: 'new' | 'old';
}

/** The temporary name. */
export function leftoverName({ name, tag, kind }: Leftover): string {
  return `${name}.daystrain-${tag}.${kind}.tmp`;
}

/**
 * Puts a folder right in which a run was killed while it replaced files. With a manifest the result is whole and the
 * leftovers go; without one, old files that were set aside come back and new ones go.
 *
 * @param manifest the manifest's name
 * @throws where the folder cannot be read or changed
 */
export async function mendFolder(directory: string, manifest: string): Promise<void> {
  const names = await readdir(directory).catch(() => []);
  const leftovers = names.map(parse).filter((leftover) => leftover !== null);
  for (const tag of new Set(leftovers.map((leftover) => leftover.tag))) {
    const own = leftovers.filter((leftover) => leftover.tag === tag);
    if (!(await readdir(directory)).includes(manifest)) await rollBack(directory, manifest, own);
    for (const leftover of own) await rm(join(directory, leftoverName(leftover)), { force: true });
  }
}

/**
 * Removes the run's new files that replaced none, then puts the old ones back, the manifest last. The new manifest goes
 * in between, so that a second killing leaves no doubt which of the two was done.
 */
async function rollBack(
  directory: string,
  manifest: string,
  own: readonly Leftover[],
): Promise<void> {
  const path = (leftover: Leftover) => join(directory, leftoverName(leftover));
  const newManifest = own.find(({ name, kind }) => name === manifest && kind === 'new');
  if (newManifest !== undefined) {
    const text = await readFile(path(newManifest), 'utf8');
    for (const { name, sha256 } of listed(text)) {
      if (basename(name) !== name || own.some((leftover) => leftover.name === name)) continue;
      // Only what the run itself wrote: somebody may have put another file there since.
      const content = await readFile(join(directory, name)).catch(() => null);
      if (content !== null && hash(content) === sha256) await rm(join(directory, name));
    }
    await rm(path(newManifest));
  }
  const old = own.filter(({ kind }) => kind === 'old');
  const manifestLast = [...old].sort((a, b) => +(a.name === manifest) - +(b.name === manifest));
  for (const leftover of manifestLast) await rename(path(leftover), join(directory, leftover.name));
}

function parse(fileName: string): Leftover | null {
  const match = /^(.+)\.daystrain-([0-9a-f]{8})\.(new|old)\.tmp$/.exec(fileName);
  return match && { name: match[1], tag: match[2], kind: match[3] as 'new' | 'old' };
}

/** The files that a manifest lists; none where it was cut off before it was whole. */
function listed(text: string): { name: string; sha256: string }[] {
  try {
    return JSON.parse(text).files;
  } catch {
    return [];
  }
}

function hash(content: Uint8Array): string {
  return createHash('sha256').update(content).digest('hex');
}
