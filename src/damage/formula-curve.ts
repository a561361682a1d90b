import type { Curve } from '../model.ts';
import { assembleCurve, type CurveTraits } from './curve.ts';

/** A curve's formula as the user gave it. */
export interface FormulaLine {
  /** Cycles to failure as an expression in S. */
  readonly formula: string;
  /** The unit of S in base units: 1 for MPa or N, 6.894757293168361 for ksi. */
  readonly unit: number;
  /** Span that the formula holds over, MPa or N. */
  readonly from: number;
  readonly to: number;
}

/** Steps over the span at which the formula is tried, even in log S. */
const TRIALS = 2000;

/** Relative step of the end slopes. */
const STEP = 1e-4;

/**
 * A curve from a formula for N in S, worked out by mathjs, which is loaded here and not before.
 *
 * Above the span the slope at its upper end goes on, in log N over log S; below it the slope at its
 * lower end, where `below` lets the curve go on at all.
 *
 * @param traits all of the curve but its line
 * @param line expression, unit and span
 * @returns the curve, or what was expected of the formula, as the end of a sentence «expected …»
 */
export async function formulaCurve(
  traits: CurveTraits,
  line: FormulaLine,
): Promise<Curve | string> {
  const { formula, unit, from, to } = line;
  if (!(from > 0 && to > from && Number.isFinite(to))) return 'a span over zero that rises';
  const { compileFormula } = await import('./formula-evaluator.ts');
  const cyclesOf = compileFormula(formula);
  if (typeof cyclesOf === 'string') return cyclesOf;
  const inSpan = (range: number) => cyclesOf(range / unit);
  const fault = faultOf(inSpan, line);
  if (fault !== null) return fault;
  const cyclesAt = goneOn(inSpan, from, to);
  return assembleCurve(traits, { kind: 'formula', cyclesAt, from, to }, from, 'cutoff');
}

/** What is wrong with the formula over its span, or `null`. */
function faultOf(cyclesAt: (range: number) => number, line: FormulaLine): string | null {
  const { unit, from, to } = line;
  let before = Infinity;
  for (let i = 0; i <= TRIALS; i++) {
    const range = i === TRIALS ? to : from * (to / from) ** (i / TRIALS);
    const cycles = cyclesAt(range);
    if (cycles > 0 && cycles < before) {
      before = cycles;
      continue;
    }
    const at = `at S = ${short(range / unit)} it gives ${short(cycles)}`;
    return cycles > 0 && Number.isFinite(cycles)
      ? `a formula whose cycles fall as S rises all over its span (${at}, and ${short(before)} before)`
      : `a formula that gives a real, positive number of cycles all over its span (${at})`;
  }
  return null;
}

/** A number as a message shows it. */
function short(value: number): string {
  return Number.isNaN(value) ? 'no real number' : String(Number(value.toPrecision(4)));
}

/** The formula inside its span, and straight lines in log N over log S beyond both ends. */
function goneOn(
  inSpan: (range: number) => number,
  from: number,
  to: number,
): (range: number) => number {
  const slope = (low: number, high: number) =>
    Math.log(inSpan(low) / inSpan(high)) / Math.log(high / low);
  const step = Math.min(1 + STEP, to / from);
  const slopeBelow = slope(from, from * step);
  const slopeAbove = slope(to / step, to);
  return (range) => {
    if (range < from) return inSpan(from) * (from / range) ** slopeBelow;
    if (range > to) return inSpan(to) * (to / range) ** slopeAbove;
    return inSpan(range);
  };
}
