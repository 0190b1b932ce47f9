import { quantityRule } from "../quantityRule.ts";
import { isSilentMinimum } from "../silentMinimum.ts";

export const minimumMassFlagged = quantityRule({
  id: "minimum-mass-flagged",
  severity: "info",
  claim: "The mass column holds true masses",
  formula: "provenance ≠ M sin i",
  source: "the list's own provenance",
  among: ["mass"],
  fault: ({ kind }, row) =>
    kind === "minimum" && !isSilentMinimum(row) ? "the list itself says that this is M sin i" : undefined,
  remedy: "use it as a lower limit only",
});
