import type { MassRange, RadiusCurve } from "../curve/radiusCurve.ts";
import type { Density } from "./density.ts";
import { densityQuadrature, logIntegral } from "./densityQuadrature.ts";
import { type Measurement, massWindow } from "./measurement.ts";
import { deviation } from "./splitNormal.ts";

/** Planets of every mass and every value, 0 to 1, of one mass fraction. */
export interface PlanetFamily extends MassRange {
  /** The curve of one fraction, at least over the masses of `within`. */
  member(fraction: number, within: MassRange): RadiusCurve;
}

/** A median and the central 68 % around it (16th to 84th percentile), as distances from the median. */
export interface FractionEstimate {
  readonly median: number;
  readonly minus: number;
  readonly plus: number;
}

/** First panels of the fraction; narrower peaks are found from their flanks. */
const FIRST_EDGES = [0, 0.25, 0.5, 0.75, 1];
/** Halvings that place the kink; what it is off by counts to the third power. */
const KINK_STEPS = 16;

/**
 * Posterior of a family's mass fraction f, given that the planet belongs to the family:
 *   p(f | M_obs, R_obs) ∝ ∫ p(M_obs | M) p(R_obs | R(M, f)) dM
 * with split-normal likelihoods. Prior: flat on f from 0 to 1 and flat on true mass over `range`. A planet that no
 * member fits piles up at 0 or 1: the posterior cannot say so, the class probabilities do.
 * Method  nested Gauss–Legendre panels; error about 1e-7 in a quantile
 * Checked test/inference/fractionPosterior.test.ts
 */
export function fractionPosterior(measurement: Measurement, family: PlanetFamily, range: MassRange): Density {
  const masses = massWindow(measurement.mass, range);
  const edges = [...FIRST_EDGES, ...fractionKinks(measurement, family, masses)].sort((a, b) => a - b);
  return densityQuadrature((f) => logLikelihood(measurement, family.member(f, masses), masses), edges);
}

export function fractionEstimate(posterior: Density): FractionEstimate {
  const median = posterior.quantile(0.5);
  return { median, minus: median - posterior.quantile(0.16), plus: posterior.quantile(0.84) - median };
}

/** ln ∫ p(M_obs | M) p(R_obs | R(M)) dM over `masses` for one composition, but for a constant that all share. */
export function logLikelihood({ mass, radius }: Measurement, curve: RadiusCurve, masses: MassRange): number {
  const kinks = [mass.mode, radius.minus === radius.plus ? undefined : curve.massWithRadius(radius.mode)];
  const inner = kinks.filter((m) => m !== undefined && m > masses.lightest && m < masses.heaviest) as number[];
  return logIntegral(
    (m) => -0.5 * (deviation(mass, m) ** 2 + deviation(radius, curve.radius(m)) ** 2),
    [masses.lightest, ...inner.sort((a, b) => a - b), masses.heaviest],
  );
}

/**
 * The fraction that gives a planet of the measured mass the measured radius, if there is one: where the errors of the
 * radius are unequal, and the mass well known, the posterior has a kink there.
 */
function fractionKinks({ mass, radius }: Measurement, family: PlanetFamily, masses: MassRange): number[] {
  if (radius.minus === radius.plus || !(mass.mode >= masses.lightest && mass.mode <= masses.heaviest)) return [];
  const excess = (f: number) => family.member(f, masses).radius(mass.mode) - radius.mode;
  const rising = excess(0) < 0;
  if (rising !== excess(1) > 0) return [];
  let low = 0;
  let high = 1;
  for (let step = 0; step < KINK_STEPS; step++) {
    const middle = (low + high) / 2;
    if (excess(middle) < 0 === rising) low = middle;
    else high = middle;
  }
  return [(low + high) / 2];
}
