/**
 * Divisor of a mean curve's cycles for a stated survival: 10^(z·s).
 *
 * @param logDeviation standard deviation s of log₁₀ N about the curve
 * @param survival probability of survival, between 0 and 1, such as 0.95
 * @returns divisor; over 1 for a survival over one half
 * @throws RangeError for a survival outside 0 … 1
 */
export function survivalDivisor(logDeviation: number, survival: number): number {
  return 10 ** (normalQuantile(survival) * logDeviation);
}

/**
 * Standard normal quantile z: the value that a standard normal variable stays under with probability p.
 *
 * M. J. Wichura, Algorithm AS 241: The percentage points of the normal distribution, Applied
 * Statistics 37 (1988), 477–484, routine PPND16; relative error about 1e-16. Coefficients are
 * rounded to the nearest double.
 *
 * @param p probability, between 0 and 1
 * @throws RangeError for a probability outside 0 … 1
 */
export function normalQuantile(p: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`probability ${p} is not between 0 and 1`);
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) return q * ratio(CENTRE, 0.180625 - q * q);
  const r = Math.sqrt(-Math.log(Math.min(p, 1 - p)));
  return Math.sign(q) * (r <= 5 ? ratio(TAIL, r - 1.6) : ratio(FAR_TAIL, r - 5));
}

interface Rational {
  readonly over: readonly number[];
  readonly under: readonly number[];
}

/** Quotient of two polynomials, coefficients from the constant up. */
function ratio({ over, under }: Rational, x: number): number {
  const polynomial = (coefficients: readonly number[]) =>
    coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
  return polynomial(over) / polynomial(under);
}

/** a₀ … a₇ and 1, b₁ … b₇. */
const CENTRE: Rational = {
  over: [
    3.3871328727963665, 133.14166789178438, 1971.5909503065513, 13731.69376550946,
    45921.95393154987, 67265.7709270087, 33430.57558358813, 2509.0809287301227,
  ],
  under: [
    1, 42.31333070160091, 687.1870074920579, 5394.196021424751, 21213.794301586597,
    39307.89580009271, 28729.085735721943, 5226.495278852854,
  ],
};

/** c₀ … c₇ and 1, d₁ … d₇. */
const TAIL: Rational = {
  over: [
    1.4234371107496835, 4.630337846156546, 5.769497221460691, 3.6478483247632045,
    1.2704582524523684, 0.2417807251774506, 0.022723844989269184, 0.0007745450142783414,
  ],
  under: [
    1, 2.053191626637759, 1.6763848301838038, 0.6897673349851, 0.14810397642748008,
    0.015198666563616457, 0.0005475938084995345, 1.0507500716444169e-9,
  ],
};

/** e₀ … e₇ and 1, f₁ … f₇. */
const FAR_TAIL: Rational = {
  over: [
    6.657904643501103, 5.463784911164114, 1.7848265399172913, 0.29656057182850487,
    0.026532189526576124, 0.0012426609473880784, 2.7115555687434876e-5, 2.0103343992922881e-7,
  ],
  under: [
    1, 0.599832206555888, 0.1369298809227358, 0.014875361290850615, 0.0007868691311456133,
    1.8463183175100548e-5, 1.421511758316446e-7, 2.0442631033899397e-15,
  ],
};
