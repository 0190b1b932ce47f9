/** Nodes of the polynomial between two nodes: three on each side where there are as many. */
const WIDTH = 6;
/** Products of the distances of a node to the five others. */
const DENOMINATORS = [-120, 24, -12, 12, -24, 120];

/** The first of the six nodes 0…count-1 that an interpolation at t uses. */
function firstNode(t: number, count: number): number {
  return Math.max(0, Math.min(Math.floor(t) - (WIDTH / 2 - 1), count - WIDTH));
}

/**
 * Weights of six equidistant nodes in the quintic through them, at u node distances from the first (Lagrange).
 * Exact for quintics; error O(h⁶) where the function is smooth.
 * Checked test/numerics/equidistantNodes.test.ts
 */
export function quinticWeights(u: number, weights: Float64Array): void {
  for (let k = 0; k < WIDTH; k++) {
    let product = 1 / DENOMINATORS[k];
    for (let j = 0; j < WIDTH; j++) if (j !== k) product *= u - j;
    weights[k] = product;
  }
}

/** A function known at six or more equidistant nodes, by local quintics. Does not check that x lies among them. */
export class EquidistantNodes {
  readonly from: number;
  readonly step: number;
  readonly values: Float64Array;
  private rising?: Float64Array;

  constructor(from: number, step: number, values: Float64Array) {
    this.from = from;
    this.step = step;
    this.values = values;
  }

  get nodes(): Float64Array {
    this.rising ??= this.values.map((_, i) => this.from + i * this.step);
    return this.rising;
  }

  value(x: number): number {
    const t = (x - this.from) / this.step;
    const first = firstNode(t, this.values.length);
    return quinticThrough(this.values, first, t - first);
  }
}

/** At u, the quintic through the six values from place `at` on, which stand at u = 0, 1, 2, 3, 4, 5 (Newton's differences). */
function quinticThrough(values: Float64Array, at: number, u: number): number {
  const a = values[at];
  const b = values[at + 1];
  const c = values[at + 2];
  const d = values[at + 3];
  const e = values[at + 4];
  const third = d - 3 * c + 3 * b - a;
  const fourth = e - 4 * d + 6 * c - 4 * b + a;
  const fifth = values[at + 5] - 5 * e + 10 * d - 10 * c + 5 * b - a;
  const high = third + ((u - 3) / 4) * (fourth + ((u - 4) / 5) * fifth);
  return a + u * (b - a + ((u - 1) / 2) * (c - 2 * b + a + ((u - 2) / 3) * high));
}
