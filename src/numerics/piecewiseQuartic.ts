/**
 * Pieces that follow each other without gaps, each the quartic through five equally spaced values.
 * Exact for quartics; does not check that x lies in the first to last piece.
 * Checked test/numerics/piecewiseQuartic.test.ts
 */
export class PiecewiseQuartic {
  /** Rising x of all nodes, four per piece and the end of the last. */
  readonly nodes: Float64Array;
  private readonly values: Float64Array;

  /** For each piece its first x and the distance of its nodes; in `values`, five for each. */
  constructor(from: ArrayLike<number>, spacing: ArrayLike<number>, values: Float64Array) {
    const pieces = from.length;
    this.nodes = new Float64Array(4 * pieces + 1);
    for (let n = 0; n < 4 * pieces; n++) this.nodes[n] = from[n >> 2] + (n & 3) * spacing[n >> 2];
    this.nodes[4 * pieces] = from[pieces - 1] + 4 * spacing[pieces - 1];
    this.values = values;
  }

  value(x: number): number {
    let low = 0;
    let high = (this.nodes.length - 1) / 4;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (this.nodes[4 * middle] <= x) low = middle;
      else high = middle;
    }
    const start = this.nodes[4 * low];
    return quarticThrough(this.values, 5 * low, (x - start) / (this.nodes[4 * low + 1] - start));
  }
}

/** At u, the quartic through the five values from place `at` on, which stand at u = 0, 1, 2, 3, 4 (Newton's differences). */
export function quarticThrough(values: Float64Array, at: number, u: number): number {
  const a = values[at];
  const b = values[at + 1];
  const c = values[at + 2];
  const d = values[at + 3];
  const third = d - 3 * c + 3 * b - a;
  const fourth = values[at + 4] - 4 * d + 6 * c - 4 * b + a;
  return a + u * (b - a + ((u - 1) / 2) * (c - 2 * b + a + ((u - 2) / 3) * (third + ((u - 3) / 4) * fourth)));
}
