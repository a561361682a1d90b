/** Numbers even over [0, 1) that a seed fixes: a linear congruential generator of 48 bits, as POSIX `drand48`. */
export function seededRandom(seed: number): () => number {
  let state = (BigInt(seed) << 16n) + 0x330en;
  return () => {
    state = (state * 0x5deece66dn + 0xbn) & 0xffffffffffffn;
    return Number(state) / 2 ** 48;
  };
}

/** Numbers of a normal distribution of mean 0 and deviation 1: the sum of twelve even ones less six. */
export function seededNormal(seed: number): () => number {
  const even = seededRandom(seed);
  return () => {
    let sum = -6;
    for (let i = 0; i < 12; i++) sum += even();
    return sum;
  };
}
