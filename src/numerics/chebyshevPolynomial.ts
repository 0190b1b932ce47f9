/** The points −1 … 1 mapped onto [from, to] where a polynomial of this degree is best sampled, ends included. */
export function chebyshevNodes(from: number, to: number, degree: number): Float64Array {
  return Float64Array.from(
    { length: degree + 1 },
    (_, j) => (from + to) / 2 - ((to - from) / 2) * Math.cos((Math.PI * j) / degree),
  );
}

/**
 * The polynomial on [from, to] that takes given values at `chebyshevNodes`, with its slope.
 * Source  Clenshaw 1955, Math. Tables Aids Comput. 9, 118 (summation); Trefethen 2013, Approximation Theory and
 *         Approximation Practice, chapter 3 (coefficients)
 * Checked test/numerics/chebyshevPolynomial.test.ts
 */
export class ChebyshevPolynomial {
  private readonly coefficients: Float64Array;
  private readonly middle: number;
  private readonly halfWidth: number;

  constructor(from: number, to: number, values: ArrayLike<number>) {
    this.middle = (from + to) / 2;
    this.halfWidth = (to - from) / 2;
    this.coefficients = coefficientsThrough(values);
  }

  /** Size of the last two coefficients: where the sampled function is smooth, an upper bound of the error. */
  get tail(): number {
    const c = this.coefficients;
    return Math.max(Math.abs(c[c.length - 1]), Math.abs(c[c.length - 2]));
  }

  value(x: number): number {
    const c = this.coefficients;
    const u = (x - this.middle) / this.halfWidth;
    let b1 = 0;
    let b2 = 0;
    for (let k = c.length - 1; k > 0; k--) {
      const b = c[k] + 2 * u * b1 - b2;
      b2 = b1;
      b1 = b;
    }
    return c[0] + u * b1 - b2;
  }

  /** Clenshaw's recurrence differentiated along with itself. */
  slope(x: number): number {
    const c = this.coefficients;
    const u = (x - this.middle) / this.halfWidth;
    let b1 = 0;
    let b2 = 0;
    let d1 = 0;
    let d2 = 0;
    for (let k = c.length - 1; k > 0; k--) {
      const d = 2 * b1 + 2 * u * d1 - d2;
      d2 = d1;
      d1 = d;
      const b = c[k] + 2 * u * b1 - b2;
      b2 = b1;
      b1 = b;
    }
    return (b1 + u * d1 - d2) / this.halfWidth;
  }
}

/** Cosine sums over the nodes, whose order −1 … 1 gives the factor (−1)^k; first and last terms count half. */
function coefficientsThrough(values: ArrayLike<number>): Float64Array {
  const n = values.length - 1;
  const coefficients = new Float64Array(n + 1);
  for (let k = 0; k <= n; k++) {
    let sum = (values[0] + (k % 2 === 0 ? 1 : -1) * values[n]) / 2;
    for (let j = 1; j < n; j++) sum += values[j] * Math.cos((Math.PI * k * j) / n);
    const halved = k === 0 || k === n ? 1 : 2;
    coefficients[k] = ((k % 2 === 0 ? 1 : -1) * halved * sum) / n;
  }
  return coefficients;
}
