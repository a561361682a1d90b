import type { Curve } from '../model.ts';
import { cyclesToFailure } from './cycles-to-failure.ts';

/**
 * Damage a cycle, 1/N(S), over the factored range, so that a cycle costs no power.
 *
 * The range's own bits are the index: its exponent and the first bits of its fraction name a cell,
 * 128 to the octave, and inside a cell the damage is a cubic in S. A cell is worked out when the
 * first range falls into it. Where the cubic is not exact enough, as at a kink, a cut-off or on a
 * very steep line, the curve itself is asked. A `threshold` curve stands here as gone on below
 * its threshold, since only the series as a whole says whether it ends there.
 */
export interface DamageCells {
  readonly curve: Curve;
  /** Number of the first cell. */
  readonly firstCell: number;
  /** 1 for each cell that a range has fallen into. */
  readonly tried: Uint8Array;
  /** a, b, c, d of a + S(b + S(c + dS)) for each cell; `NaN` where a cubic is not known or too far off. */
  readonly coefficients: Float64Array;
}

/** Miner sum of some ranges and how many of them do damage. */
export interface DamageSum {
  readonly sum: number;
  readonly damaging: number;
}

/** Bits of the fraction that tell the cells of an octave apart, of the 20 in a double's upper word. */
const CELL_BITS = 7;
const SHIFT = 20 - CELL_BITS;

/** Octaves of cells under the curve's limit range, and in all; beyond them the curve is asked. */
const OCTAVES_UNDER = 16;
const CELLS = 24 << CELL_BITS;

/**
 * Relative error that a cell's cubic may have at the two places where it is tried. Where the curve bends sharply, at
 * whatever place in the cell, the error is nowhere more than 3.4 times as large as there: 1e-6 is kept.
 */
const TOLERANCE = 2e-7;

/** Places in a cell where a cubic through four even places strays furthest from a quartic. */
const FURTHEST = [0.5 - Math.sqrt(5) / 6, 0.5 + Math.sqrt(5) / 6];

/** Ranges taken at a time: small enough for the processor's first cache. */
const BLOCK = 1024;

/** Factored ranges seen both as doubles and as two words each. */
const factored = new Float64Array(BLOCK);
const factoredWords = new Uint32Array(factored.buffer);

/** Which of a double's two words is its upper one on this machine. */
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
    tried: new Uint8Array(CELLS),
    coefficients: new Float64Array(4 * CELLS).fill(Number.NaN),
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
  const totals = new Float64Array(2);
  for (let start = 0; start < ranges.length; start += BLOCK) {
    const count = Math.min(BLOCK, ranges.length - start);
    for (let i = 0; i < count; i++) factored[i] = factor * ranges[start + i];
    sumBlock(cells, count, totals);
  }
  return { sum: totals[0], damaging: totals[1] };
}

/** Adds damage and damaging ranges of the first `count` ranges in `factored` to `totals`. */
function sumBlock(cells: DamageCells, count: number, totals: Float64Array): void {
  const { firstCell, coefficients } = cells;
  const ranges = factored;
  const words = factoredWords;
  let sum = 0;
  let damaging = 0;
  for (let i = 0; i < count; i++) {
    const range = ranges[i];
    const cell = (words[2 * i + HIGH] >>> SHIFT) - firstCell;
    const at = 4 * cell;
    let damage =
      cell >= 0 && cell < CELLS
        ? coefficients[at] +
          range *
            (coefficients[at + 1] + range * (coefficients[at + 2] + range * coefficients[at + 3]))
        : Number.NaN;
    if (!(damage >= 0)) damage = damageOffCells(cells, range, cell);
    sum += damage;
    damaging += Number(damage > 0);
  }
  totals[0] += sum;
  totals[1] += damaging;
}

/** Damage of a range outside the cells, or in one without a cubic. */
function damageOffCells(cells: DamageCells, range: number, cell: number): number {
  if (cell >= 0 && cell < CELLS && cells.tried[cell] === 0) fillCell(cells, cell);
  return exactDamage(cells.curve, range);
}

/** Lays a cubic through a cell's curve, and keeps it if it is near enough. */
function fillCell(cells: DamageCells, cell: number): void {
  cells.tried[cell] = 1;
  const low = lowEdge(cell + cells.firstCell);
  const width = lowEdge(cell + cells.firstCell + 1) - low;
  const damageAt = (share: number) => exactDamage(cells.curve, low + share * width);
  const [a, b, c, d] = cubicThrough([0, 1 / 3, 2 / 3, 1].map(damageAt), low, width);
  const near = FURTHEST.every((share) => {
    const range = low + share * width;
    const exact = damageAt(share);
    return Math.abs(a + range * (b + range * (c + range * d)) - exact) <= TOLERANCE * exact;
  });
  if (near) cells.coefficients.set([a, b, c, d], 4 * cell);
}

/**
 * Coefficients of the cubic in x, from the constant up, that has the given values at `low` and each
 * third of `width` after it (Newton's forward differences).
 */
function cubicThrough(values: number[], low: number, width: number): number[] {
  const [y0, y1, y2, y3] = values;
  const step = width / 3;
  const [first, second, third] = [y1 - y0, y2 - 2 * y1 + y0, y3 - 3 * y2 + 3 * y1 - y0];
  // In v = (x − low)/step: q0 + q1·v + q2·v² + q3·v³.
  const [q1, q2, q3] = [first - second / 2 + third / 3, (second - third) / 2, third / 6];
  const v0 = low / step;
  return [
    y0 - v0 * (q1 - v0 * (q2 - v0 * q3)),
    (q1 - v0 * (2 * q2 - v0 * 3 * q3)) / step,
    (q2 - 3 * q3 * v0) / step ** 2,
    q3 / step ** 3,
  ];
}

function exactDamage(curve: Curve, range: number): number {
  return 1 / cyclesToFailure(curve, range, true);
}

/** Number of the cell that a positive range falls into, the same for every curve. */
function cellOf(range: number): number {
  return new Uint32Array(Float64Array.of(range).buffer)[HIGH] >>> SHIFT;
}

/** Smallest range of a cell. */
function lowEdge(cell: number): number {
  const range = new Float64Array(1);
  new Uint32Array(range.buffer)[HIGH] = cell << SHIFT;
  return range[0];
}
