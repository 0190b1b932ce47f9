import { quantityRule } from "../quantityRule.ts";
import { hasBothErrors } from "../significance.ts";

export const limitWithUncertainties = quantityRule({
  id: "limit-with-uncertainties",
  severity: "warning",
  claim: "A value is a limit or has errors, not both",
  formula: "limit flag set ⇒ no errors",
  source: "definition",
  fault(quantity) {
    const marked = quantity.limitCoding === "flag" || quantity.limitCoding === "typed";
    return marked && hasBothErrors(quantity)
      ? "marked as a limit, but with errors on both sides like a measurement"
      : undefined;
  },
  remedy: "look up whether it is a limit or a measurement; until then it is used as neither",
});
