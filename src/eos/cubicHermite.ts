/** Piecewise cubic through (x, value) with the given slopes: C1. Outside the knots the end pieces go on. */
export class CubicHermite {
  private readonly x: Float64Array;
  private readonly values: Float64Array;
  private readonly slopes: Float64Array;

  constructor(x: ArrayLike<number>, values: ArrayLike<number>, slopes: ArrayLike<number>) {
    this.x = Float64Array.from(x);
    this.values = Float64Array.from(values);
    this.slopes = Float64Array.from(slopes);
  }

  value(x: number): number {
    const i = this.piece(x);
    const width = this.x[i + 1] - this.x[i];
    const t = (x - this.x[i]) / width;
    const rest = 1 - t;
    const risen = t * t * (3 - 2 * t);
    return (
      this.values[i] +
      (this.values[i + 1] - this.values[i]) * risen +
      width * t * rest * (this.slopes[i] * rest - this.slopes[i + 1] * t)
    );
  }

  slope(x: number): number {
    const i = this.piece(x);
    const width = this.x[i + 1] - this.x[i];
    const t = (x - this.x[i]) / width;
    const rest = 1 - t;
    const secant = (this.values[i + 1] - this.values[i]) / width;
    return 6 * t * rest * secant + this.slopes[i] * rest * (1 - 3 * t) + this.slopes[i + 1] * t * (3 * t - 2);
  }

  /** Number of the piece that holds x. */
  private piece(x: number): number {
    let low = 0;
    let high = this.x.length - 1;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (x < this.x[middle]) high = middle;
      else low = middle;
    }
    return low;
  }
}

/**
 * Slopes at the knots that keep a piecewise cubic through values that never fall from falling: the weighted harmonic
 * mean of the secants, and at the ends a three-point estimate, never negative (nor above twice the secant).
 * Source  Fritsch & Butland 1984, SIAM J. Sci. Stat. Comput. 5, 300, doi:10.1137/0905021; ends after Moler 2004,
 *         Numerical Computing with MATLAB, section 3.4 (from memory)
 * Checked test/eos/tabulated.test.ts
 */
export function monotoneSlopes(x: ArrayLike<number>, values: ArrayLike<number>): Float64Array {
  const last = x.length - 1;
  const width = (i: number): number => x[i + 1] - x[i];
  const secant = (i: number): number => (values[i + 1] - values[i]) / width(i);
  const slopes = new Float64Array(x.length);
  if (last === 1) return slopes.fill(secant(0));
  for (let i = 1; i < last; i++) {
    const before = secant(i - 1);
    const after = secant(i);
    const weightBefore = 2 * width(i) + width(i - 1);
    const weightAfter = width(i) + 2 * width(i - 1);
    // Next to a flat piece this is 0: the harmonic mean with an infinite term.
    slopes[i] = (weightBefore + weightAfter) / (weightBefore / before + weightAfter / after);
  }
  slopes[0] = endSlope(width(0), width(1), secant(0), secant(1));
  slopes[last] = endSlope(width(last - 1), width(last - 2), secant(last - 1), secant(last - 2));
  return slopes;
}

function endSlope(width: number, nextWidth: number, secant: number, nextSecant: number): number {
  const slope = ((2 * width + nextWidth) * secant - width * nextSecant) / (width + nextWidth);
  return Math.max(slope, 0);
}
