import type { PlanetRow } from "../../planets/quantity.ts";
import { fractionPosterior } from "../fractionPosterior.ts";
import type { Measurement } from "../measurement.ts";
import { rowMeasurement } from "../rowMeasurement.ts";
import { type ExpectedLearning, expectedLearning, width68 } from "./expectedWidth.ts";
import { halve, type Improved } from "./improvementSteps.ts";
import type { PrecisionModels } from "./planetForecast.ts";
import { errorSizes, withErrors } from "./plannedMeasurement.ts";
import { type Contrast, contrastAt } from "./separation.ts";

/** A planet and what halving its errors would teach. */
export interface RankablePlanet {
  readonly row: PlanetRow;
  readonly reasons?: undefined;
  readonly measurement: Measurement;
  readonly contrast: Contrast;
  /** 68 % width of the family's fraction today. */
  readonly width68: number;
  readonly halved: readonly HalvedErrors[];
  /** The one of `halved` that narrows the interval most. */
  readonly best: HalvedErrors;
}

export interface HalvedErrors {
  readonly improved: Improved;
  readonly learning: ExpectedLearning;
}

export interface UnrankablePlanet {
  readonly row: PlanetRow;
  /** Codes of all reasons why the row cannot be used. */
  readonly reasons: readonly string[];
}

export type PlanetWorth = RankablePlanet | UnrankablePlanet;

/** What halving each of `choices` would teach about one planet of a list. Rows do not influence each other. */
export function planetWorth(row: PlanetRow, models: PrecisionModels, choices: readonly Improved[]): PlanetWorth {
  const { measurement, reasons } = rowMeasurement(row, models.range);
  if (reasons !== undefined) return { row, reasons };
  const { family, range } = models;
  const halved = choices.map((improved): HalvedErrors => {
    const planned = withErrors(measurement, halve(errorSizes(measurement), improved));
    return { improved, learning: expectedLearning(measurement, planned, family, range) };
  });
  return {
    row,
    measurement,
    contrast: contrastAt(models, measurement.mass.mode),
    width68: width68(fractionPosterior(measurement, family, range)),
    halved,
    best: halved.reduce((best, other) => (other.learning.width68 < best.learning.width68 ? other : best)),
  };
}

/** By how much the best of the halvings is expected to narrow the interval. */
export function expectedReduction({ width68, best }: RankablePlanet): number {
  return width68 - best.learning.width68;
}

/** Largest expected reduction first, equal ones in the order of the list; planets that cannot be ranked stand last. */
export function rankPlanets(planets: readonly PlanetWorth[]): PlanetWorth[] {
  const worth = (planet: PlanetWorth): number =>
    planet.reasons === undefined ? expectedReduction(planet) : Number.NEGATIVE_INFINITY;
  return [...planets].sort((p, q) => (worth(p) === worth(q) ? 0 : worth(q) - worth(p)));
}
