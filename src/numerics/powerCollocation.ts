/**
 * Polynomial collocation on (0, 1] for functions that are analytic at 0, where explicit steps lose their order.
 * Nodes are the positive Chebyshev extrema of [-1, 1] squared, so the last node is 1.
 */
export interface Collocation {
  readonly nodes: readonly number[];
  /** Row i gives ∫₀^τᵢ f dτ from the values of f at the nodes. */
  readonly integral: readonly Float64Array[];
  /** Row i gives (1/τᵢ^(3/2)) ∫₀^τᵢ √τ f dτ, two thirds of the mean of f over a ball whose squared radius goes as τ. */
  readonly ballMean: readonly Float64Array[];
}

/**
 * Collocation with `count` nodes: exact for polynomials up to degree count - 1.
 * Checked on monomials and on exp: test/numerics/powerCollocation.test.ts
 */
export function powerCollocation(count: number): Collocation {
  const nodes = Array.from({ length: count }, (_, i) => Math.sin(((i + 1) * Math.PI) / (2 * count)) ** 2);
  return {
    nodes,
    integral: nodes.map((t) => weights(nodes, (k) => t ** (k + 1) / (k + 1))),
    ballMean: nodes.map((t) => weights(nodes, (k) => t ** k / (k + 1.5))),
  };
}

/** Weights w with Σ wⱼ nodesⱼ^k = moment(k) for k = 0 … n-1: a transposed Vandermonde system, by elimination. */
function weights(nodes: readonly number[], moment: (k: number) => number): Float64Array {
  const n = nodes.length;
  const rows = Array.from({ length: n }, (_, k) => [...nodes.map((node) => node ** k), moment(k)]);
  for (let column = 0; column < n; column++) {
    const pivot = rows
      .slice(column)
      .reduce((best, row) => (Math.abs(row[column]) > Math.abs(best[column]) ? row : best));
    rows.splice(rows.indexOf(pivot), 1);
    rows.splice(column, 0, pivot);
    for (let r = 0; r < n; r++) {
      if (r === column) continue;
      const factor = rows[r][column] / pivot[column];
      for (let c = column; c <= n; c++) rows[r][c] -= factor * pivot[c];
    }
  }
  return Float64Array.from(rows, (row, k) => row[n] / row[k]);
}
