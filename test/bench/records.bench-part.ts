import { spawnSync } from 'node:child_process';
import { closeSync, mkdtempSync, openSync, rmSync, writeFileSync, writeSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { BenchRow } from './in-turns.ts';

/** The repository's root, from where the bundled bench stands. */
const ROOT = fileURLToPath(new URL('..', import.meta.url));

const MINUTE = 60_000;

/** A record of every minute, as the usual ISO form and as a logger of its own mind writes it. */
const FORMS = [
  {
    name: 'ISO times, commas',
    rows: 10_000_000,
    header: 'time,rail [degC],deck [degC]',
    keys: '',
    row: (iso: string, rail: string, deck: string) => `${iso},${rail},${deck}`,
  },
  {
    name: 'day-first times of a named zone, semicolons, decimal commas',
    rows: 2_000_000,
    header: 'time;rail [degC];deck [degC]',
    keys: ', time: { order: day-first, zone: Asia/Tokyo }',
    row: (iso: string, rail: string, deck: string) =>
      `${iso.slice(8, 10)}/${iso.slice(5, 7)}/${iso.slice(0, 4)} ${iso.slice(11)};${rail.replace('.', ',')};${deck.replace('.', ',')}`,
  },
];

/** Reads long records, each in a process of its own, against reading and hashing the bytes of the file. */
export function recordsBench(): BenchRow[] {
  const folder = mkdtempSync(join(tmpdir(), 'daystrain-bench-'));
  try {
    return FORMS.map(({ name, rows, header, keys, row }) => {
      writeRecord(join(folder, 'record.csv'), header, row, rows);
      writeFileSync(join(folder, 'job.yaml'), jobText(keys));
      const bare = inProcess(BARE, folder);
      const read = inProcess(READ, folder);
      if (read.samples !== rows) throw new Error(`${read.samples} rows were read`);
      const speed = (rows / read.milliseconds / 1000).toFixed(2);
      return {
        name: `${rows / 1e6} million rows, ${name}: ${speed} million rows a second, ${read.megabytes} MB at most`,
        ratio: read.milliseconds / bare.milliseconds,
        goal: null,
        milliseconds: read.milliseconds,
      };
    });
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function writeRecord(
  path: string,
  header: string,
  row: (iso: string, rail: string, deck: string) => string,
  rows: number,
): void {
  const file = openSync(path, 'w');
  writeSync(file, `${header}\n`);
  let lines: string[] = [];
  for (let i = 0; i < rows; i++) {
    const iso = new Date(Date.UTC(2011, 0, 1) + i * MINUTE).toISOString().slice(0, 16);
    const day = Math.sin((i / 1440) * 2 * Math.PI);
    // The last figure moves from row to row, as a sensor's does.
    const rail = (15 + 18 * day + (i % 7) / 100).toFixed(2);
    lines.push(row(iso, rail, (12 + 2 * day + (i % 3) / 100).toFixed(2)));
    if (lines.length < 100_000 && i < rows - 1) continue;
    writeSync(file, `${lines.join('\n')}\n`);
    lines = [];
  }
  closeSync(file);
}

function jobText(keys: string): string {
  return `record: { file: record.csv${keys} }
zones: { south: { column: rail } }
members: [{ id: rail, modulus: 70 GPa, expansion: 23e-6 / K, area: 450 mm^2 }]
fasteners: [{ id: bracket, stiffness: 2 kN/mm }]
runs: [{ id: R1, member: rail, zone: south, fastener: bracket, count: 4, spacing: 600 mm, lock_in: 15 degC }]
`;
}

interface Measured {
  readonly milliseconds: number;
  readonly megabytes: number;
  readonly samples: number;
}

/** Reads the file's bytes and hashes them, which every job does. */
const BARE = `
  const { createReadStream } = await import('node:fs');
  const { createHash } = await import('node:crypto');
  const hash = createHash('sha256');
  for await (const bytes of createReadStream(folder + '/record.csv', { highWaterMark: 1 << 20 })) hash.update(bytes);
  const samples = 0;`;

const READ = `
  const { readJob } = await import('./dist/index.js');
  const samples = (await readJob(folder)).axis.times.length;`;

function inProcess(work: string, folder: string): Measured {
  const code = `const folder = process.argv[1]; const start = performance.now(); ${work}
    const milliseconds = performance.now() - start;
    const megabytes = Math.round(process.resourceUsage().maxRSS / 1024);
    console.log(JSON.stringify({ milliseconds, megabytes, samples }));`;
  const args = ['--input-type=module', '-e', code, folder];
  const { status, stdout, stderr } = spawnSync(process.execPath, args, {
    cwd: ROOT,
    encoding: 'utf8',
  });
  if (status !== 0) throw new Error(stderr);
  return JSON.parse(stdout);
}
