import type { QuadratureRule } from "../numerics/gaussLegendre.ts";
import { evaluateLegendreSeries, legendreSeries } from "../numerics/legendreSeries.ts";

export interface Panel {
  readonly from: number;
  readonly to: number;
}

/**
 * A density known at Gauss–Legendre nodes on panels, normalised: the probabilities of its nodes sum to 1, and the mean
 * of a smooth g is Σ probability g(node). Made by `densityQuadrature`.
 */
export class Density {
  /** ln ∫ exp(logDensity(x)) dx, before normalisation. */
  readonly logIntegral: number;
  readonly nodes: Float64Array;
  readonly probabilities: Float64Array;
  private readonly panels: readonly Panel[];
  private readonly rule: QuadratureRule;
  /** Normalised log-density at the nodes. */
  private readonly logDensities: Float64Array;

  /** ln of a factor of the density that vanishes somewhere, and is therefore not part of the polynomials. */
  private readonly logFactor: (x: number) => number;

  /** `peak` is taken off the log-density before any exponential, so that none underflows. */
  constructor(
    panels: readonly Panel[],
    logDensity: (x: number) => number,
    peak: number,
    rule: QuadratureRule,
    logFactor: (x: number) => number = () => 0,
  ) {
    const perPanel = rule.nodes.length;
    const count = panels.length * perPanel;
    this.panels = panels;
    this.rule = rule;
    this.logFactor = logFactor;
    this.nodes = new Float64Array(count);
    this.logDensities = new Float64Array(count);
    this.probabilities = new Float64Array(count);
    let total = 0;
    for (let at = 0; at < count; at++) {
      const i = at % perPanel;
      const { from, to } = panels[(at - i) / perPanel];
      const half = (to - from) / 2;
      this.nodes[at] = from + half * (1 + rule.nodes[i]);
      this.logDensities[at] = logDensity(this.nodes[at]) - peak;
      this.probabilities[at] = half * rule.weights[i] * Math.exp(this.logDensities[at] + logFactor(this.nodes[at]));
      total += this.probabilities[at];
    }
    const logTotal = Math.log(total);
    for (let at = 0; at < count; at++) {
      this.logDensities[at] -= logTotal;
      this.probabilities[at] /= total;
    }
    this.logIntegral = peak + logTotal;
  }

  /** The x below which lies the share `probability` (0 to 1) of the density. */
  quantile(probability: number): number {
    const perPanel = this.rule.nodes.length;
    const last = this.panels.length - 1;
    let below = 0;
    for (let p = 0; ; p++) {
      let inPanel = 0;
      for (let i = 0; i < perPanel; i++) inPanel += this.probabilities[p * perPanel + i];
      if (below + inPanel >= probability || p === last) return this.quantileInPanel(p, probability - below);
      below += inPanel;
    }
  }

  /** Places in every panel, ends included, with the density and the share below them; gaps between panels hold nothing. */
  tabulated(pieces: number): { x: Float64Array; density: Float64Array; below: Float64Array } {
    const perPanel = this.rule.nodes.length;
    const count = this.panels.length * (pieces + 1);
    const [x, density, below] = [new Float64Array(count), new Float64Array(count), new Float64Array(count)];
    let start = 0;
    this.panels.forEach(({ from, to }, p) => {
      const series = legendreSeries(this.rule, this.logDensities.subarray(p * perPanel, (p + 1) * perPanel));
      const at = (u: number): number => {
        const x = from + ((to - from) / 2) * (1 + u);
        return Math.exp(evaluateLegendreSeries(series, u) + this.logFactor(x));
      };
      const h = (to - from) / pieces;
      let share = start;
      for (let k = 0; k <= pieces; k++) {
        const n = p * (pieces + 1) + k;
        const u = -1 + (2 * k) / pieces;
        x[n] = k === pieces ? to : from + k * h;
        density[n] = at(u);
        if (k > 0) share += (h / 6) * (density[n - 1] + 4 * at(u - 1 / pieces) + density[n]);
        below[n] = share;
      }
      // Simpson's rule gives the shape within a panel, the Gauss–Legendre rule what the panel holds.
      let held = 0;
      for (let i = 0; i < perPanel; i++) held += this.probabilities[p * perPanel + i];
      for (let k = 0; k <= pieces; k++) {
        const n = p * (pieces + 1) + k;
        below[n] = start + ((below[n] - start) * held) / (share - start);
      }
      start += held;
    });
    return { x, density, below };
  }

  /** Bisection; between the nodes the log-density is the polynomial through them, as it is nearly straight. */
  private quantileInPanel(p: number, wanted: number): number {
    const { nodes, weights } = this.rule;
    const { from, to } = this.panels[p];
    const half = (to - from) / 2;
    const series = legendreSeries(this.rule, this.logDensities.subarray(p * nodes.length, (p + 1) * nodes.length));
    const shareBelow = (u: number): number => {
      let share = 0;
      for (let i = 0; i < nodes.length; i++) {
        const at = -1 + ((u + 1) / 2) * (1 + nodes[i]);
        const x = from + half * (1 + at);
        share += weights[i] * Math.exp(evaluateLegendreSeries(series, at) + this.logFactor(x));
      }
      return (share * half * (u + 1)) / 2;
    };
    let low = -1;
    let high = 1;
    for (let step = 0; step < 45; step++) {
      const middle = (low + high) / 2;
      if (shareBelow(middle) < wanted) low = middle;
      else high = middle;
    }
    return from + half * (1 + (low + high) / 2);
  }
}
