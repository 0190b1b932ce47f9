import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { nonZeroQuantities } from "../nonZeroQuantities.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return nonZeroQuantities.flatMap((name) => {
    const quantity = row.quantities[name];
    if (quantity?.limitCoding !== "zero-with-error") return [];
    return [
      {
        row,
        quantity: name,
        value: quantity.value,
        explanation: "0 with an upper error only: an upper limit written as a measurement",
        remedy: "use it as the upper limit that it is",
      },
    ];
  });
}

export const zeroPlusError: RowRule = {
  id: "zero-plus-error",
  scope: "row",
  severity: "warning",
  claim: "A limit is not written as a value of 0 with an upper error",
  formula: "0 +σ −0",
  source: "usage of published lists",
  test,
};
