import type { MassRange } from "../../curve/radiusCurve.ts";
import type { Density } from "../density.ts";
import { fractionEstimate, fractionPosterior, logLikelihood, type PlanetFamily } from "../fractionPosterior.ts";
import { type Measurement, massWindow } from "../measurement.ts";
import { atDeviation, type SplitNormal } from "../splitNormal.ts";

/** What a planned measurement is expected to teach about a mass fraction. */
export interface ExpectedLearning {
  /** Mean width of the central 68 % interval of the fraction. */
  readonly width68: number;
  /** Mean gain of information about the fraction over the present posterior [bit]. */
  readonly informationBits: number;
}

/** A value that may be quoted after the planned measurement, and its probability by the present one alone, up to a factor. */
interface FutureValue {
  readonly quantity: SplitNormal;
  readonly probability: number;
}

/** Standard deviations of the values to come, at which they are looked at: the trapezoidal rule, which suits normals. */
const LOOKED_AT = [-3, -2, -1, 0, 1, 2, 3];

/**
 * Expected 68 % width and information of a family's fraction once the errors of `present` have shrunk to those of
 * `planned`. The values that will then be quoted are not known: each one counts by its probability given all of the
 * present data and the family, which is the product of its probability by the quantity alone, of variance σ² - σ'²,
 * and the evidence of the posterior it leads to. An error that does not shrink keeps its quoted value.
 *   information = H(present posterior) - mean of H(future posterior)
 * Method  7-point trapezoidal rule for each error that shrinks; good to 0.5 % of the width, less for a planet that is
 *         3 errors away from all members. Exact update for normal errors; unequal ones keep their proportion
 * Checked test/inference/precision/expectedWidth.test.ts
 */
export function expectedLearning(
  present: Measurement,
  planned: Measurement,
  family: PlanetFamily,
  range: MassRange,
): ExpectedLearning {
  // A mass that no model describes is not among those to come.
  const masses = futureValues(present.mass, planned.mass).filter(({ quantity: { mode } }) => isWithin(range, mode));
  const futures = masses.flatMap((mass) =>
    futureValues(present.radius, planned.radius).map((radius) => {
      const measurement = { mass: mass.quantity, radius: radius.quantity };
      const posterior = fractionPosterior(measurement, family, range);
      const logWeight = Math.log(mass.probability * radius.probability) + posterior.logIntegral;
      return { logWeight, width: width68(posterior), entropy: entropy(posterior, measurement, family, range) };
    }),
  );
  const largest = Math.max(...futures.map(({ logWeight }) => logWeight));
  const weights = futures.map(({ logWeight }) => Math.exp(logWeight - largest));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const mean = (of: (future: (typeof futures)[number]) => number): number =>
    futures.reduce((sum, future, i) => sum + weights[i] * of(future), 0) / total;

  const now = entropy(fractionPosterior(present, family, range), present, family, range);
  return { width68: mean(({ width }) => width), informationBits: (now - mean((f) => f.entropy)) / Math.LN2 };
}

export function width68(posterior: Density): number {
  const { minus, plus } = fractionEstimate(posterior);
  return minus + plus;
}

function futureValues(present: SplitNormal, planned: SplitNormal): FutureValue[] {
  const factor = (planned.minus + planned.plus) / (present.minus + present.plus);
  if (!(factor < 1)) return [{ quantity: planned, probability: 1 }];
  const spread = Math.sqrt(1 - factor ** 2);
  const wide = { mode: present.mode, minus: spread * present.minus, plus: spread * present.plus };
  return LOOKED_AT.map((z) => {
    const errorOnThisSide = z === 0 ? (present.minus + present.plus) / 2 : z < 0 ? present.minus : present.plus;
    const probability = errorOnThisSide * Math.exp(-(z ** 2) / 2);
    return { quantity: { ...planned, mode: atDeviation(wide, z) }, probability };
  });
}

function isWithin({ lightest, heaviest }: MassRange, mass: number): boolean {
  return mass >= lightest && mass <= heaviest;
}

/** -∫ p ln p df [nat]. */
function entropy(posterior: Density, measurement: Measurement, family: PlanetFamily, range: MassRange): number {
  const masses = massWindow(measurement.mass, range);
  return posterior.nodes.reduce((sum, fraction, i) => {
    const logDensity = logLikelihood(measurement, family.member(fraction, masses), masses) - posterior.logIntegral;
    return sum - posterior.probabilities[i] * logDensity;
  }, 0);
}
