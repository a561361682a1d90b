import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { inventedWeather } from '../../data/invented-weather.ts';
import { PLACES } from '../../data/places.ts';
import { recordText } from '../../data/record-text.ts';
import { seededRandom } from '../../data/seeded-random.ts';

/** Largest less smallest value of each day. */
function swings(values: readonly number[]): number[] {
  const days = Array.from({ length: values.length / 24 }, (_, d) =>
    values.slice(24 * d, 24 * d + 24),
  );
  return days.map((day) => Math.max(...day) - Math.min(...day)).sort((a, b) => a - b);
}

describe('the invented records', () => {
  it.each(PLACES)(
    '$folder: the committed file is what the generator makes',
    ({ folder, place, form }) => {
      const committed = readFileSync(`examples/${folder}/record.csv`, 'utf8');
      expect(recordText(inventedWeather(place), form) === committed).toBe(true);
    },
  );

  it.each(PLACES)('$folder: every channel spans the range that the place states', ({ place }) => {
    const { channels, times } = inventedWeather(place);
    const ranges = [
      { name: 'air', range: place.air },
      ...place.sides,
      ...(place.structure === null ? [] : [place.structure]),
    ];
    expect([...channels.keys()]).toEqual(ranges.map(({ name }) => name));
    for (const { name, range } of ranges) {
      const values = channels.get(name)!;
      expect(values).toHaveLength(times.length);
      expect(Math.min(...values)).toBeCloseTo(range[0], 2);
      expect(Math.max(...values)).toBeCloseTo(range[1], 2);
    }
  });

  it('Skerry Landing: the south rail swings by 29 K on the middle day and 52 K on the widest', () => {
    const rail = swings(inventedWeather(PLACES[0].place).channels.get('rail_south')!);
    expect(rail).toHaveLength(365);
    expect(Math.round(rail[182])).toBe(29);
    expect(Math.round(rail[364])).toBe(52);
  });

  // POSIX drand48; the figures printed by the GNU C library after srand48(0) and srand48(303)
  it.each([
    [0, [0.17082803610628972, 0.7499019804849638, 0.09637165562356742]],
    [303, [0.023927561779604645, 0.2408126463155611, 0.8453771062578532]],
  ] as const)('the random numbers of seed %d are those of drand48', (seed, expected) => {
    const random = seededRandom(seed);
    for (const value of expected) expect(random()).toBe(value);
  });
});
