import { nonZeroQuantities } from "../nonZeroQuantities.ts";
import { quantityRule } from "../quantityRule.ts";

export const zeroPlusError = quantityRule({
  id: "zero-plus-error",
  severity: "warning",
  claim: "A limit is not written as a value of 0 with an upper error",
  formula: "0 +σ −0",
  source: "usage of published lists",
  among: nonZeroQuantities,
  fault: ({ limitCoding }) =>
    limitCoding === "zero-with-error"
      ? "0 with an upper error only: an upper limit written as a measurement"
      : undefined,
  remedy: "use it as the upper limit that it is",
});
