import { gaussLegendre, type QuadratureRule } from "../numerics/gaussLegendre.ts";
import { Density, type Panel } from "./density.ts";

/** How a density is cut into panels and integrated over them. */
export interface Quadrature {
  readonly rule: QuadratureRule;
  /** Parts whose log-density lies by more than this below the peak are left out. */
  readonly negligible: number;
  /**
   * Largest bend (second difference) and change of the log-density along a panel; a change that starts below the peak may
   * be larger by as much.
   */
  readonly maxBend: number;
  readonly maxChange: number;
}

/** A parabola that bends by 6 is a normal density 5 errors wide, which 10 nodes integrate to 1e-8. */
export const FINE: Quadrature = { rule: gaussLegendre(10), negligible: 21, maxBend: 6, maxChange: 12 };
/** Half the work for an error of 1e-4 at most: 8 nodes for a normal density 6 errors wide. */
export const COARSE: Quadrature = { rule: gaussLegendre(8), negligible: 14, maxBend: 10, maxChange: 14 };
/** Halvings of the first panels: enough for a peak 1e-12 of the range wide. */
const MAX_HALVINGS = 40;

/** A stretch of the range with the log-density at both ends and in the middle. */
interface SampledPanel extends Panel {
  readonly atFrom: number;
  readonly atMiddle: number;
  readonly atTo: number;
}

/**
 * Quadrature of exp(logDensity) between the first and the last of `edges` (rising): panels are halved until the
 * logarithm is nearly straight along each, then take a Gauss–Legendre rule. Working in the logarithm finds narrow
 * peaks (their flanks show from afar) and lets densities of exp(-10000) be integrated. Deterministic.
 *
 * The density may have a kink at an edge and should rise to one peak and fall again; further peaks are found if they
 * hold an edge or the middle between two. Relative error about 1e-9 for a normal density, in integral and quantiles.
 * `logFactor` is ln of a factor like (1 - x)^n, which vanishes at an end but needs no panels of its own.
 * Checked test/inference/densityQuadrature.test.ts
 */
export function densityQuadrature(
  logDensity: (x: number) => number,
  edges: readonly number[],
  how = FINE,
  logFactor?: (x: number) => number,
): Density {
  const { panels, peak } = resolvedPanels(logDensity, edges, how);
  return new Density(panels, logDensity, peak, how.rule, logFactor);
}

/** The `logIntegral` of `densityQuadrature` alone, for inner loops. */
export function logIntegral(logDensity: (x: number) => number, edges: readonly number[], how = FINE): number {
  return logIntegralAndMean(logDensity, edges, () => 0, how).logIntegral;
}

/** The same with ln of the mean, weighted by the density, of something given by its logarithm at the x last asked for. */
export function logIntegralAndMean(
  logDensity: (x: number) => number,
  edges: readonly number[],
  logOf: (x: number, logDensity: number) => number,
  how = FINE,
  logFactor?: (x: number) => number,
): { logIntegral: number; logMean: number } {
  const { panels, peak } = resolvedPanels(logDensity, edges, how);
  const { nodes, weights } = how.rule;
  let total = 0;
  let moment = 0;
  let scale = Number.NEGATIVE_INFINITY;
  for (const { from, to } of panels) {
    const half = (to - from) / 2;
    for (let i = 0; i < nodes.length; i++) {
      const x = from + half * (1 + nodes[i]);
      const log = logDensity(x);
      const factor = logFactor === undefined ? 0 : logFactor(x);
      const probability = half * weights[i] * Math.exp(log + factor - peak);
      const logValue = logOf(x, log);
      if (logValue > scale) {
        moment *= Math.exp(scale - logValue);
        scale = logValue;
      }
      total += probability;
      moment += probability * Math.exp(logValue - scale);
    }
  }
  return { logIntegral: peak + Math.log(total), logMean: scale + Math.log(moment / total) };
}

function resolvedPanels(
  logDensity: (x: number) => number,
  edges: readonly number[],
  how: Quadrature,
): { panels: Panel[]; peak: number } {
  let peak = Number.NEGATIVE_INFINITY;
  const sample = (x: number): number => {
    const value = logDensity(x);
    peak = Math.max(peak, value);
    return value;
  };
  const panel = (from: number, to: number, atFrom: number, atTo: number): SampledPanel => ({
    from,
    to,
    atFrom,
    atMiddle: sample((from + to) / 2),
    atTo,
  });
  // Between samples the density can be higher than at any of them only next to the highest, which no such panel touches.
  const negligible = (p: SampledPanel): boolean => highest(p) < peak - how.negligible;

  const atEdges = edges.map(sample);
  let open = edges.slice(1).map((to, i) => panel(edges[i], to, atEdges[i], atEdges[i + 1]));
  const resolved: SampledPanel[] = [];
  for (let halving = 0; open.length > 0; halving++) {
    const halves: SampledPanel[] = [];
    for (const p of open) {
      if (negligible(p)) continue;
      if (isResolved(p, peak, how) || halving === MAX_HALVINGS) resolved.push(p);
      else {
        const middle = (p.from + p.to) / 2;
        halves.push(panel(p.from, middle, p.atFrom, p.atMiddle), panel(middle, p.to, p.atMiddle, p.atTo));
      }
    }
    open = halves;
  }
  return { panels: resolved.filter((p) => !negligible(p)).sort((a, b) => a.from - b.from), peak };
}

function highest(p: SampledPanel): number {
  return Math.max(p.atFrom, p.atMiddle, p.atTo);
}

function isResolved(p: SampledPanel, peak: number, { maxBend, maxChange }: Quadrature): boolean {
  const change = Math.max(Math.abs(p.atTo - p.atFrom), Math.abs(p.atMiddle - p.atFrom));
  const depth = peak - highest(p);
  return change <= maxChange + depth && Math.abs(p.atFrom - 2 * p.atMiddle + p.atTo) <= maxBend + depth;
}
