import type { PlanetRow } from "../../planets/quantity.ts";
import { G } from "../../units/constants.ts";
import { eccentricityOf } from "../eccentricity.ts";
import { relationRule } from "../relationRule.ts";

/** A scaled axis fitted for a circular orbit is off with the speed at transit, anywhere along an eccentric one. */
function eccentricTransit(row: PlanetRow): [number, number] {
  const eccentricity = eccentricityOf(row);
  const most = ((1 + eccentricity) / Math.sqrt(1 - eccentricity ** 2)) ** 3;
  return [1 / most, most];
}

/** Source  Seager & Mallén-Ornelas 2003, ApJ 585, 1038; eccentric orbits Kipping 2010, MNRAS 407, 301 (from memory). */
export const starDensityFromTransit = relationRule(
  {
    quantity: "starDensity",
    factor: (3 * Math.PI) / G,
    powers: { scaledAxis: 3, period: -2 },
    allowed: eccentricTransit,
  },
  {
    id: "star-density-transit",
    claim: "The star's density is the one that scaled axis and period imply",
    formula: "ρ★ = 3π (a/R★)³ / GP², up to ((1 + e)/√(1 − e²))³ either way",
    source: "Seager & Mallén-Ornelas 2003, ApJ 585, 1038",
    otherwise: "the transit may be blended with another star, or the scaled axis fitted with another period",
    remedy: "distrust the planet's radius until the star is known",
  },
);
