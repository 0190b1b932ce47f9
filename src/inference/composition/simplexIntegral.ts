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

/** What a component's fraction is integrated over: its share of what is left, or its logarithm. */
export interface FractionCoordinate {
  readonly edges: readonly number[];
  /** Whether it is the logarithm of the fraction. */
  readonly isLogarithm: boolean;
  fractionAt(x: number): number;
}

/**
 * The marginal density of a component's mass fraction under density times prior, for families of two components or
 * more. Nested Gauss–Legendre panels: over the component's own fraction, then over those of the others, each as a share of
 * what is left, the last of them being the rest. Log-uniform components are integrated over the logarithm between their
 * bounds. What is left is a factor of each inner integral; it is kept apart, as it vanishes where nothing is left.
 * Checked test/inference/composition/linearRelation.test.ts, weightedDraws.test.ts
 */
export function marginal(
  density: FractionDensity,
  prior: CompositionPrior,
  component: number,
  how: Quadrature,
): Marginal {
  const order = [component, ...logUniformFirst(prior).filter((k) => k !== component)];
  const isFlat = order.map((k) => prior.logUniform.every((entry) => entry.component !== k));
  /** Powers of what is left that the integrals from a place on hold: one for each that is flat, but for the rest. */
  const powers = order.map((_, n) => isFlat.slice(n, -1).filter(Boolean).length);
  const fractions = new Float64Array(prior.componentCount);
  const logWeights = new Map<number, number>();
  let logWeight = 0;

  /** ln of the integral over the components from place n on, which share `left`, without the power of `left`. */
  const integralFrom = (n: number, left: number): number => {
    if (n === order.length - 1) {
      fractions[order[n]] = left;
      const log = density.logDensity(fractions) + logPrior(prior, fractions);
      logWeight = density.logWeight();
      return log;
    }
    const coordinate = coordinateOf(prior, order[n], left);
    if (coordinate === undefined) return Number.NEGATIVE_INFINITY;
    const { along, logFactor } = integrand(coordinate, n, left);
    const result = logIntegralAndMean(along, coordinate.edges, () => logWeight, how, logFactor);
    logWeight = result.logMean;
    return result.logIntegral;
  };
  const integrand = ({ fractionAt, isLogarithm }: FractionCoordinate, n: number, left: number) => ({
    along: (x: number): number => {
      const fraction = fractionAt(x);
      fractions[order[n]] = fraction;
      // x is ln f there, and df = f dx.
      return integralFrom(n + 1, Math.max(0, left - fraction)) + (isLogarithm ? x : 0);
    },
    logFactor: powers[n + 1] === 0 ? undefined : (x: number) => powers[n + 1] * Math.log1p(-fractionAt(x) / left),
  });

  const coordinate = coordinateOf(prior, component, 1) as FractionCoordinate;
  const { along, logFactor } = integrand(coordinate, 0, 1);
  const remembering = (x: number): number => {
    const log = along(x);
    logWeights.set(x, logWeight);
    return log;
  };
  const over = densityQuadrature(remembering, coordinate.edges, how, logFactor);
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

const SHARES = [0, 0.5, 1];

/** Undefined if not even the least fraction of the component is left. */
function coordinateOf(prior: CompositionPrior, component: number, left: number): FractionCoordinate | undefined {
  const bounds = prior.logUniform.find((entry) => entry.component === component);
  if (bounds === undefined) return { edges: SHARES, isLogarithm: false, fractionAt: (x) => left * x };
  if (!(left > bounds.from)) return undefined;
  const [from, to] = [Math.log(bounds.from), Math.log(Math.min(bounds.to, left))];
  return { edges: [from, (from + to) / 2, to], isLogarithm: true, fractionAt: Math.exp };
}
