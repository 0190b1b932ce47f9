import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.quantities).flatMap(([name, { value, minus, plus, limitCoding }]) =>
    (minus === 0 || plus === 0) && limitCoding !== "zero-with-error"
      ? [
          {
            row,
            quantity: name as QuantityName,
            value,
            explanation: "a stated error of 0: rounded away, or standing for a missing one",
            remedy: "take the error from the reference; the value cannot be weighted",
          },
        ]
      : [],
  );
}

export const zeroUncertainty: RowRule = {
  id: "zero-uncertainty",
  scope: "row",
  severity: "warning",
  claim: "No error is zero",
  formula: "σ > 0",
  source: "no measurement is exact",
  test,
};
