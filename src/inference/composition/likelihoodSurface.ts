import { anglesOf, fractionsAt } from "../../curve/simplexAngles.ts";
import type { Fit } from "./massIntegral.ts";
import type { FractionDensity } from "./simplexIntegral.ts";

/** Degree of the polynomials along each angle, and the nodes they go through. */
const DEGREE = 6;
const NODES = DEGREE + 1;
/** Angles are counted in this many steps, so that nodes of different cells that coincide are one. */
const STEPS = DEGREE * 2 ** 16;
/** Cells this small (1e-4 of an angle) are left as they are. */
const SMALLEST = 2 ** 3;
/** First cells along each angle. */
const FIRST_CELLS = 1;
/** Cells are left as they are once there are so many. */
const MOST_CELLS = 4000;
/** ln L below the peak of which nothing matters. */
const NEGLIGIBLE = 21;

/** A box of NODES nodes along each angle, `spacing` steps apart, from `origin`. */
interface Cell {
  readonly origin: readonly number[];
  readonly spacing: readonly number[];
  readonly logLikelihoods: Float64Array;
  /** ln of the probability of worse fits over the likelihood: it varies much less than either. */
  readonly logWorseRatios: Float64Array;
}

/**
 * ln L over all mass fractions of a family, by polynomials on boxes of angles (`fractionsAt`) that are halved until each
 * meets ln L between its nodes within `tolerance`, as far as it matters: an error counts by the density it stands at.
 * Asking it costs a tenth of a microsecond, where a mass integral costs some.
 * Checked test/inference/composition/linearRelation.test.ts
 */
export class LikelihoodSurface implements FractionDensity {
  private readonly cells: Cell[] = [];
  private readonly dimensions: number;
  private readonly evaluate: (fractions: readonly number[]) => Fit;
  private readonly known = new Map<number, Fit>();
  private readonly angles: Float64Array;
  private readonly weights: Float64Array;
  private readonly scratch: Float64Array;
  private peak = Number.NEGATIVE_INFINITY;
  private last: Cell;

  constructor(componentCount: number, evaluate: (fractions: readonly number[]) => Fit, tolerance = 1e-3) {
    this.dimensions = componentCount - 1;
    this.evaluate = evaluate;
    this.angles = new Float64Array(this.dimensions);
    this.weights = new Float64Array(this.dimensions * NODES);
    this.scratch = new Float64Array(NODES ** (this.dimensions - 1));
    this.refine(tolerance);
    this.known.clear();
    [this.last] = this.cells;
  }

  logDensity(fractions: ArrayLike<number>): number {
    anglesOf(fractions, this.angles);
    for (let d = 0; d < this.dimensions; d++) this.angles[d] *= STEPS;
    if (!contains(this.last, this.angles)) {
      this.last = this.cells.find((cell) => contains(cell, this.angles)) ?? this.last;
    }
    this.weigh(this.last, this.angles);
    return this.sum(this.last.logLikelihoods);
  }

  logWeight(): number {
    return this.sum(this.last.logWorseRatios) + this.sum(this.last.logLikelihoods);
  }

  private refine(tolerance: number): void {
    const { dimensions } = this;
    const spacing = new Array<number>(dimensions).fill(STEPS / DEGREE / FIRST_CELLS);
    let open = firstOrigins(dimensions).map((origin) => this.cell(origin, spacing));
    while (open.length > 0) {
      const isFull = this.cells.length + open.length > MOST_CELLS;
      open = open.flatMap((cell) => {
        const axis = isFull ? undefined : this.worstAxis(cell, tolerance);
        if (axis === undefined) {
          this.cells.push(cell);
          return [];
        }
        const spacing = cell.spacing.map((h, d) => (d === axis ? h / 2 : h));
        const second = cell.origin.map((at, d) => (d === axis ? at + DEGREE * spacing[d] : at));
        return [this.cell(cell.origin, spacing), this.cell(second, spacing)];
      });
    }
  }

  private cell(origin: readonly number[], spacing: readonly number[]): Cell {
    const fits = Array.from({ length: NODES ** this.dimensions }, (_, n) => {
      let index = n;
      const steps = new Array<number>(this.dimensions);
      for (let d = this.dimensions - 1; d >= 0; d--) {
        steps[d] = origin[d] + (index % NODES) * spacing[d];
        index = Math.floor(index / NODES);
      }
      return this.at(steps);
    });
    return {
      origin,
      spacing,
      logLikelihoods: Float64Array.from(fits, ({ logLikelihood }) => logLikelihood),
      logWorseRatios: Float64Array.from(fits, ({ logLikelihood, logWorse }) => logWorse - logLikelihood),
    };
  }

  private at(steps: readonly number[]): Fit {
    const key = steps.reduce((sum, step) => sum * (STEPS + 1) + step, 0);
    let fit = this.known.get(key);
    if (fit === undefined) {
      fit = this.evaluate(fractionsAt(steps.map((step) => step / STEPS)));
      this.known.set(key, fit);
      this.peak = Math.max(this.peak, fit.logLikelihood);
    }
    return fit;
  }

