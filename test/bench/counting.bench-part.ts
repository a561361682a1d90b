import { createRainflow } from '../../src/counting/rainflow.ts';
import { createDamageTables } from '../../src/damage/damage-table.ts';
import { minerDamage } from '../../src/damage/miner.ts';
import { standardCurve } from '../../src/damage/standard-shapes.ts';
import { type BenchRow, inTurns } from './in-turns.ts';
import { seeded } from './seeded.ts';

const SAMPLES = 10_000_000;

/** Counting, and counting with damage, of ten million samples against summing the same array. */
export function countingBench(): BenchRow[] {
  const stress = longRecord();
  const curve = standardCurve({ id: 'bench', of: 'stress' }, 'EN 1993-1-9 direct 80');
  if (typeof curve === 'string') throw new Error(curve);
  const table = createDamageTables().of(curve, 1.35, null);
  const counter = createRainflow();
  const count = () => {
    counter.reset();
    counter.push(stress, 0, 1, stress.length);
    return counter.finish('repeat');
  };
  const damage = () => minerDamage(count(), { table, scale: 1, gate: 0 });
  const { sum, cycles } = damage();
  if (!(sum !== null && sum > 0 && cycles > SAMPLES / 100)) throw new Error('nothing was counted');
  return inTurns(
    () => sumOf(stress),
    [
      { name: `rainflow count of 10 million samples (${cycles} cycles)`, goal: 7, run: count },
      { name: 'rainflow count and damage of 10 million samples', goal: 7, run: damage },
    ],
  );
}

/** Stress of a held steel member over many years of season, day and weather, each unlike the others [MPa]. */
function longRecord(): Float64Array {
  const random = seeded(11);
  let weather = 0;
  return new Float64Array(SAMPLES).map((_, hour) => {
    weather = 0.95 * weather + 3 * (random() - 0.5);
    const season = -12 * Math.cos((2 * Math.PI * hour) / 8766);
    const day = -9 * Math.cos((2 * Math.PI * hour) / 24);
    return -2.5 * (season + day + weather);
  });
}

/** The least that reading every sample costs. */
function sumOf(values: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i];
  if (!Number.isFinite(sum)) throw new Error('a sample is not a number');
  return sum;
}
