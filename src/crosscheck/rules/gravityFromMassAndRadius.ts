import { G } from "../../units/constants.ts";
import { relationRule } from "../relationRule.ts";

/** Source  Newton's law of gravity. */
export const gravityFromMassAndRadius = relationRule(
  { quantity: "surfaceGravity", factor: G, powers: { mass: 1, radius: -2 } },
  {
    id: "gravity-mass-radius",
    claim: "The surface gravity is that of the mass and radius beside it",
    formula: "g = GM / R²",
    source: "Newton's law of gravity",
    otherwise: "the gravity may be of another publication, or log g of the star",
    remedy: "use mass and radius from one publication and compute the gravity from them",
  },
);
