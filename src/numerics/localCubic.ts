/**
 * Piecewise cubic through rising nodes: between two nodes, the polynomial through the four nearest ones (the first or
 * last four at the ends), in Newton's form. Continuous; exact for cubics; error O(h⁴).
 * Needs four nodes. Does not check that x lies between the first and the last of them.
 * Checked test/numerics/localCubic.test.ts
 */
export class LocalCubic {
  readonly nodes: Float64Array;
  /** Divided differences of order 0 to 3 at each node: [y_j], [y_j, y_(j+1)], … */
  private readonly differences: Float64Array;

  constructor(x: ArrayLike<number>, y: ArrayLike<number>) {
    this.nodes = Float64Array.from(x);
    this.differences = dividedDifferences(this.nodes, y);
  }

  value(x: number): number {
    const { nodes } = this;
    let low = 0;
    let high = nodes.length - 1;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (nodes[middle] <= x) low = middle;
      else high = middle;
    }
    const j = Math.min(Math.max(low - 1, 0), nodes.length - 4);
    const d = this.differences;
    const inner = d[4 * j + 2] + (x - nodes[j + 2]) * d[4 * j + 3];
    return d[4 * j] + (x - nodes[j]) * (d[4 * j + 1] + (x - nodes[j + 1]) * inner);
  }
}

function dividedDifferences(x: Float64Array, y: ArrayLike<number>): Float64Array {
  const differences = new Float64Array(4 * x.length);
  for (let j = 0; j < x.length; j++) differences[4 * j] = y[j];
  for (let order = 1; order <= 3; order++) {
    for (let j = 0; j + order < x.length; j++) {
      const at = 4 * j + order;
      differences[at] = (differences[at + 3] - differences[at - 1]) / (x[j + order] - x[j]);
    }
  }
  return differences;
}
