import type { RadiusCurve } from "../../curve/radiusCurve.ts";
import { massWindow } from "../measurement.ts";
import { atDeviation, deviation, type SplitNormal } from "../splitNormal.ts";
import type { PlanetLikelihood } from "./likelihood.ts";

/** Errors of the mass beyond which little is left: panels that end there need not be looked into. */
const FAR = 5.3;

/** Mass [kg] and radius [m] as measured; their errors may be correlated, e.g. through the star. */
export interface CorrelatedMeasurement {
  readonly mass: SplitNormal;
  readonly radius: SplitNormal;
  /** Above -1 and below 1. */
  readonly correlation: number;
}

/**
 * Likelihood of a measured mass and radius, split-normal each, with the deviations z_M and z_R (in errors of their side)
 * correlated as those of a normal distribution of two variables:
 *   ln L = -(z_M² - 2 ρ z_M z_R + z_R²) / (2 (1 - ρ²))
 * Checked test/inference/composition/linearRelation.test.ts, weightedDraws.test.ts
 */
export function measuredLikelihood({ mass, radius, correlation }: CorrelatedMeasurement): PlanetLikelihood {
  const scale = -0.5 / (1 - correlation * correlation);
  const radiusBends = radius.minus !== radius.plus || correlation !== 0;
  return {
    logLikelihood: (m, r) => {
      const x = deviation(mass, m);
      const y = deviation(radius, r);
      return scale * (x * x - 2 * correlation * x * y + y * y);
    },
    logBest: (m) => -0.5 * deviation(mass, m) ** 2,
    massWindow: (range) => massWindow(mass, range),
    kinks: (curve: RadiusCurve) => [
      mass.mode,
      atDeviation(mass, -FAR),
      atDeviation(mass, FAR),
      radiusBends ? curve.massWithRadius(radius.mode) : undefined,
    ],
    dataCount: 2,
  };
}

/** Relative errors (one sigma) of a star and of what was measured relative to it. */
export interface SharedStar {
  readonly starMass: number;
  readonly starRadius: number;
  /** Of the star's mass and radius with each other. */
  readonly starCorrelation: number;
  /** Of the planet's mass and radius, the star's share included. */
  readonly mass: number;
  readonly radius: number;
}

/**
 * Correlation of a planet's mass and radius through its star, where M ∝ K M_*^(2/3) and R = (R/R_*) R_*, with K and R/R_*
 * measured independently of each other and of the star:
 *   ρ = (2/3) ρ_* (σ_M* / M_*) (σ_R* / R_*) / ((σ_M / M) (σ_R / R))
 * Source  velocity amplitude K ∝ M (M_* + M)^(-2/3): Kepler's third law, M much below M_*
 */
export function correlationThroughStar(errors: SharedStar): number {
  return (2 / 3) * errors.starCorrelation * ((errors.starMass * errors.starRadius) / (errors.mass * errors.radius));
}
