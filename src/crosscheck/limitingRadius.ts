import type { PlanetRow } from "../planets/quantity.ts";
import { testable } from "./relation.ts";
import { logErrors } from "./significance.ts";
import { undoSlip } from "./slipDiagnosis.ts";
import { unitSlips } from "./unitSlips.ts";

/** A measured radius against the radius that some body of the same mass would have. */
export interface RadiusComparison {
  readonly radius: number;
  readonly limit: number;
  /** Distance below the limit in combined errors of radius and mass; negative above it. */
  readonly sigmaBelow: number;
}

/** A model's radius [m] at a mass [kg], undefined beyond the model. */
export type RadiusModel = (mass: number) => number | undefined;

/** Compares a row's radius with a model's; undefined without mass, radius or model. */
export function compareRadius(row: PlanetRow, model: RadiusModel): RadiusComparison | undefined {
  const mass = testable(row, "mass");
  const radius = testable(row, "radius");
  const limit = mass && model(mass.value);
  if (!mass || !radius || !limit) return undefined;
  const below = Math.log(limit / radius.value);
  const massErrors = logErrors(mass);
  const towards = below > 0 ? -massErrors.minus : massErrors.plus;
  const radiusError = below > 0 ? logErrors(radius).plus : logErrors(radius).minus;
  const error = Math.hypot(radiusError, towards * slope(model, mass.value));
  return { radius: radius.value, limit, sigmaBelow: below / error };
}

/** d ln R / d ln M of a model; a third, that of constant density, at the model's very end. */
function slope(model: RadiusModel, mass: number): number {
  const step = 0.01;
  const [low, high] = [model(mass * (1 - step)), model(mass * (1 + step))];
  return low && high ? Math.log(high / low) / Math.log((1 + step) / (1 - step)) : 1 / 3;
}

/** Densities [kg m^-3] from the most tenuous planets known to iron under compression, as far as a slip is judged by them. */
const PLAUSIBLE_DENSITY = [100, 15e3] as const;

/** Unit slips of mass or radius that would give the row an unremarkable density, for an explanation; empty if none. */
export function slipsToPlausibleDensity(row: PlanetRow): string[] {
  const slips = unitSlips.filter((slip) => slip.quantity === "mass" || slip.quantity === "radius");
  return slips.filter((slip) => plausible(undoSlip(row, slip))).map((slip) => slip.words);
}

function plausible(row: PlanetRow): boolean {
  const { mass, radius } = row.quantities;
  if (!mass || !radius) return false;
  const density = mass.value / ((4 / 3) * Math.PI * radius.value ** 3);
  return density > PLAUSIBLE_DENSITY[0] && density < PLAUSIBLE_DENSITY[1];
}
