import type { MassRange, RadiusCurve } from "../curve/radiusCurve.ts";
import { densityQuadrature } from "./densityQuadrature.ts";
import { type Measurement, massWindow } from "./measurement.ts";
import { atDeviation, deviation, shareBetween } from "./splitNormal.ts";

/** Where, in errors of the radius, panels over mass end, so that none holds a whole step of the radius probability. */
const STEP_EDGES = [-7, -4.5, -2.2, 0, 2.2, 4.5, 7];

/**
 * Probabilities that a planet lies below, between and above boundary curves R_1(M) <= R_2(M) <= …, smallest radius
 * first; one more than there are curves, summing to 1:
 *   P_i = ∫ p(M) [F(R_i(M)) - F(R_(i-1)(M))] dM,   R_0 = 0, R_(n+1) = ∞
 * p and F are the split-normal density of the mass and distribution of the radius as measured. This is the posterior
 * for a flat prior on true mass (over `range`) and true radius (above 0), independent of each other.
 * Method  Gauss–Legendre panels over mass, edges where a curve passes the measured radius; error about 1e-9
 * Checked test/inference/classProbabilities.test.ts
 */
export function classProbabilities(
  { mass, radius }: Measurement,
  boundaries: readonly RadiusCurve[],
  range: MassRange,
): number[] {
  const { lightest, heaviest } = massWindow(mass, range);
  const steps = boundaries.flatMap((curve) => STEP_EDGES.map((k) => curve.massWithRadius(atDeviation(radius, k))));
  const inner = [mass.mode, ...steps].filter((m) => m !== undefined && m > lightest && m < heaviest) as number[];
  const masses = densityQuadrature(
    (m) => -0.5 * deviation(mass, m) ** 2,
    [lightest, ...inner.sort((a, b) => a - b), heaviest],
  );

  const sums = new Array<number>(boundaries.length + 1).fill(0);
  masses.nodes.forEach((m, i) => {
    let lower = 0;
    boundaries.forEach((curve, b) => {
      const upper = curve.radius(m);
      sums[b] += masses.probabilities[i] * shareBetween(radius, lower, upper);
      lower = upper;
    });
    sums[boundaries.length] += masses.probabilities[i] * shareBetween(radius, lower, Number.POSITIVE_INFINITY);
  });
  // The radius is known to be positive, which the measured errors alone do not say.
  const total = sums.reduce((sum, value) => sum + value, 0);
  return sums.map((value) => value / total);
}
