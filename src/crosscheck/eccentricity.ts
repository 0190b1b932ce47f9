import type { PlanetRow } from "../planets/quantity.ts";
import { testable } from "./relation.ts";

/** Eccentricity for factors along the orbit: 0 where none is given, and below 1 whatever the list says. */
export function eccentricityOf(row: PlanetRow): number {
  return Math.min(testable(row, "eccentricity")?.value ?? 0, 0.99);
}