  /** The axis to halve a cell along; undefined if it is good enough as it is. */
  private worstAxis(cell: Cell, tolerance: number): number | undefined {
    if (this.isNegligible(cell)) return undefined;
    const { dimensions } = this;
    const alongAxes = cell.spacing.map((spacing, axis) => {
      if (spacing <= SMALLEST) return -1;
      const places = [0.5, DEGREE - 0.5].map((place) => cell.spacing.map((_, d) => (d === axis ? place : DEGREE / 2)));
      return Math.max(...places.map((place) => this.testError(cell, place)));
    });
    const largest = Math.max(...alongAxes);
    const isGood = () => cornerPlaces(dimensions).every((place) => this.testError(cell, place) <= tolerance);
    if (largest < 0 || (largest <= tolerance && isGood())) return undefined;
    return alongAxes.indexOf(largest);
  }

  /**
   * By how much a cell misses the deviation √(-2 ln L) from the best fit at a place, in node distances. What it misses on
   * a flank tells of the peak, which need not lie at a place that is tested.
   */
  private testError(cell: Cell, place: readonly number[]): number {
    const steps = place.map((u, d) => cell.origin[d] + u * cell.spacing[d]);
    const { logLikelihood } = this.at(steps);
    this.weigh(cell, steps);
    const interpolated = this.sum(cell.logLikelihoods);
    const depth = Math.max(0, this.peak - Math.max(logLikelihood, interpolated));
    return Math.abs(interpolated - logLikelihood) / Math.sqrt(1 + 2 * depth);
  }

  /** Between nodes ln L may rise above them by an eighth of their second difference; twice that is allowed for. */
  private isNegligible({ logLikelihoods }: Cell): boolean {
    let highest = Number.NEGATIVE_INFINITY;
    let bend = 0;
    for (let stride = 1, d = 0; d < this.dimensions; d++, stride *= NODES) {
      for (let n = 0; n < logLikelihoods.length; n++) {
        highest = Math.max(highest, logLikelihoods[n]);
        const along = Math.floor(n / stride) % NODES;
        if (along === 0 || along === DEGREE) continue;
        bend = Math.max(bend, 2 * logLikelihoods[n] - logLikelihoods[n - stride] - logLikelihoods[n + stride]);
      }
    }
    return highest + (this.dimensions * bend) / 4 < this.peak - NEGLIGIBLE;
  }

  /** Sets the weights of a cell's nodes at a place. */
  private weigh({ origin, spacing }: Cell, steps: ArrayLike<number>): void {
    for (let d = 0; d < this.dimensions; d++) lagrange((steps[d] - origin[d]) / spacing[d], this.weights, d * NODES);
  }

  /** Of a cell's values with the weights set last. */
  private sum(values: Float64Array): number {
    const { weights, scratch } = this;
    let from: Float64Array = values;
    let count = values.length;
    for (let d = this.dimensions - 1; d >= 0; d--) {
      const w = d * NODES;
      count /= NODES;
      for (let n = 0; n < count; n++) {
        const at = n * NODES;
        scratch[n] =
          weights[w] * from[at] +
          weights[w + 1] * from[at + 1] +
          weights[w + 2] * from[at + 2] +
          weights[w + 3] * from[at + 3] +
          weights[w + 4] * from[at + 4] +
          weights[w + 5] * from[at + 5] +
          weights[w + 6] * from[at + 6];
      }
      from = scratch;
    }
    return scratch[0];
  }
}

/** Origins of the first cells. */
function firstOrigins(dimensions: number): number[][] {
  if (dimensions === 0) return [[]];
  const along = Array.from({ length: FIRST_CELLS }, (_, i) => (i * STEPS) / FIRST_CELLS);
  return firstOrigins(dimensions - 1).flatMap((origin) => along.map((at) => [...origin, at]));
}

/** Half a node distance away from all corners of a cell, where its polynomial errs most. */
function cornerPlaces(dimensions: number): number[][] {
  if (dimensions === 0) return [[]];
  return cornerPlaces(dimensions - 1).flatMap((place) => [0.5, DEGREE - 0.5].map((u) => [...place, u]));
}

function contains({ origin, spacing }: Cell, steps: ArrayLike<number>): boolean {
  for (let d = 0; d < origin.length; d++) {
    const u = steps[d] - origin[d];
    if (!(u >= 0 && u <= DEGREE * spacing[d])) return false;
  }
  return true;
}

const SCALES = Float64Array.from({ length: NODES }, (_, k) => {
  let product = 1;
  for (let j = 0; j < NODES; j++) if (j !== k) product *= k - j;
  return 1 / product;
});

/** Weights of the nodes 0…DEGREE in the polynomial through them, at u. */
function lagrange(u: number, weights: Float64Array, at: number): void {
  let before = 1;
  for (let k = 0; k < NODES; k++) {
    weights[at + k] = before * SCALES[k];
    before *= u - k;
  }
  let after = 1;
  for (let k = NODES - 1; k >= 0; k--) {
    weights[at + k] *= after;
    after *= u - k;
  }
}
