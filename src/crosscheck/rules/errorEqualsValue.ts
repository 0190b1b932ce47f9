import { nonZeroQuantities } from "../nonZeroQuantities.ts";
import { quantityRule } from "../quantityRule.ts";

export const errorEqualsValue = quantityRule({
  id: "error-equals-value",
  severity: "warning",
  claim: "A limit is not written as a value with an error of its own size",
  formula: "σ− ≠ value",
  source: "usage of published lists",
  among: nonZeroQuantities,
  fault: ({ value, minus, limitCoding }) =>
    limitCoding === "error-equals-value" || (value > 0 && minus === value)
      ? "the error is as large as the value, to the last digit: an upper limit written as a measurement"
      : undefined,
  remedy: "use it as the upper limit that it is",
});
