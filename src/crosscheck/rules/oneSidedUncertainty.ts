import { quantityRule } from "../quantityRule.ts";

export const oneSidedUncertainty = quantityRule({
  id: "one-sided-uncertainty",
  severity: "warning",
  claim: "Errors are given on both sides or on neither",
  formula: "σ− given ⇔ σ+ given",
  source: "definition",
  fault({ kind, minus, plus }) {
    if (kind === "upper-limit" || kind === "lower-limit") return undefined;
    if ((minus === undefined) === (plus === undefined)) return undefined;
    return `only the ${minus === undefined ? "upper" : "lower"} error is given`;
  },
  remedy: "take the other error from the reference",
});
