import type { Curve } from '../model.ts';
import { cyclesToFailure } from './cycles-to-failure.ts';

/**
 * Damage a cycle, 1/N(S), over the factored range, so that a cycle costs no power.
 *
 * The range's own bits are the index: its exponent and the first bits of its fraction name a cell,
 * 256 to the octave, and inside a cell the damage is a parabola in S. A cell is worked out when the
 * first range falls into it. Where the parabola is not exact enough, as at a kink, a cut-off or on a
 * very steep line, the curve itself is asked. A `threshold` curve stands here as gone on below
 * its threshold, since only the series as a whole says whether it ends there.
 */
export interface DamageCells {
  readonly curve: Curve;
  /** Number of the first cell. */
  readonly firstCell: number;
  /** `NEW`, `SMOOTH` or `EXACT` for each cell. */
  readonly kinds: Uint8Array;
  /** a, b, c of a + S(b + cS) for each cell. */
  readonly coefficients: Float64Array;
}

/** Miner sum of some ranges and how many of them do damage. */
export interface DamageSum {
  readonly sum: number;
  readonly damaging: number;
}

const NEW = 0;
const SMOOTH = 1;
const EXACT = 2;

/** Bits of the fraction that tell the cells of an octave apart, of the 20 in a double's upper word. */
const CELL_BITS = 8;
const SHIFT = 20 - CELL_BITS;

/** Octaves of cells under the curve's limit range, and in all; beyond them the curve is asked. */
const OCTAVES_UNDER = 16;
const CELLS = 24 << CELL_BITS;

/** A cell is smooth if its parabola is this near the curve, relatively. */
const TOLERANCE = 1e-7;

/** Places in a cell where a parabola through its ends and middle strays furthest from a cubic. */
const FURTHEST = [0.5 - Math.sqrt(1 / 12), 0.5 + Math.sqrt(1 / 12)];

/** One number seen both as a double and as two words. */
const double = new Float64Array(1);
const words = new Uint32Array(double.buffer);
const HIGH = new Uint8Array(Uint32Array.of(1).buffer)[0] === 1 ? 1 : 0;

/**
 * Empty cells for one curve. Factors are applied to the ranges, so they serve every series.
 *
 * @param curve an S-N curve
 */
export function createDamageCells(curve: Curve): DamageCells {
  return {
    curve,
    firstCell: cellOf(curve.limitRange) - (OCTAVES_UNDER << CELL_BITS),
    kinds: new Uint8Array(CELLS),
    coefficients: new Float64Array(3 * CELLS),
  };
}

/**
 * Damage of one cycle of each range, summed.
 *
 * @param cells the curve's cells; those that a range falls into first are filled
 * @param ranges unfactored ranges, positive, in the series' unit
 * @param factor turns them into factored ranges in the curve's unit
 * @returns Σ 1/N(factor · S) and the number of ranges that add to it
 */
export function sumDamage(cells: DamageCells, ranges: Float64Array, factor: number): DamageSum {
  const { firstCell, kinds, coefficients } = cells;
  let sum = 0;
  let damaging = 0;
  for (let i = 0; i < ranges.length; i++) {
    const range = ranges[i] * factor;
    const cell = cellOf(range) - firstCell;
    const damage =
      cell >= 0 && cell < CELLS && kinds[cell] === SMOOTH
        ? coefficients[3 * cell] +
          range * (coefficients[3 * cell + 1] + range * coefficients[3 * cell + 2])
        : damageOffCells(cells, range, cell);
    sum += damage;
    damaging += Number(damage > 0);
  }
  return { sum, damaging };
}

/** Damage of a range whose cell is not smooth, or not known to be so yet. */
function damageOffCells(cells: DamageCells, range: number, cell: number): number {
  if (cell >= 0 && cell < CELLS && cells.kinds[cell] === NEW) fillCell(cells, cell);
  return exactDamage(cells.curve, range);
}

/** Lays the parabola through a cell's ends and middle, and keeps it if it is near enough. */
function fillCell(cells: DamageCells, cell: number): void {
  const low = lowEdge(cell + cells.firstCell);
  const width = lowEdge(cell + cells.firstCell + 1) - low;
  const damageAt = (share: number) => exactDamage(cells.curve, low + share * width);
  const [start, middle, end] = [damageAt(0), damageAt(0.5), damageAt(1)];
  const bend = (2 * (start - 2 * middle + end)) / width ** 2;
  const rise = (end - start) / width - bend * width;
  const strays = FURTHEST.some((share) => {
    const exact = damageAt(share);
    const along = share * width;
    return Math.abs(start + along * (rise + bend * along) - exact) > TOLERANCE * exact;
  });
  const kinked = hasKink(cells.curve, low, low + width);
  cells.kinds[cell] = strays || kinked ? EXACT : SMOOTH;
  cells.coefficients.set(
    [start - low * (rise - bend * low), rise - 2 * bend * low, bend],
    3 * cell,
  );
}

/** Whether the line of a curve bends or ends between two ranges. */
function hasKink(curve: Curve, low: number, high: number): boolean {
  const within = (range: number) => range >= low && range <= high;
  if (within(curve.limitRange)) return true;
  return curve.line.kind === 'points' && curve.line.ranges.some(within);
}

function exactDamage(curve: Curve, range: number): number {
  return 1 / cyclesToFailure(curve, range, true);
}

/** Number of the cell that a positive range falls into, the same for every curve. */
function cellOf(range: number): number {
  double[0] = range;
  return words[HIGH] >>> SHIFT;
}

/** Smallest range of a cell. */
function lowEdge(cell: number): number {
  words[HIGH] = cell << SHIFT;
  words[1 - HIGH] = 0;
  return double[0];
}
