import type { MassRange } from "../../curve/radiusCurve.ts";
import type { PlanetFamily } from "../fractionPosterior.ts";
import type { Measurement } from "../measurement.ts";
import { type ExpectedEvidence, expectedEvidence } from "./expectedEvidence.ts";
import { type ExpectedLearning, expectedLearning } from "./expectedWidth.ts";
import { type Improved, type ImprovementStep, improvementSteps } from "./improvementSteps.ts";
import { errorSizes, isMeasured, withErrors } from "./plannedMeasurement.ts";
import {
  type Contrast,
  type CurvePair,
  type ErrorSizes,
  type LimitingError,
  limitingError,
  massShare,
  separation,
} from "./separation.ts";

/** What planets are planned with. */
export interface PrecisionModels extends CurvePair {
  /** Its fraction is what a measurement teaches. */
  readonly family: PlanetFamily;
  /** Masses that all of them describe. */
  readonly range: MassRange;
}

/** A step and what it buys; a step that leads nowhere has `atMost` alone. */
export interface StepForecast extends ImprovementStep {
  readonly separation?: number;
  /** What the separation stays below, however small the improved error. */
  readonly atMost?: number;
  readonly limiting?: LimitingError;
  readonly massShare?: number;
  /** Without the assumptions of `separation`; only for finite errors. */
  readonly evidence?: ExpectedEvidence;
  /** Only if mass and radius are both measured today. */
  readonly learning?: ExpectedLearning;
}

/** Forecasts for one planet, one for each of `improvementSteps`. `contrast` is that of the models at its mass. */
export function forecastSteps(
  present: Measurement,
  contrast: Contrast,
  models: PrecisionModels,
  plan: { readonly levels: readonly number[]; readonly massPerRadius: number },
): StepForecast[] {
  const isWhole = isMeasured(present.mass) && isMeasured(present.radius);
  const now = errorSizes(present);
  return improvementSteps(present, contrast, plan.levels, plan.massPerRadius).map((step) => {
    if (step.errors === undefined) return { ...step, atMost: separation(contrast, without(now, step.improved)) };
    const planned = withErrors(present, step.errors);
    return {
      ...step,
      separation: separation(contrast, step.errors),
      limiting: limitingError(contrast, step.errors),
      massShare: massShare(contrast, step.errors),
      evidence: hasBoth(step.errors) ? expectedEvidence(planned, models, models.range) : undefined,
      learning: isWhole ? expectedLearning(present, planned, models.family, models.range) : undefined,
    };
  });
}

function without({ mass, radius }: ErrorSizes, improved?: Improved): ErrorSizes {
  return { mass: improved === "radius" ? mass : 0, radius: improved === "mass" ? radius : 0 };
}

function hasBoth({ mass, radius }: ErrorSizes): boolean {
  return mass + radius < Number.POSITIVE_INFINITY;
}
