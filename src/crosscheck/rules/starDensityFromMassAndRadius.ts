import { relationRule } from "../relationRule.ts";

/** Source  definition of mean density. */
export const starDensityFromMassAndRadius = relationRule(
  { quantity: "starDensity", factor: 3 / (4 * Math.PI), powers: { starMass: 1, starRadius: -3 } },
  {
    id: "star-density",
    claim: "The star's density is that of its mass and radius",
    formula: "ρ★ = 3M★ / 4πR★³",
    source: "definition",
    otherwise:
      "the density may be that of the transit, and the orbit eccentric or the transit blended with another star",
    remedy: "use star and transit of one publication; if they disagree there, distrust the planet's radius",
  },
);
