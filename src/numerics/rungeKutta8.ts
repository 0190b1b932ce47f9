import { fifthOrderError, nodes, solutionWeights, stageWeights, thirdOrderError } from "./dormandPrinceTableau.ts";

/** Writes dy/dx at (x, y) into `out`. */
export type RightHandSide = (x: number, y: Float64Array, out: Float64Array) => void;

type Weights = readonly (readonly [number, number])[];

/** A row of tableau weights, flattened for the inner loop; offsets point into the slab of stage slopes. */
interface FlatRow {
  readonly weights: Float64Array;
  readonly offsets: Int32Array;
}

/**
 * One step of the Dormand–Prince method of order 8 with its error estimate. Knows no physics and allocates nothing
 * per step. Only the first `controlled` components enter the error estimate, each relative to its own size:
 * the rest (sensitivities, quadratures) ride along.
 * Source  dormandPrinceTableau.ts
 * Checked observed order 8 ± 0.2: test/numerics/rungeKutta8.test.ts
 */
export class RungeKutta8 {
  readonly dimension: number;
  private readonly controlled: number;
  private readonly slopes: Float64Array;
  private readonly slopeViews: Float64Array[];
  private readonly stage: Float64Array;
  private readonly stageRows: FlatRow[];
  private readonly solutionRow: FlatRow;
  private readonly fifthRow: FlatRow;
  private readonly thirdRow: FlatRow;
  /** Right-hand sides evaluated since construction. */
  evaluations = 0;

  constructor(dimension: number, controlled: number) {
    this.dimension = dimension;
    this.controlled = controlled;
    this.slopes = new Float64Array(nodes.length * dimension);
    this.slopeViews = nodes.map((_, i) => this.slopes.subarray(i * dimension, (i + 1) * dimension));
    this.stage = new Float64Array(dimension);
    const flatten = (row: Weights): FlatRow => ({
      weights: Float64Array.from(row, ([, weight]) => weight),
      offsets: Int32Array.from(row, ([stage]) => stage * dimension),
    });
    this.stageRows = stageWeights.map(flatten);
    this.solutionRow = flatten(solutionWeights);
    this.fifthRow = flatten(fifthOrderError);
    this.thirdRow = flatten(thirdOrderError);
  }

  /**
   * Advances `y` at `x` by `h` into `next` and returns the estimated relative error of the step
   * (root mean square over the controlled components), NaN where the right-hand side left its domain.
   */
  step(f: RightHandSide, x: number, y: Float64Array, h: number, next: Float64Array): number {
    f(x, y, this.slopeViews[0]);
    for (let i = 0; i < this.stageRows.length; i++) {
      this.combine(this.stageRows[i], y, h, this.stage);
      f(x + nodes[i + 1] * h, this.stage, this.slopeViews[i + 1]);
    }
    this.evaluations += nodes.length;
    this.combine(this.solutionRow, y, h, next);
    return this.relativeError(y, next, Math.abs(h));
  }

  private combine(row: FlatRow, y: Float64Array, h: number, out: Float64Array): void {
    const { slopes, dimension } = this;
    const { weights, offsets } = row;
    const count = weights.length;
    for (let c = 0; c < dimension; c++) {
      let sum = 0;
      for (let t = 0; t < count; t++) sum += weights[t] * slopes[offsets[t] + c];
      out[c] = y[c] + h * sum;
    }
  }

  /** The estimate of the source, eq. (10.17)ff: the order-5 difference, damped by the order-3 one. */
  private relativeError(y: Float64Array, next: Float64Array, size: number): number {
    let fifth = 0;
    let third = 0;
    for (let c = 0; c < this.controlled; c++) {
      const scale = Math.max(Math.abs(y[c]), Math.abs(next[c]));
      const e5 = this.weighted(this.fifthRow, c) / scale;
      const e3 = this.weighted(this.thirdRow, c) / scale;
      fifth += e5 * e5;
      third += e3 * e3;
    }
    const denominator = fifth + 0.01 * third;
    return denominator === 0 ? 0 : (size * fifth) / Math.sqrt(denominator * this.controlled);
  }

  private weighted(row: FlatRow, component: number): number {
    let sum = 0;
    for (let t = 0; t < row.weights.length; t++) sum += row.weights[t] * this.slopes[row.offsets[t] + component];
    return sum;
  }
}
