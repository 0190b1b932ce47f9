import { relationRule } from "../relationRule.ts";

/** Source  sin i ≤ 1. */
export const massBelowMinimum = relationRule(
  {
    quantity: "mass",
    factor: 1,
    powers: { minimumMass: 1 },
    allowed: () => [1, Number.POSITIVE_INFINITY],
  },
  {
    id: "mass-below-minimum",
    claim: "The mass is at least the minimum mass",
    formula: "M ≥ M sin i",
    source: "sin i ≤ 1",
    otherwise: "mass and minimum mass come from different publications",
    remedy: "use the newer of the two and leave out the other",
  },
);
