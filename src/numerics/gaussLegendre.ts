/** Nodes on [-1, 1], rising, and their weights. */
export interface QuadratureRule {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

/**
 * Gauss–Legendre rule with n nodes on [-1, 1]: exact for polynomials up to degree 2n - 1.
 * Nodes are the roots of the Legendre polynomial P_n, found by Newton's method from x_k = cos(π (k - 1/4)/(n + 1/2));
 * weights are 2/((1 - x²) P_n′(x)²).
 * Source  Abramowitz & Stegun 1964, 25.4.29 (rule) and 22.16.6 (first guess)
 * Checked test/numerics/gaussLegendre.test.ts
 */
export function gaussLegendre(n: number): QuadratureRule {
  const nodes = new Float64Array(n);
  const weights = new Float64Array(n);
  for (let k = 1; k <= n; k++) {
    let x = -Math.cos((Math.PI * (k - 0.25)) / (n + 0.5));
    // Newton converges quadratically from a guess good to 1e-3: four steps reach round-off.
    for (let step = 0; step < 4; step++) x -= legendre(n, x).value / legendre(n, x).slope;
    nodes[k - 1] = x;
    weights[k - 1] = 2 / ((1 - x * x) * legendre(n, x).slope ** 2);
  }
  return { nodes, weights };
}

/** P_n(x) and P_n′(x) for n >= 1 and |x| < 1, by the three-term recurrence (Abramowitz & Stegun 22.7.10 and 22.8.5). */
export function legendre(n: number, x: number): { value: number; slope: number } {
  let previous = 1;
  let value = x;
  for (let k = 2; k <= n; k++) {
    [previous, value] = [value, ((2 * k - 1) * x * value - (k - 1) * previous) / k];
  }
  return { value, slope: (n * (previous - x * value)) / (1 - x * x) };
}
