import { quantityRule } from "../quantityRule.ts";

export const relationFlagged = quantityRule({
  id: "relation-flagged",
  severity: "info",
  claim: "Values are measured, not computed from a mass–radius relation",
  formula: "provenance ≠ relation",
  source: "the list's own provenance",
  fault: ({ kind }) =>
    kind === "from-relation" ? "the list itself says that this was computed from a relation" : undefined,
  remedy: "infer no composition from it: that would be circular",
});
