import type { CompositionTable } from "../../curve/familyTable.ts";
import type { MassRange } from "../../curve/radiusCurve.ts";
import { gaussLegendre } from "../../numerics/gaussLegendre.ts";
import { COARSE, FINE, type Quadrature } from "../densityQuadrature.ts";
import { type CompositionPrior, logPrior } from "./compositionPrior.ts";
import { type FractionSummary, fractionSummary } from "./distribution.ts";
import type { MassPrior, PlanetLikelihood } from "./likelihood.ts";
import { LikelihoodSurface } from "./likelihoodSurface.ts";
import { logBestIntegral, massIntegral } from "./massIntegral.ts";
import { type FractionDensity, marginal } from "./simplexIntegral.ts";

/** A family as inference sees it: its planets, and what is thought of them beforehand. */
export interface FamilyModel {
  readonly name: string;
  /** Names of the components, centre to surface. */
  readonly components: readonly string[];
  readonly table: CompositionTable;
  readonly prior: CompositionPrior;
  /** ln of the integral of `prior` over all fractions; see `logPriorIntegral`. */
  readonly logPriorIntegral: number;
}

/** What a planet can be made of, given that it belongs to a family. */
export interface CompositionPosterior {
  /** One for each component. */
  readonly fractions: readonly FractionSummary[];
  /**
   * ln of the likelihood averaged over the prior, with that of a planet free to have any radius as unit: 0 would be a
   * family all of whose members fit exactly. Differences between families are ln Bayes factors.
   */
  readonly logEvidence: number;
  /**
   * Posterior-predictive probability that measurements like these, of a planet of this family, fit worse:
   * the mean over the posterior of Q(χ²), of as many degrees of freedom as there are data. Near 0: no member fits.
   */
  readonly predictiveP: number;
  /** ln of the joint posterior density per unit of all fractions but one. */
  logDensity(fractions: ArrayLike<number>): number;
}

export interface PosteriorOptions {
  readonly massPrior?: MassPrior;
  /** Of the deviation √(-2 ln L) between the places where it is known; quantiles are met to about a hundredth of it. */
  readonly tolerance?: number;
}

const DEFAULT_TOLERANCE = 1e-2;
/** Panels of the nested integrals, whose densities are less like a normal one. */
const FINEST: Quadrature = { ...FINE, rule: gaussLegendre(16) };
/** From this tolerance on the coarser quadrature will do. */
const COARSE_FROM = 1e-3;

/**
 * The posterior of a family's mass fractions f and a planet's mass M, integrated over M in `range`:
 *   p(f | data) ∝ p(f) ∫ L(M, R(M, f)) p(M) dM
 * by deterministic quadrature. Prior on M flat (default) or log-flat over the range. Undefined if the data leave no mass
 * of the range.
 * Source  Gelman et al. 2013, Bayesian Data Analysis, 3rd ed., section 6.3 (posterior-predictive p)
 * Checked test/inference/composition/linearRelation.test.ts, weightedDraws.test.ts; test/calibration
 */
export function compositionPosterior(
  data: PlanetLikelihood,
  family: FamilyModel,
  range: MassRange,
  { massPrior = "flat", tolerance = DEFAULT_TOLERANCE }: PosteriorOptions = {},
): CompositionPosterior | undefined {
  const window = data.massWindow(range);
  if (!(window.lightest < window.heaviest)) return undefined;
  const { table, prior } = family;
  const how = tolerance < COARSE_FROM ? FINEST : COARSE;
  const fitOf = (fractions: ArrayLike<number>) =>
    massIntegral(data, table.member(fractions, window), window, massPrior, how);
  const unit = logBestIntegral(data, window, massPrior) + family.logPriorIntegral;
  if (table.componentCount === 1) {
    const { logLikelihood, logWorse } = fitOf([1]);
    const only = { median: 1, mean: 1, within68: { lower: 1, upper: 1 }, within95: { lower: 1, upper: 1 } };
    return {
      fractions: [only],
      logEvidence: logLikelihood - unit,
      predictiveP: Math.exp(logWorse),
      logDensity: () => 0,
    };
  }
  const surface = new LikelihoodSurface(table.componentCount, fitOf, tolerance);
  const marginals = family.components.map((_, k) =>
    marginal(k === 0 ? surface : withoutWeight(surface), prior, k, how),
  );
  const [{ density, logMeanWeight }] = marginals;
  return {
    fractions: marginals.map(fractionSummary),
    logEvidence: density.logIntegral - unit,
    predictiveP: Math.exp(logMeanWeight),
    logDensity: (fractions) => surface.logDensity(fractions) + logPrior(prior, fractions) - density.logIntegral,
  };
}

/** ln of the integral of a prior over all fractions. */
export function logPriorIntegral(prior: CompositionPrior): number {
  if (prior.componentCount === 1) return 0;
  return marginal({ logDensity: () => 0, logWeight: () => 0 }, prior, 0, FINEST).density.logIntegral;
}

function withoutWeight(density: FractionDensity): FractionDensity {
  return { logDensity: (fractions) => density.logDensity(fractions), logWeight: () => 0 };
}
