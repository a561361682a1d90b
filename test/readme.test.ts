import { existsSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { expect, it } from 'vitest';
import { keysReference } from '../src/input/keys-reference.ts';

const README = fileURLToPath(new URL('../README.md', import.meta.url));
const text = readFileSync(README, 'utf8');

it('holds the reference of keys as the schema has it (npx vitest run test/readme.test.ts -u)', async () => {
  const [before, after] = ['<!-- keys -->\n', '<!-- /keys -->'];
  const start = text.indexOf(before) + before.length;
  const end = text.indexOf(after);
  expect(start).toBeLessThanOrEqual(end);
  const current = `${text.slice(0, start)}\n${keysReference()}\n${text.slice(end)}`;
  await expect(current).toMatchFileSnapshot(README);
});

it('shows pictures and names files that are there', () => {
  const links = [...text.matchAll(/\]\(([^)#]+)\)/g)].map(([, path]) => path);
  expect(links.length).toBeGreaterThan(0);
  const missing = links.filter((path) => {
    return !path.startsWith('http') && !existsSync(new URL(`../${path}`, import.meta.url));
  });
  expect(missing).toEqual([]);
});
