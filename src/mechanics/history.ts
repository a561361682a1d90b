import type { Residue } from '../model.ts';
import { bookSlides, type Chain, moveTo, readSlips, resetChain } from './chain.ts';
import { clearEnvelope, cover, createEnvelope, type Envelope, widen } from './envelope.ts';
import { RowSink } from './row-sink.ts';
import { spanForces } from './span-forces.ts';
import { FROM_LOCK_IN, legToExtreme, type StrainPath } from './strain-path.ts';

/** What counts the cycles of a pass. It sees each pass from the second on; the last one stands. */
export interface PassCounter {
  /** A pass begins: forget the one before. */
  begin(): void;
  /**
   * Forces of `rows` moments, row-major: fasteners (n a row) and spans (n − 1 a row) [N], and how far along the record's
   * path each moment lies.
   */
  take(fasteners: Float64Array, spans: Float64Array, rows: number, marks: Float64Array): void;
}

/** What a record does to a run. All forces are a connection's, tension of a span positive [N]. */
export interface History {
  readonly passes: number;
  /** True where slips still changed from pass to pass after the last one. */
  readonly walks: boolean;
  /** How far each slip had moved on in the last pass [mm]. */
  readonly drift: Float64Array;
  /** Σ|Δs| of each joint in the counted pass [mm]. */
  readonly slid: Float64Array;
  /** Largest |s| from lock-in on and at the extremes [mm], with its mark. */
  readonly slipPeak: Float64Array;
  readonly slipPeakMark: Float64Array;
  /** Shears of the counted pass. */
  readonly countedShear: Envelope;
  /** Span forces of the counted pass. */
  readonly countedSpans: Envelope;
  /** Shears from lock-in through all passes and to each extreme. */
  readonly allShear: Envelope;
  /** Span forces from lock-in through all passes and to each extreme. */
  readonly allSpans: Envelope;
  /** Movement of the member's left and right end, rightward positive, over the same [mm]. */
  readonly allEnds: Envelope;
}

export interface HistoryOptions {
  /** Mismatch strain of each extreme. */
  readonly extremes: readonly number[];
  /** `half` counts from the first sample to the last; `repeat` also the way back from the last to the first. */
  readonly residue: Residue;
}

const LEAST_PASSES = 2;
const MOST_PASSES = 50;
/** Slips that change by less from pass to pass have settled [mm]. */
const SETTLED = 1e-6;

/**
 * Takes a run from lock-in through its record, pass after pass, until no slip at the end of a pass differs from the
 * pass before; and, each from a fresh lock-in, straight to every extreme.
 *
 * @param chain the run; left as it is after the last pass
 * @param path way of the mismatch strain
 * @param options extremes and how the record is counted
 * @param counter receives the forces of every pass from the second on
 */
export function followRecord(
  chain: Chain,
  path: StrainPath,
  options: HistoryOptions,
  counter: PassCounter,
): History {
  const follower = new Follower(chain, path, counter);
  for (const [k, strain] of options.extremes.entries()) follower.goToExtreme(strain, k);
  follower.firstPass();
  const before = new Float64Array(chain.count);
  const after = new Float64Array(chain.count);
  let passes = 1;
  let moved = Number.POSITIVE_INFINITY;
  while (passes < LEAST_PASSES || (moved > SETTLED && passes < MOST_PASSES)) {
    readSlips(chain, before);
    follower.nextPass(options.residue);
    readSlips(chain, after);
    moved = after.reduce((most, slip, i) => Math.max(most, Math.abs(slip - before[i])), 0);
    passes++;
  }
  return {
    ...follower.history(),
    passes,
    walks: moved > SETTLED,
    drift: after.map((slip, i) => slip - before[i]),
  };
}

/**
 * Takes a run through its record once more after `followRecord`, for another way of counting.
 *
 * @param chain the run as it is after a pass; left as it is after the next
 * @param path way of the mismatch strain
 * @param residue how the record is counted
 * @param counter receives the forces of the pass
 */
export function passAgain(
  chain: Chain,
  path: StrainPath,
  residue: Residue,
  counter: PassCounter,
): void {
  new Follower(chain, path, counter).nextPass(residue);
}

