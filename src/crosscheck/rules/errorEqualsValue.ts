import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { nonZeroQuantities } from "../nonZeroQuantities.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return nonZeroQuantities.flatMap((name) => {
    const quantity = row.quantities[name];
    const coded = quantity?.limitCoding === "error-equals-value";
    if (!quantity || !(coded || (quantity.value > 0 && quantity.minus === quantity.value))) return [];
    return [
      {
        row,
        quantity: name,
        value: quantity.value,
        significanceSigma: 1,
        explanation: "the error is as large as the value, to the last digit: an upper limit written as a measurement",
        remedy: "use it as the upper limit that it is",
      },
    ];
  });
}

export const errorEqualsValue: RowRule = {
  id: "error-equals-value",
  scope: "row",
  severity: "warning",
  claim: "A limit is not written as a value with an error of its own size",
  formula: "σ− ≠ value",
  source: "usage of published lists",
  test,
};
