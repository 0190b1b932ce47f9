import type { Measurement } from "../measurement.ts";
import { errorSizes, isMeasured } from "./plannedMeasurement.ts";
import { requiredMassError, requiredRadiusError, requiredTogether } from "./requiredErrors.ts";
import type { Contrast, ErrorSizes } from "./separation.ts";

/** What is done to the errors. `mass` and `radius`: to one alone while the other stays; `both`: in a stated proportion. */
export type Improved = "mass" | "radius" | "both";

/** A pair of errors worth knowing the worth of. */
export interface ImprovementStep {
  /** How it is come to: today's errors, half of them, or just small enough for `level` sigma. */
  readonly kind: "now" | "halved" | "required";
  readonly improved?: Improved;
  readonly level?: number;
  /** Undefined where nothing that is done to `improved` reaches the level. */
  readonly errors?: ErrorSizes;
}

const IMPROVED: readonly Improved[] = ["mass", "radius", "both"];

/**
 * Today's errors; halved ones, if both are there; and for each level of sigma those that just reach it: each alone with
 * the other as it is, and both together in the proportion `massPerRadius`, relative mass error over relative radius error.
 */
export function improvementSteps(
  present: Measurement,
  contrast: Contrast,
  levels: readonly number[],
  massPerRadius: number,
): ImprovementStep[] {
  const now = errorSizes(present);
  const ratio = (massPerRadius * present.mass.mode) / present.radius.mode;
  const required = (level: number) =>
    IMPROVED.map(
      (improved): ImprovementStep => ({
        kind: "required",
        improved,
        level,
        errors: requiredErrors(contrast, now, level, improved, ratio),
      }),
    );
  const halved = IMPROVED.map(
    (improved): ImprovementStep => ({ kind: "halved", improved, errors: halve(now, improved) }),
  );
  const isWhole = isMeasured(present.mass) && isMeasured(present.radius);
  return [{ kind: "now", errors: now }, ...(isWhole ? halved : []), ...levels.flatMap(required)];
}

/** The proportion of the present relative errors, and 3 where one is missing: both then blur the density alike. */
export function presentProportion({ mass, radius }: Measurement): number {
  const errors = errorSizes({ mass, radius });
  const proportion = errors.mass / mass.mode / (errors.radius / radius.mode);
  return proportion > 0 && proportion < Number.POSITIVE_INFINITY ? proportion : 3;
}

export function halve({ mass, radius }: ErrorSizes, improved: Improved): ErrorSizes {
  return { mass: improved === "radius" ? mass : mass / 2, radius: improved === "mass" ? radius : radius / 2 };
}

function requiredErrors(
  contrast: Contrast,
  now: ErrorSizes,
  level: number,
  improved: Improved,
  ratio: number,
): ErrorSizes | undefined {
  if (improved === "both") return requiredTogether(contrast, level, ratio);
  if (improved === "mass") {
    const mass = requiredMassError(contrast, level, now.radius);
    return mass === undefined ? undefined : { mass, radius: now.radius };
  }
  const radius = requiredRadiusError(contrast, level, now.mass);
  return radius === undefined ? undefined : { mass: now.mass, radius };
}
