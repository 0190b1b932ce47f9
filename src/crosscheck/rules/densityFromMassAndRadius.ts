import { relationRule } from "../relationRule.ts";

/** Source  definition of mean density. */
export const densityFromMassAndRadius = relationRule(
  { quantity: "density", factor: 3 / (4 * Math.PI), powers: { mass: 1, radius: -3 } },
  {
    id: "density-mass-radius",
    claim: "The bulk density is that of the mass and radius beside it",
    formula: "ρ = 3M / 4πR³",
    source: "definition",
    otherwise: "density, mass and radius may come from different publications",
    remedy: "use mass and radius from one publication and compute the density from them",
  },
);
