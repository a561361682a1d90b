const HOUR = 3_600_000;

/** Steps that differ by less than this share are alike: loggers drift. */
const ALIKE = 0.1;
/** So many steps alike, one after another, are the record's step from there on; fewer are gaps. */
const ESTABLISHED = 6;

/** The steps of a record from sample to sample. */
export interface Steps {
  /** Median step [h]. */
  readonly stepHours: number;
  /** The step in force at each sample [h]; `null` where it is the median throughout. */
  readonly sampleHours: Float64Array | null;
  /** Where the step changes: the first sample of the new one, and both [h]. */
  readonly changes: readonly StepChange[];
}

export interface StepChange {
  readonly at: number;
  readonly from: number;
  readonly to: number;
}

/**
 * Finds the step of a record, and where it changes for good: six steps or more alike are a new one, fewer leave the
 * old one in force.
 *
 * @param times time of each sample [ms], rising; at least two
 */
export function findSteps(times: Float64Array): Steps {
  const stepHours = medianStep(times) / HOUR;
  const changes = stepChanges(times);
  if (changes.length === 0) return { stepHours, sampleHours: null, changes };
  const sampleHours = new Float64Array(times.length).fill(changes[0].from);
  for (const { at, to } of changes) sampleHours.fill(to, at);
  return { stepHours, sampleHours, changes };
}

function stepChanges(times: Float64Array): StepChange[] {
  const changes: StepChange[] = [];
  let step = medianStep(times.subarray(0, 4 * ESTABLISHED + 1));
  for (let i = 1; i < times.length; i++) {
    const next = times[i] - times[i - 1];
    if (alike(next, step) || !isEstablished(times, i)) continue;
    changes.push({ at: i, from: step / HOUR, to: next / HOUR });
    step = next;
  }
  return changes;
}

function isEstablished(times: Float64Array, from: number): boolean {
  if (from + ESTABLISHED > times.length) return false;
  const step = times[from] - times[from - 1];
  for (let i = from + 1; i < from + ESTABLISHED; i++) {
    if (!alike(times[i] - times[i - 1], step)) return false;
  }
  return true;
}

function alike(step: number, other: number): boolean {
  return Math.abs(step - other) <= ALIKE * other;
}

/** The lower median; steps are few different ones mostly, so they are counted and not sorted. */
function medianStep(times: Float64Array): number {
  const common = usualStep(times);
  if (common !== null) return common;
  const counts = new Map<number, number>();
  for (let i = 1; i < times.length; i++) {
    const step = times[i] - times[i - 1];
    counts.set(step, (counts.get(step) ?? 0) + 1);
  }
  let before = 0;
  const half = (times.length - 2) >> 1;
  const steps = [...counts].sort(([a], [b]) => a - b);
  for (const [step, count] of steps) {
    before += count;
    if (before > half) return step;
  }
  return Number.NaN;
}

/** The step that more than half of all are, and so the median; `null` where none is. Nearly every record has one. */
function usualStep(times: Float64Array): number | null {
  const step = times[1] - times[0];
  let count = 0;
  for (let i = 1; i < times.length; i++) if (times[i] - times[i - 1] === step) count++;
  return 2 * count > times.length - 1 ? step : null;
}
