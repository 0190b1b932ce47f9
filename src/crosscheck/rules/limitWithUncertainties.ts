import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";
import { hasBothErrors } from "../significance.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.quantities).flatMap(([name, quantity]) =>
    (quantity.limitCoding === "flag" || quantity.limitCoding === "typed") && hasBothErrors(quantity)
      ? [
          {
            row,
            quantity: name as QuantityName,
            value: quantity.value,
            explanation: "marked as a limit, but with errors on both sides like a measurement",
            remedy: "look up whether it is a limit or a measurement; until then it is used as neither",
          },
        ]
      : [],
  );
}

export const limitWithUncertainties: RowRule = {
  id: "limit-with-uncertainties",
  scope: "row",
  severity: "warning",
  claim: "A value is a limit or has errors, not both",
  formula: "limit flag set ⇒ no errors",
  source: "definition",
  test,
};
