/**
 * Where a series turns: the index of its first sample, of each local largest and smallest value, and of its last
 * sample. Of equal neighbours the first counts.
 *
 * @param values any series of at least one value
 * @returns rising indices; one where the series is constant
 */
export function turningPoints(values: Float64Array): Int32Array {
  const turns = new Int32Array(values.length);
  let count = 1;
  for (let i = 1; i < values.length; i++) {
    const here = values[i];
    const last = values[turns[count - 1]];
    if (here === last) continue;
    const goesOn = count > 1 && here > last === last > values[turns[count - 2]];
    if (goesOn) turns[count - 1] = i;
    else turns[count++] = i;
  }
  return turns.slice(0, count);
}
