import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { seededRandom } from '../../data/seeded-random.ts';
import { goodJobs, recordJobs } from './good-jobs.ts';
import { type Judgement, judge } from './judge.ts';
import { mutate, pick, type Texts } from './mutate.ts';

/**
 * Changes good jobs at random and screens them: `fuzz [--seed 1] [--count 2000] [--only 17]`. Each mutant must be
 * screened, or refused with messages that name a place. Tells every one that is not, and exits with 1 if there is any.
 */
const { values } = parseArgs({
  options: {
    seed: { type: 'string', default: '1' },
    count: { type: 'string', default: '2000' },
    only: { type: 'string' },
    /** Tells which mutant is at work, for where one never ends. */
    watch: { type: 'boolean', default: false },
  },
});
const seed = Number(values.seed);
const whole = goodJobs(process.cwd());
const records = recordJobs(process.cwd());
const jobs = [...whole, ...records];
const root = mkdtempSync(join(tmpdir(), 'fuzz-'));
const ends = { screened: 0, refused: 0, fault: 0 };
/** How each good job ended. */
const goods: Judgement[] = [];
/** Longer than this is a hang in the making [ms]. */
const SLOW = 5000;

/** A mutant by its number, the same at every run. */
function mutant(number: number) {
  const random = seededRandom(seed * 1_000_003 + number);
  for (let i = 0; i < 8; i++) random();
  const texts = pick(random() < 0.7 ? whole : records, random);
  return { texts, job: jobs.indexOf(texts), ...mutate(texts, random) };
}

async function run(number: number): Promise<void> {
  const { texts, job, file, text, how } = mutant(number);
  const folder = join(root, `job-${job}`);
  const files: Texts = { ...texts, [file]: text };
  mkdirSync(folder, { recursive: true });
  for (const [name, content] of Object.entries(files)) writeFileSync(join(folder, name), content);
  // Said before, so that a mutant that never ends is known.
  if (values.only !== undefined) console.log(`${how} in ${file}:\n${text}\n`);
  const started = performance.now();
  const judged = await judge(folder, join(root, `out-${job}`));
  const { text: said } = judged;
  const why = judged.end === 'fault' ? judged.why : unexplained(judged, goods[job]);
  const end = why === '' ? judged.end : 'fault';
  const took = performance.now() - started;
  ends[end]++;
  if (values.only !== undefined) console.log(said);
  if (took > SLOW) console.error(`Mutant ${number} took ${Math.round(took)} ms: ${how} in ${file}`);
  if (end === 'fault') console.log(`Mutant ${number}, ${how} in ${file} of job ${job}: ${why}`);
}

/** The good jobs themselves must be screened. */
async function judgeGood(job: number): Promise<Judgement> {
  const folder = join(root, `good-${job}`);
  mkdirSync(folder);
  for (const [name, text] of Object.entries(jobs[job])) writeFileSync(join(folder, name), text);
  const judged = await judge(folder, join(root, `good-out-${job}`));
  if (judged.end === 'screened') return judged;
  throw new Error(`Job ${job} is not good: ${judged.why}${judged.text}`);
}

/** Blank, or what is wrong: the same was read, and other results came of it. */
function unexplained(mutated: Judgement, good: Judgement): string {
  if (mutated.end !== 'screened' || mutated.read !== good.read) return '';
  return mutated.text === good.text ? '' : 'other results of the same job';
}

for (const job of jobs.keys()) goods.push(await judgeGood(job));
for (let number = 0; number < Number(values.count); number++) {
  if (values.only !== undefined && number !== Number(values.only)) continue;
  if (values.watch) console.log(number);
  await run(number);
}
rmSync(root, { recursive: true });
console.log(`${ends.screened} screened, ${ends.refused} refused, ${ends.fault} faults.`);
process.exitCode = ends.fault === 0 ? 0 : 1;
