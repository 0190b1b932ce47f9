import { quantityRule } from "../quantityRule.ts";

export const theoreticalValue = quantityRule({
  id: "theoretical-value",
  severity: "info",
  claim: "Mass, radius and density are measured, not theoretical",
  formula: "provenance ≠ theory",
  source: "the list's own provenance",
  among: ["mass", "radius", "density"],
  fault: ({ kind }) => (kind === "theoretical" ? "the list itself says that this is from theory" : undefined),
  remedy: "infer no composition from it",
});