/** The chain on its way, and the envelopes that its forces fill. */
class Follower {
  private readonly chain: Chain;
  private readonly path: StrainPath;
  private readonly counter: PassCounter;
  private readonly sink: RowSink;
  private readonly spans: Float64Array;
  private readonly countedShear: Envelope;
  private readonly countedSpans: Envelope;
  private readonly allShear: Envelope;
  private readonly allSpans: Envelope;
  private readonly allEnds: Envelope;
  private readonly slidBefore: Float64Array;
  private readonly extremeSlip: Float64Array;
  private readonly extremeSlipMark: Float64Array;
  private counting = false;

  constructor(chain: Chain, path: StrainPath, counter: PassCounter) {
    const { count } = chain;
    this.chain = chain;
    this.path = path;
    this.counter = counter;
    // every joint may turn once on every leg
    const rows = path.turns.length * (count + 1);
    this.sink = new RowSink(count, (sink) => this.takeBlock(sink), rows);
    this.spans = new Float64Array(this.sink.capacity * (count - 1));
    this.countedShear = createEnvelope(count);
    this.countedSpans = createEnvelope(count - 1);
    this.allShear = createEnvelope(count);
    this.allSpans = createEnvelope(count - 1);
    this.allEnds = createEnvelope(2);
    this.slidBefore = new Float64Array(count);
    this.extremeSlip = new Float64Array(count);
    this.extremeSlipMark = new Float64Array(count);
  }

  goToExtreme(strain: number, k: number): void {
    const { chain, extremeSlip, extremeSlipMark } = this;
    resetChain(chain);
    moveTo(chain, strain, this.sink, legToExtreme(k));
    this.closePass();
    for (let i = 0; i < chain.count; i++) {
      if (chain.slipPeak[i] <= extremeSlip[i]) continue;
      extremeSlip[i] = chain.slipPeak[i];
      extremeSlipMark[i] = chain.slipPeakMark[i];
    }
  }

  firstPass(): void {
    resetChain(this.chain);
    this.sink.take(this.chain);
    this.goToFirstSample(FROM_LOCK_IN);
    this.throughRecord();
    this.closePass();
  }

  nextPass(residue: Residue): void {
    this.slidBefore.set(this.chain.slid);
    this.counter.begin();
    clearEnvelope(this.countedShear);
    clearEnvelope(this.countedSpans);
    this.counting = residue === 'repeat';
    this.goToFirstSample(0);
    this.sink.flush();
    if (residue === 'half') {
      bookSlides(this.chain);
      this.slidBefore.set(this.chain.slid);
    }
    this.counting = true;
    // the first sample itself, which the way there left out of the count or did not move to
    this.sink.take(this.chain);
    this.throughRecord();
    this.closePass();
    this.counting = false;
    cover(this.allShear, this.countedShear);
    cover(this.allSpans, this.countedSpans);
  }

  history(): Omit<History, 'passes' | 'walks' | 'drift'> {
    const { chain, extremeSlip } = this;
    const record = (i: number) => chain.slipPeak[i] >= extremeSlip[i];
    return {
      slid: chain.slid.map((slid, i) => slid - this.slidBefore[i]),
      slipPeak: chain.slipPeak.map((slip, i) => (record(i) ? slip : extremeSlip[i])),
      slipPeakMark: chain.slipPeakMark.map((mark, i) =>
        record(i) ? mark : this.extremeSlipMark[i],
      ),
      countedShear: this.countedShear,
      countedSpans: this.countedSpans,
      allShear: this.allShear,
      allSpans: this.allSpans,
      allEnds: this.allEnds,
    };
  }

  private goToFirstSample(leg: number): void {
    const { strain, turns } = this.path;
    moveTo(this.chain, strain[turns[0]], this.sink, leg);
  }

  private throughRecord(): void {
    const { strain, turns } = this.path;
    for (let leg = 1; leg < turns.length; leg++) {
      moveTo(this.chain, strain[turns[leg]], this.sink, leg);
    }
  }

  private closePass(): void {
    this.sink.flush();
    bookSlides(this.chain);
  }

  private takeBlock({ values, ends, marks, rows }: RowSink): void {
    widen(this.allEnds, ends, marks, rows);
    spanForces(values, this.spans, this.chain.count, rows);
    widen(this.counting ? this.countedShear : this.allShear, values, marks, rows);
    widen(this.counting ? this.countedSpans : this.allSpans, this.spans, marks, rows);
    if (this.counting) this.counter.take(values, this.spans, rows, marks);
  }
}
