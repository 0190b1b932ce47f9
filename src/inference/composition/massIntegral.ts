import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";
import { logIntegral, logIntegralAndMean, type Quadrature } from "../densityQuadrature.ts";
import { logChiSquareAbove } from "./chiSquare.ts";
import { logMassPrior, type MassPrior, type PlanetLikelihood } from "./likelihood.ts";

/** What the data say of one composition. */
export interface Fit {
  /** ln ∫ L(M, R(M)) p(M) dM, but for the constant of the prior p. */
  readonly logLikelihood: number;
  /** ln of how probable data are that fit worse, over the masses as they are known then. */
  readonly logWorse: number;
}

/** Integrates the likelihood over the masses of a window along the curve of one composition. */
export function massIntegral(
  data: PlanetLikelihood,
  curve: RadiusCurve,
  window: MassRange,
  prior: MassPrior,
  how: Quadrature,
): Fit {
  const edges = edgesWithin(window, data.kinks(curve));
  const { logIntegral: logLikelihood, logMean } = logIntegralAndMean(
    (mass) => data.logLikelihood(mass, curve.radius(mass)) + logMassPrior(prior, mass),
    edges,
    (mass, logDensity) => logChiSquareAbove(-2 * (logDensity - logMassPrior(prior, mass)), data.dataCount),
    how,
  );
  return { logLikelihood, logWorse: logMean };
}

/** ln ∫ max_R L(M, R) p(M) dM: what a planet free to have any radius would give. */
export function logBestIntegral(data: PlanetLikelihood, window: MassRange, prior: MassPrior): number {
  const free: RadiusCurve = { ...window, radius: () => Number.NaN, massWithRadius: () => undefined };
  return logIntegral((mass) => data.logBest(mass) + logMassPrior(prior, mass), edgesWithin(window, data.kinks(free)));
}

function edgesWithin({ lightest, heaviest }: MassRange, kinks: readonly (number | undefined)[]): number[] {
  const inner = kinks.filter((m): m is number => m !== undefined && m > lightest && m < heaviest);
  return [lightest, ...inner.sort((a, b) => a - b), heaviest];
}
