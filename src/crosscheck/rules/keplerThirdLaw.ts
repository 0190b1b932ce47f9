import type { PlanetRow } from "../../planets/quantity.ts";
import { G } from "../../units/constants.ts";
import { testable } from "../relation.ts";
import { relationRule } from "../relationRule.ts";

/** Part of the total mass that is the star's. */
function starShare(row: PlanetRow): number {
  const star = testable(row, "starMass")?.value ?? 0;
  const planet = testable(row, "mass")?.value ?? 0;
  return star > 0 ? star / (star + planet) : 1;
}

/**
 * Kepler's third law as the stellar mass that the orbit implies, so that the ratio reads as one of masses.
 * Source  Newton 1687; e.g. Murray & Dermott 1999, Solar System Dynamics, eq. 2.22 (number from memory)
 */
export const keplerThirdLaw = relationRule(
  {
    quantity: "starMass",
    factor: (4 * Math.PI ** 2) / G,
    powers: { semiMajorAxis: 3, period: -2 },
    correction: starShare,
  },
  {
    id: "kepler-third-law",
    claim: "Period and semi-major axis belong to an orbit around a star of the stated mass",
    formula: "M★ + M = 4π²a³ / GP²",
    source: "Kepler's third law in Newton's form",
    otherwise:
      "the host may be a close binary with only one star's mass given, the axis a projected separation, or the values from different publications",
    remedy: "take the period as given and compute the axis from it, after checking the star's mass",
  },
);
