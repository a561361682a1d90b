import { KEY_TABLES, type Key } from './keys.ts';

/** The reference of all keys as Markdown, one table for each part of the job. */
export function keysReference(): string {
  return KEY_TABLES.map(({ title, keys }) => {
    const rows = Object.entries(keys).map(([name, key]) => row(name, key));
    return [`### ${title}`, '', HEAD, RULE, ...rows, ''].join('\n');
  }).join('\n');
}

const HEAD = '| key | value | needed | example | meaning |';
const RULE = '| --- | --- | --- | --- | --- |';

function row(name: string, key: Key): string {
  const cells = [`\`${name}\``, choicesOf(key), needOf(key), `\`${key.example}\``, key.meaning];
  return `| ${cells.map((cell) => cell.replaceAll('|', '\\|')).join(' | ')} |`;
}

function choicesOf(key: Key): string {
  return key.choices === undefined
    ? key.kind
    : key.choices.map((word) => `\`${word}\``).join(' or ');
}

function needOf(key: Key): string {
  if (key.required) return 'required';
  if (key.default !== undefined) return `\`${key.default}\` where not given`;
  return key.needs ?? 'optional';
}
