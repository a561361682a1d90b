import {
  absDependencies,
  addDependencies,
  create,
  divideDependencies,
  equalDependencies,
  expDependencies,
  largerDependencies,
  largerEqDependencies,
  log10Dependencies,
  logDependencies,
  maxDependencies,
  minDependencies,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  smallerDependencies,
  smallerEqDependencies,
  sqrtDependencies,
  subtractDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
} from 'mathjs/number';

/** Only what a formula may use is loaded: mathjs whole takes ten times as long to start. */
const math = create({
  absDependencies,
  addDependencies,
  divideDependencies,
  equalDependencies,
  expDependencies,
  largerDependencies,
  largerEqDependencies,
  log10Dependencies,
  logDependencies,
  maxDependencies,
  minDependencies,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  smallerDependencies,
  smallerEqDependencies,
  sqrtDependencies,
  subtractDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
});

/** What `compileFormula` expects, as the end of a sentence «expected …». */
const EXPECTED =
  'a formula in S of numbers, + − * / ^, brackets, exp, log, log10, sqrt, abs, min, max, or a choice such as S > 100 ? … : …';

/**
 * A function of one range from an expression in S, by mathjs on plain numbers.
 *
 * @param formula such as `2e6 * (80 / S)^3`
 * @returns cycles at a range in the formula's unit, `NaN` where they are not real; or, where the text
 *   cannot be read or asks for a name that is not there, what was expected
 */
export function compileFormula(formula: string): ((range: number) => number) | string {
  try {
    const code = math.parse(formula).compile();
    const cyclesOf = (S: number) => {
      const cycles: unknown = code.evaluate({ S });
      return typeof cycles === 'number' ? cycles : Number.NaN;
    };
    cyclesOf(1);
    return cyclesOf;
  } catch (error) {
    return `${EXPECTED} (${error instanceof Error ? error.message : String(error)})`;
  }
}
