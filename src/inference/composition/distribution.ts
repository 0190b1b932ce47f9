import type { Marginal } from "./simplexIntegral.ts";

export interface Interval {
  readonly lower: number;
  readonly upper: number;
}

/** A mass fraction as it is known. */
export interface FractionSummary {
  readonly median: number;
  readonly mean: number;
  /** Highest-density intervals: the shortest that hold so much, in the logarithm for a log-uniform component. */
  readonly within68: Interval;
  readonly within95: Interval;
}

const HELD = { within68: 0.68, within95: 0.95 };
/** Pieces of a panel along which the distribution is a cubic: right to 1e-5 of it, which moves no interval visibly. */
const PIECES = 16;
/** Halvings of the share below a shortest interval. */
const HALVINGS = 40;

export function fractionSummary({ density, coordinate }: Marginal): FractionSummary {
  const { fractionAt } = coordinate;
  const known = new Distribution(density.tabulated(PIECES));
  const interval = (share: number): Interval => {
    const { lower, upper } = known.shortestInterval(share);
    return { lower: fractionAt(lower), upper: fractionAt(upper) };
  };
  let mean = 0;
  for (const [i, x] of density.nodes.entries()) mean += density.probabilities[i] * fractionAt(x);
  return {
    median: fractionAt(density.quantile(0.5)),
    mean,
    within68: interval(HELD.within68),
    within95: interval(HELD.within95),
  };
}

/** Rising places with the density there and the share below. */
export interface TabulatedDensity {
  readonly x: Float64Array;
  readonly density: Float64Array;
  readonly below: Float64Array;
}

/** A distribution in one variable, from its table; between the places the share below is the cubic that fits both ends. */
export class Distribution {
  private readonly table: TabulatedDensity;

  constructor(table: TabulatedDensity) {
    this.table = table;
  }

  quantile(share: number): number {
    return this.locate(share).x;
  }

  /** The shortest interval that holds a share; the highest-density one wherever the density has a single peak. */
  shortestInterval(share: number): Interval {
    let low = 0;
    let high = 1 - share;
    // The interval moves up as long as more is gained above than lost below.
    for (let step = 0; step < HALVINGS; step++) {
      const below = (low + high) / 2;
      if (this.locate(below + share).density > this.locate(below).density) low = below;
      else high = below;
    }
    // An end at the edge of what is possible is that edge.
    if (low === 0) return { lower: this.quantile(0), upper: this.quantile(share) };
    if (high === 1 - share) return { lower: this.quantile(1 - share), upper: this.quantile(1) };
    const below = (low + high) / 2;
    return { lower: this.quantile(below), upper: this.quantile(below + share) };
  }

  private locate(share: number): { x: number; density: number } {
    const { x, density, below } = this.table;
    let i = 0;
    let end = x.length - 1;
    while (end - i > 1) {
      const middle = (i + end) >> 1;
      if (below[middle] <= share) i = middle;
      else end = middle;
    }
    const h = x[i + 1] - x[i];
    const rise = below[i + 1] - below[i];
    const [d0, d1] = [density[i] * h, density[i + 1] * h];
    const quadratic = 3 * rise - 2 * d0 - d1;
    const cubic = d0 + d1 - 2 * rise;
    const wanted = share - below[i];
    let [low, high] = [0, 1];
    let u = rise > 0 ? wanted / rise : 0;
    for (let step = 0; step < 60 && high - low > 1e-15; step++) {
      const excess = u * (d0 + u * (quadratic + u * cubic)) - wanted;
      if (excess === 0) break;
      if (excess > 0) high = u;
      else low = u;
      const newton = u - excess / (d0 + u * (2 * quadratic + 3 * u * cubic));
      const next = newton > low && newton < high ? newton : (low + high) / 2;
      if (Math.abs(next - u) < 1e-15) break;
      u = next;
    }
    u = Math.min(1, Math.max(0, u));
    return { x: x[i] + u * h, density: (d0 + u * (2 * quadratic + 3 * u * cubic)) / h };
  }
}
