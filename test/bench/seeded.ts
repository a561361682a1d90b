/** A seeded source of numbers in [0, 1): a linear congruential generator (constants of Numerical Recipes). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32;
  };
}

/** A year of hourly member temperatures with season, day and weather [°C]. */
export function noisyYear(seed: number): Float64Array {
  const random = seeded(seed);
  let weather = 0;
  return Float64Array.from({ length: 8760 }, (_, hour) => {
    weather = 0.9 * weather + 6 * (random() - 0.5);
    const season = -12 * Math.cos((2 * Math.PI * hour) / 8760);
    const day = -9 * Math.cos((2 * Math.PI * hour) / 24);
    return 12 + season + day + weather;
  });
}
