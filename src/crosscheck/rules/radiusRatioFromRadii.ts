import { relationRule } from "../relationRule.ts";

/** Source  definition of the transit's radius ratio. */
export const radiusRatioFromRadii = relationRule(
  { quantity: "radiusRatio", factor: 1, powers: { radius: 1, starRadius: -1 } },
  {
    id: "radius-ratio",
    claim: "The radius ratio of the transit is that of the two radii",
    formula: "k = R / R★",
    source: "definition",
    otherwise:
      "the star's radius may have been revised since the transit was fitted, or the ratio may be a transit depth k²",
    remedy: "compute the planet's radius anew from the ratio and the newest stellar radius",
  },
);
