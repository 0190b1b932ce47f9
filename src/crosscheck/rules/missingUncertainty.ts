import { quantityRule } from "../quantityRule.ts";

export const missingUncertainty = quantityRule({
  id: "missing-uncertainty",
  severity: "info",
  claim: "Mass and radius, which a composition rests on, have errors",
  formula: "σ given",
  source: "definition",
  among: ["mass", "radius"],
  fault: ({ kind, minus, plus }) =>
    kind === "no-uncertainty" && minus === undefined && plus === undefined ? "no error is given" : undefined,
  remedy: "take the error from the reference; without one no composition follows",
});
