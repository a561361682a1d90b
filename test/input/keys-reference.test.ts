import { expect, it } from 'vitest';
import { noFindings } from '../../src/input/findings.ts';
import { KEY_TABLES, type Key } from '../../src/input/keys.ts';
import { keysReference } from '../../src/input/keys-reference.ts';
import { readValue } from '../../src/input/read-value.ts';
import { readYaml } from '../../src/input/yaml.ts';

const ALL: readonly [string, Key][] = KEY_TABLES.flatMap(({ title, keys }) =>
  Object.entries(keys).map(([name, key]): [string, Key] => [`${title}: ${name}`, key]),
);

it.each(ALL)('%s reads its own example and default', (_, key) => {
  for (const text of [key.example, key.default].filter((given) => given !== undefined)) {
    const findings = noFindings();
    const map = readYaml(`value: ${text}`, 'job.yaml', findings);
    const source = map?.entries.get('value')?.value;
    expect(source).toBeDefined();
    if (source !== undefined) expect(readValue(key, source)).toHaveProperty('value');
  }
});

it('lists every key', () => {
  const lines = keysReference().split('\n');
  for (const [path] of ALL) {
    const name = path.slice(path.lastIndexOf(' ') + 1);
    expect(lines.some((line) => line.startsWith(`| \`${name}\` |`))).toBe(true);
  }
});
