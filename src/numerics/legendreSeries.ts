import type { QuadratureRule } from "./gaussLegendre.ts";

/**
 * Coefficients c_k of the Legendre series Σ c_k P_k through values at the nodes of a Gauss–Legendre rule:
 *   c_k = (k + 1/2) Σ_i w_i f_i P_k(x_i),   k below the number of nodes.
 * `weightedValues` are the products w_i f_i.
 * Checked test/numerics/legendreSeries.test.ts
 */
export function legendreSeries(rule: QuadratureRule, weightedValues: Float64Array): Float64Array {
  const coefficients = new Float64Array(weightedValues.length);
  for (let i = 0; i < weightedValues.length; i++) {
    const x = rule.nodes[i];
    let [previous, current] = [0, 1];
    for (let k = 0; k < coefficients.length; k++) {
      coefficients[k] += (k + 0.5) * weightedValues[i] * current;
      [previous, current] = [current, ((2 * k + 1) * x * current - k * previous) / (k + 1)];
    }
  }
  return coefficients;
}

/** ∫ Σ c_k P_k from -1 to x, with ∫ P_k = (P_(k+1)(x) - P_(k-1)(x))/(2k + 1) (Abramowitz & Stegun 22.7.10, 22.8.5). */
export function integrateLegendreSeries(coefficients: Float64Array, x: number): number {
  let integral = coefficients[0] * (x + 1);
  let [previous, current] = [1, x];
  for (let k = 1; k < coefficients.length; k++) {
    const next = ((2 * k + 1) * x * current - k * previous) / (k + 1);
    integral += (coefficients[k] * (next - previous)) / (2 * k + 1);
    [previous, current] = [current, next];
  }
  return integral;
}
