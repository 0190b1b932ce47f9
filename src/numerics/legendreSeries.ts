import type { QuadratureRule } from "./gaussLegendre.ts";

/**
 * Coefficients c_k of the polynomial Σ c_k P_k through values at the nodes of a Gauss–Legendre rule:
 *   c_k = (k + 1/2) Σ_i w_i f_i P_k(x_i),   k below the number of nodes (exact, as the rule is for degree 2n - 1)
 * Checked test/numerics/legendreSeries.test.ts
 */
export function legendreSeries(rule: QuadratureRule, values: ArrayLike<number>): Float64Array {
  const coefficients = new Float64Array(values.length);
  for (let i = 0; i < values.length; i++) {
    const x = rule.nodes[i];
    let previous = 0;
    let current = 1;
    for (let k = 0; k < coefficients.length; k++) {
      coefficients[k] += (k + 0.5) * rule.weights[i] * values[i] * current;
      const next = ((2 * k + 1) * x * current - k * previous) / (k + 1);
      previous = current;
      current = next;
    }
  }
  return coefficients;
}

/** Σ c_k P_k(x), by the recurrence (k + 1) P_(k+1) = (2k + 1) x P_k - k P_(k-1) (Abramowitz & Stegun 22.7.10). */
export function evaluateLegendreSeries(coefficients: Float64Array, x: number): number {
  let sum = 0;
  let previous = 0;
  let current = 1;
  for (let k = 0; k < coefficients.length; k++) {
    sum += coefficients[k] * current;
    const next = ((2 * k + 1) * x * current - k * previous) / (k + 1);
    previous = current;
    current = next;
  }
  return sum;
}
