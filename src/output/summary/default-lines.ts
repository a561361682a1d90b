import type { DefaultUsed } from '../../model.ts';
import { bullet } from './text-layout.ts';

/**
 * The values that a job left at their defaults, alike ones together:
 * `runs R1, R2: overhang 0 mm, added_shear 0 N`.
 *
 * @param defaults keys such as `limits.damage` or `runs R1: overhang`
 */
export function defaultLines(defaults: readonly DefaultUsed[]): string[] {
  const owners = new Map<string, Set<string>>();
  for (const { key, value } of defaults) {
    const { list, owner, name } = parts(key);
    const setting = `${list}\n${name} ${value}`;
    owners.set(setting, (owners.get(setting) ?? new Set()).add(owner));
  }
  const settings = new Map<string, string[]>();
  for (const [setting, names] of owners) {
    const [list, text] = setting.split('\n');
    const group = `${list} ${[...names].join(', ')}`.trim();
    settings.set(group, [...(settings.get(group) ?? []), text]);
  }
  return [...settings].map(([group, texts]) =>
    bullet(group === '' ? texts.join(', ') : `${group}: ${texts.join(', ')}`),
  );
}

/** `runs R1: overhang` is of the list `runs` and of `R1`; `limits.damage` of `limits`; `units` of neither. */
function parts(key: string): { list: string; owner: string; name: string } {
  const row = /^(\S+) (.+): (\S+)$/.exec(key);
  if (row !== null) return { list: row[1], owner: row[2], name: row[3] };
  const dot = key.lastIndexOf('.');
  return { list: key.slice(0, Math.max(0, dot)), owner: '', name: key.slice(dot + 1) };
}
