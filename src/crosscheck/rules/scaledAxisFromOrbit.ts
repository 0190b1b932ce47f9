import { relationRule } from "../relationRule.ts";

/** Source  definition of the scaled axis. */
export const scaledAxisFromOrbit = relationRule(
  { quantity: "scaledAxis", factor: 1, powers: { semiMajorAxis: 1, starRadius: -1 } },
  {
    id: "scaled-axis",
    claim: "The scaled axis of the transit is the ratio of semi-major axis to stellar radius",
    formula: "a/R★",
    source: "definition",
    otherwise: "the star's radius may have been revised since the transit was fitted",
    remedy: "use star and transit of one publication",
  },
);
