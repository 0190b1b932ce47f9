import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.quantities).flatMap(([name, { value, limitCoding }]) =>
    limitCoding === "zero-with-error"
      ? [
          {
            row,
            quantity: name as QuantityName,
            value,
            explanation: "0 with an upper error only: an upper limit written as a measurement",
            remedy: "use it as the upper limit that it is",
          },
        ]
      : [],
  );
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
