import type { MassRange, RadiusCurve } from "../../curve/radiusCurve.ts";
import { gaussLegendre } from "../../numerics/gaussLegendre.ts";
import type { Density } from "../density.ts";
import { densityQuadrature, FINE } from "../densityQuadrature.ts";
import { logLikelihood } from "../fractionPosterior.ts";
import { type Measurement, massWindow } from "../measurement.ts";
import { atDeviation, deviation, type SplitNormal } from "../splitNormal.ts";
import type { CurvePair } from "./separation.ts";

/** What data that do not exist yet can be expected to say for the true one of two compositions. */
export interface ExpectedEvidence {
  /** Mean ln Bayes factor for A against B if the planet is A. */
  readonly ifA: number;
  /** Mean ln Bayes factor for B against A if the planet is B. */
  readonly ifB: number;
  /** sqrt(ifA + ifB): the `separation` of the linear formula wherever that holds. */
  readonly separation: number;
}

/** Data further from the truth than this many errors are left out: 7e-6 of a normal, in two panels of one rule each. */
const FARTHEST_DATA = 4.5;
/** ln of a Bayes factor is nearly quadratic in the data. */
const DATA_QUADRATURE = { ...FINE, rule: gaussLegendre(8) };

/**
 * The ln Bayes factor between two compositions, averaged over the data that a planet of `planned.mass.mode` would give
 * with the errors of `planned`; its radius does not enter:
 *   E_A[ln p(D|A)/p(D|B)],   p(D|C) = ∫ p(M_obs|M) p(R_obs|R_C(M)) dM,   flat prior on mass over `range`.
 * E_A + E_B is the divergence of Jeffreys 1946, Proc. R. Soc. A 186, 453, (from memory), which for normal errors and
 * straight, parallel curves is the square of the separation in sigma.
 * Method  Gauss–Legendre over both data, nested adaptive quadrature over mass; error about 1e-5
 * Checked test/inference/precision/expectedEvidence.test.ts
 */
export function expectedEvidence(planned: Measurement, { a, b }: CurvePair, range: MassRange): ExpectedEvidence {
  const ifA = expectedLogBayesFactor(planned, a, b, range);
  const ifB = expectedLogBayesFactor(planned, b, a, range);
  return { ifA, ifB, separation: Math.sqrt(ifA + ifB) };
}

function expectedLogBayesFactor(
  planned: Measurement,
  truth: RadiusCurve,
  rival: RadiusCurve,
  range: MassRange,
): number {
  const masses = expectedValues(planned.mass);
  const radii = expectedValues({ ...planned.radius, mode: truth.radius(planned.mass.mode) });
  let mean = 0;
  masses.nodes.forEach((mass, i) => {
    radii.nodes.forEach((radius, j) => {
      const data = { mass: { ...planned.mass, mode: mass }, radius: { ...planned.radius, mode: radius } };
      const window = massWindow(data.mass, range);
      const logBayesFactor = logLikelihood(data, truth, window) - logLikelihood(data, rival, window);
      mean += masses.probabilities[i] * radii.probabilities[j] * logBayesFactor;
    });
  });
  return mean;
}

/** The values that would be quoted for a true value: where its error bar reaches up far, so do its values fall short far. */
function expectedValues({ mode, minus, plus }: SplitNormal): Density {
  const quoted = { mode, minus: plus, plus: minus };
  return densityQuadrature(
    (x) => -0.5 * deviation(quoted, x) ** 2,
    [atDeviation(quoted, -FARTHEST_DATA), mode, atDeviation(quoted, FARTHEST_DATA)],
    DATA_QUADRATURE,
  );
}
