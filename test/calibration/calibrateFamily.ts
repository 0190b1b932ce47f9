import type { MassRange } from "../../src/curve/radiusCurve.ts";
import { solveFamily } from "../../src/curve/solveFamily.ts";
import type { CompositionPosterior, FamilyModel } from "../../src/inference/composition/compositionPosterior.ts";
import { compositionPosterior } from "../../src/inference/composition/compositionPosterior.ts";
import { logPrior } from "../../src/inference/composition/compositionPrior.ts";
import { Distribution, type Interval } from "../../src/inference/composition/distribution.ts";
import { familyModel } from "../../src/inference/composition/familyModel.ts";
import type { PlanetLikelihood } from "../../src/inference/composition/likelihood.ts";
import { measuredLikelihood } from "../../src/inference/composition/measuredLikelihood.ts";
import { marginal } from "../../src/inference/composition/simplexIntegral.ts";
import { FINE } from "../../src/inference/densityQuadrature.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { type Family, familyMember } from "../../src/library/family.ts";
import { EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { type RandomNumbers, randomNumbers } from "../support/randomNumbers.ts";
import { drawFractions } from "./drawFractions.ts";
import { type FractionCalibration, fractionCalibration } from "./fractionCalibration.ts";

/** Fixed before the first run: the number of the paper, arXiv:1804.06788. */
export const SEED = 180406788;
/** Flat prior of true masses, of the simulation and of the inference alike. */
const MASSES: MassRange = { lightest: 2 * EARTH_MASS, heaviest: 16 * EARTH_MASS };
/** Errors are drawn log-uniformly between these: from the best measured planets to hardly measured ones. */
const MASS_ERRORS = [0.1 * EARTH_MASS, 0.5 * EARTH_MASS] as const;
const RADIUS_ERRORS = [0.02 * EARTH_RADIUS, 0.2 * EARTH_RADIUS] as const;
/** Pieces of a panel between which a marginal distribution is cubic. */
const PIECES = 16;

/** One simulated planet's true fraction, and what the posterior says of it. */
export interface RankedTruth {
  /** Posterior probability of a smaller fraction: uniform over many planets if the posterior is right. */
  readonly below: number;
  readonly in68: boolean;
  readonly in95: boolean;
}

export interface CalibrationOptions {
  /** What the inference takes the errors of the radius for, times their true size; 1 unless an error is put in on purpose. */
  readonly assumedRadiusError?: number;
  readonly angleSteps?: number;
}

/**
 * Simulation-based calibration of a family's posteriors: planets are drawn from the prior, solved and measured; over
 * many of them the true fraction must stand anywhere in its posterior alike, and lie in intervals as often as they claim.
 *
 * That holds only if planets are drawn from the very prior of the inference:
 *   - true masses are flat over the very range that the inference integrates over, not over a part of it;
 *   - the sizes of the errors are drawn without regard to the true planet (an error of 5 % of the true mass would itself
 *     tell of the mass, which the likelihood does not know);
 *   - no planet is left out, whatever was measured: a measured mass may lie outside the range of true masses. The
 *     lightest true mass is four of the largest errors, so that nearly all measured masses are such as a list could hold.
 * Truths are solved by the solver itself, not taken from the table of the inference, so the table is tested, too.
 * Source  Talts et al. 2018, arXiv:1804.06788, with the exact share below the truth instead of its rank among draws
 */
export function calibrateFamily(
  family: Family,
  planets: number,
  { assumedRadiusError = 1, angleSteps }: CalibrationOptions = {},
): FractionCalibration[] {
  const random = randomNumbers(SEED);
  const model = solvedModel(family, angleSteps);
  const { lightest, heaviest } = model.table;
  // Of two fractions the second is one minus the first, and so is the share below it.
  const ranked = family.components.length === 2 ? model.components.slice(0, 1) : model.components;
  const truths = ranked.map((): RankedTruth[] => []);
  for (let n = 0; n < planets; n++) {
    const fractions = drawFractions(model.prior, random);
    const mass = lightest + (heaviest - lightest) * random.uniform();
    const { radius } = solvePlanet(familyMember(family, fractions), mass);
    const data = measure(mass, radius, assumedRadiusError, random);
    const posterior = compositionPosterior(data, model, { lightest, heaviest });
    if (posterior === undefined) throw new Error(`planet ${n}: a planet of the family has no posterior`);
    truths.forEach((ranks, k) => void ranks.push(rankedTruth(fractions[k], k, posterior, model)));
  }
  return truths.map((ranks, k) => fractionCalibration(family.name, model.components[k], ranks));
}

function solvedModel(family: Family, angleSteps: number | undefined): FamilyModel {
  const radii = (fractions: readonly number[]) => (masses: readonly number[]) =>
    masses.map((mass) => solvePlanet(familyMember(family, fractions), mass).radius);
  return familyModel(family, solveFamily(radii, family.components.length, MASSES, { angleSteps }));
}

function measure(mass: number, radius: number, assumed: number, random: RandomNumbers): PlanetLikelihood {
  const logUniform = ([from, to]: readonly [number, number]): number => from * (to / from) ** random.uniform();
  const massError = logUniform(MASS_ERRORS);
  const radiusError = logUniform(RADIUS_ERRORS);
  const around = (value: number, error: number) => ({ mode: value, minus: error, plus: error });
  return measuredLikelihood({
    mass: around(mass + massError * random.normal(), massError),
    radius: around(radius + radiusError * random.normal(), radiusError * assumed),
    correlation: 0,
  });
}

/** The share comes from the joint density, the intervals from the summary: both are what users see. */
function rankedTruth(truth: number, k: number, posterior: CompositionPosterior, { prior }: FamilyModel): RankedTruth {
  const likelihood = {
    logDensity: (fractions: ArrayLike<number>) => posterior.logDensity(fractions) - logPrior(prior, fractions),
    logWeight: () => 0,
  };
  const { density, coordinate } = marginal(likelihood, prior, k, FINE);
  const distribution = new Distribution(density.tabulated(PIECES));
  const { within68, within95 } = posterior.fractions[k];
  return {
    below: shareBelow(truth, (share) => coordinate.fractionAt(distribution.quantile(share))),
    in68: isWithin(within68, truth),
    in95: isWithin(within95, truth),
  };
}

function isWithin({ lower, upper }: Interval, x: number): boolean {
  return lower <= x && x <= upper;
}

function shareBelow(x: number, quantile: (share: number) => number): number {
  let [low, high] = [0, 1];
  for (let step = 0; step < 30; step++) {
    const middle = (low + high) / 2;
    if (quantile(middle) < x) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
