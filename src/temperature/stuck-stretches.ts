/** Samples from the first to the last of a stretch. */
export interface Stretch {
  readonly first: number;
  readonly last: number;
}

/** A slow channel, such as a thick deck's, may stand still for days: stuck is so many times its own usual. */
const TIMES_USUAL = 5;
/** What this share of a channel's unchanged stretches lasts at most is usual for it. */
const USUAL_SHARE = 0.9;

/**
 * Stretches over which a channel does not change at all, and lasts longer than it usually does so: five times what
 * nine in ten of its own unchanged stretches last.
 *
 * @param values the channel, `NaN` where missing; what is missing breaks no stretch
 * @param times time of each sample [ms], rising
 * @param longerThan only longer stretches count [ms]
 */
export function stuckStretches(
  values: Float64Array,
  times: Float64Array,
  longerThan: number,
): Stretch[] {
  const long: Stretch[] = [];
  throughStretches(values, (first, last) => {
    if (times[last] - times[first] > longerThan) long.push({ first, last });
  });
  if (long.length === 0) return long;
  const counts = new Map<number, number>();
  throughStretches(values, (first, last) => {
    const lasts = times[last] - times[first];
    counts.set(lasts, (counts.get(lasts) ?? 0) + 1);
  });
  const usual = usualOf(counts);
  return long.filter(({ first, last }) => times[last] - times[first] > TIMES_USUAL * usual);
}

function throughStretches(values: Float64Array, take: (first: number, last: number) => void): void {
  let first = -1;
  let last = -1;
  for (let i = 0; i < values.length; i++) {
    if (Number.isNaN(values[i])) continue;
    if (first < 0) first = i;
    else if (values[i] !== values[first]) {
      take(first, last);
      first = i;
    }
    last = i;
  }
  if (first >= 0) take(first, last);
}

/** How long nine in ten stretches last at most, from how many there are of each length. */
function usualOf(counts: ReadonlyMap<number, number>): number {
  const lengths = [...counts].sort(([a], [b]) => a - b);
  const all = lengths.reduce((sum, [, count]) => sum + count, 0);
  let before = 0;
  for (const [length, count] of lengths) {
    before += count;
    if (before >= USUAL_SHARE * all) return length;
  }
  return 0;
}
