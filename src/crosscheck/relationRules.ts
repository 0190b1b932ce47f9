import type { RelationRule } from "./relationRule.ts";
import { densityFromMassAndRadius } from "./rules/densityFromMassAndRadius.ts";
import { gravityFromMassAndRadius } from "./rules/gravityFromMassAndRadius.ts";
import { insolationFromStar } from "./rules/insolationFromStar.ts";
import { keplerThirdLaw } from "./rules/keplerThirdLaw.ts";
import { massBelowMinimum } from "./rules/massBelowMinimum.ts";
import { radiusRatioFromRadii } from "./rules/radiusRatioFromRadii.ts";
import { rocheDensity } from "./rules/rocheDensity.ts";
import { scaledAxisFromOrbit } from "./rules/scaledAxisFromOrbit.ts";
import { starDensityFromMassAndRadius } from "./rules/starDensityFromMassAndRadius.ts";
import { starDensityFromTransit } from "./rules/starDensityFromTransit.ts";
import { temperatureFromInsolation } from "./rules/temperatureFromInsolation.ts";
import { temperatureFromStar } from "./rules/temperatureFromStar.ts";
import { velocityAmplitude } from "./rules/velocityAmplitude.ts";

/** The rules that are laws between columns; together they show which column is at fault. */
export const relationRules: readonly RelationRule[] = [
  densityFromMassAndRadius,
  gravityFromMassAndRadius,
  keplerThirdLaw,
  insolationFromStar,
  temperatureFromStar,
  temperatureFromInsolation,
  radiusRatioFromRadii,
  scaledAxisFromOrbit,
  starDensityFromMassAndRadius,
  starDensityFromTransit,
  velocityAmplitude,
  massBelowMinimum,
  rocheDensity,
];
