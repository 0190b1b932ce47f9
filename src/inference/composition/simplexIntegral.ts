import type { Density } from "../density.ts";
import { densityQuadrature, logIntegralAndMean, type Quadrature } from "../densityQuadrature.ts";
import { type CompositionPrior, logPrior } from "./compositionPrior.ts";

/** ln of a density over mass fractions. */
export interface FractionDensity {
  logDensity(fractions: ArrayLike<number>): number;
  /** ln of something whose mean is wanted, at the fractions last asked for. */
  logWeight(): number;
}

/** One component's mass fraction, the others integrated out. */
export interface Marginal {
  /** Over the component's `coordinate`; its `logIntegral` is that over all fractions. */
  readonly density: Density;
  readonly coordinate: FractionCoordinate;
  readonly logMeanWeight: number;
}

/** What a component's fraction is integrated over: the fraction itself, or its logarithm. */
export interface FractionCoordinate {
  readonly edges: readonly number[];
  fractionAt(x: number): number;
  /** ln of d fraction / dx. */
  logSlope(x: number): number;
}

/**
 * The marginal density of a component's mass fraction under density times prior, for families of two components or
 * more. Nested Gauss–Legendre panels over the fractions: the component's own, then those of the others, each from 0 to what
 * is left, the last of them being the rest. Log-uniform components are integrated over the logarithm between their bounds.
 * Checked test/inference/composition/simplexIntegral.test.ts
 */
export function marginal(
  density: FractionDensity,
  prior: CompositionPrior,
  component: number,
  how: Quadrature,
): Marginal {
  const others = logUniformFirst(prior).filter((k) => k !== component);
  const fractions = new Float64Array(prior.componentCount);
  const logWeights = new Map<number, number>();
  let logWeight = 0;

  /** ln of the integral over the components from place n of `others` on, which share `left` of the mass. */
  const rest = (n: number, left: number): number => {
    if (n === others.length - 1) {
      fractions[others[n]] = left;
      const log = density.logDensity(fractions) + logPrior(prior, fractions);
      logWeight = density.logWeight();
      return log;
    }
    const coordinate = coordinateOf(prior, others[n], left);
    if (coordinate === undefined) return Number.NEGATIVE_INFINITY;
    const result = logIntegralAndMean(along(coordinate, n, left), coordinate.edges, () => logWeight, how);
    logWeight = result.logMean;
    return result.logIntegral;
  };
  const along =
    ({ fractionAt, logSlope }: FractionCoordinate, n: number, left: number) =>
    (x: number): number => {
      const fraction = fractionAt(x);
      fractions[n < 0 ? component : others[n]] = fraction;
      return rest(n + 1, Math.max(0, left - fraction)) + logSlope(x);
    };

  const coordinate = coordinateOf(prior, component, 1) as FractionCoordinate;
  const outer = along(coordinate, -1, 1);
  const over = densityQuadrature(
    (x) => {
      const log = outer(x);
      logWeights.set(x, logWeight);
      return log;
    },
    coordinate.edges,
    how,
  );
  const atNodes = Array.from(over.nodes, (x) => logWeights.get(x) as number);
  const largest = Math.max(...atNodes);
  const mean = atNodes.reduce((sum, log, i) => sum + over.probabilities[i] * Math.exp(log - largest), 0);
  return { density: over, coordinate, logMeanWeight: largest + Math.log(mean) };
}

/** The components in an order in which the last one, taken as the rest, is not log-uniform. */
function logUniformFirst({ componentCount, logUniform }: CompositionPrior): number[] {
  const first = logUniform.map(({ component }) => component);
  const all = Array.from({ length: componentCount }, (_, k) => k);
  return [...first, ...all.filter((k) => !first.includes(k))];
}

/** Undefined if not even the least fraction of the component is left. */
function coordinateOf(prior: CompositionPrior, component: number, left: number): FractionCoordinate | undefined {
  const bounds = prior.logUniform.find((entry) => entry.component === component);
  if (bounds === undefined) {
    return { edges: [0, left / 2, left], fractionAt: (x) => x, logSlope: () => 0 };
  }
  if (!(left > bounds.from)) return undefined;
  const [from, to] = [Math.log(bounds.from), Math.log(Math.min(bounds.to, left))];
  return { edges: [from, (from + to) / 2, to], fractionAt: Math.exp, logSlope: (x) => x };
}
