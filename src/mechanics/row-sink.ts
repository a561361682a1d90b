import { type Chain, MARK, STRAIN } from './chain-state.ts';
import { movementOf } from './joint.ts';

/**
 * Collects the forces of all connections at every event and turning point, in blocks: row-major, one row a moment, one
 * column a fastener. A full block goes to `onBlock`, and its place is used again.
 */
export class RowSink {
  readonly columns: number;
  readonly capacity: number;
  /** Forces f of the block's rows [N]. */
  readonly values: Float64Array;
  /** Movement of the member's left and right end against the structure, rightward positive, two a row [mm]. */
  readonly ends: Float64Array;
  /** How far along the record's path each row lies: leg and share of the leg. */
  readonly marks: Float64Array;
  rows = 0;
  private readonly onBlock: (sink: RowSink) => void;

  /** @param expected about how many rows there will be: a short way needs no large block */
  constructor(columns: number, onBlock: (sink: RowSink) => void, expected = 4096) {
    this.columns = columns;
    // some 256 KiB a block stay in the cache while every column is counted
    this.capacity = Math.max(64, Math.min(expected, 4096, Math.floor(32_768 / columns)));
    this.values = new Float64Array(this.capacity * columns);
    this.ends = new Float64Array(this.capacity * 2);
    this.marks = new Float64Array(this.capacity);
    this.onBlock = onBlock;
  }

  /** Adds the chain's forces now as one row. */
  take(chain: Chain): void {
    writeRow(chain, this.values, this.rows * this.columns);
    writeEnds(chain, this.ends, this.rows * 2);
    this.marks[this.rows] = chain.now[MARK];
    this.rows++;
    if (this.rows === this.capacity) this.flush();
  }

  /** Hands on what is there. */
  flush(): void {
    if (this.rows > 0) this.onBlock(this);
    this.rows = 0;
  }
}

function writeRow(chain: Chain, values: Float64Array, at: number): void {
  const { count, tangent, movement, offset } = chain;
  for (let i = 0; i < count; i++) values[at + i] = tangent[i] * movement[i] + offset[i];
}

/** Beyond the last fastener the member is free, so it strains by all of ε. */
function writeEnds(chain: Chain, ends: Float64Array, at: number): void {
  const { overhangs, now, count } = chain;
  ends[at] = movementOf(chain, 0) - overhangs.left * now[STRAIN];
  ends[at + 1] = movementOf(chain, count - 1) + overhangs.right * now[STRAIN];
}
