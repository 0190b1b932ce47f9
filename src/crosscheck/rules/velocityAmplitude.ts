import type { PlanetRow } from "../../planets/quantity.ts";
import { G } from "../../units/constants.ts";
import { eccentricityOf } from "../eccentricity.ts";
import { testable } from "../relation.ts";
import { relationRule } from "../relationRule.ts";

function eccentricFactor(row: PlanetRow): number {
  const eccentricity = eccentricityOf(row);
  const starMass = testable(row, "starMass")?.value ?? Number.POSITIVE_INFINITY;
  const planetMass = testable(row, "minimumMass")?.value ?? 0;
  return (1 + planetMass / starMass) ** (-2 / 3) / Math.sqrt(1 - eccentricity ** 2);
}

/** Source  e.g. Lovis & Fischer 2010, in Exoplanets (ed. Seager), eq. 14 (number from memory). */
export const velocityAmplitude = relationRule(
  {
    quantity: "velocityAmplitude",
    factor: (2 * Math.PI * G) ** (1 / 3),
    powers: { minimumMass: 1, starMass: -2 / 3, period: -1 / 3 },
    correction: eccentricFactor,
  },
  {
    id: "velocity-amplitude",
    claim: "The minimum mass is the one that velocity amplitude, period and stellar mass give",
    formula: "K = (2πG/P)^⅓ M sin i (M★ + M)^(−2/3) (1 − e²)^(−½)",
    source: "Lovis & Fischer 2010, in Exoplanets, ed. Seager",
    otherwise: "the star's mass may have been revised since the orbit was fitted",
    remedy: "compute the minimum mass anew from the amplitude and the newest stellar mass",
  },
);
