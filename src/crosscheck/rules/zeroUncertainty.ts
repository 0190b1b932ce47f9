import { quantityRule } from "../quantityRule.ts";

export const zeroUncertainty = quantityRule({
  id: "zero-uncertainty",
  severity: "warning",
  claim: "No error is zero",
  formula: "σ > 0",
  source: "no measurement is exact",
  fault: ({ minus, plus, limitCoding }) =>
    (minus === 0 || plus === 0) && limitCoding !== "zero-with-error"
      ? "a stated error of 0: rounded away, or standing for a missing one"
      : undefined,
  remedy: "take the error from the reference; the value cannot be weighted",
});
