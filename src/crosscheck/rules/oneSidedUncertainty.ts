import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

const isLimit = ({ kind }: MeasuredQuantity) => kind === "upper-limit" || kind === "lower-limit";

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.quantities).flatMap(([name, quantity]) =>
    (quantity.minus === undefined) !== (quantity.plus === undefined) && !isLimit(quantity)
      ? [
          {
            row,
            quantity: name as QuantityName,
            value: quantity.value,
            explanation: `only the ${quantity.minus === undefined ? "upper" : "lower"} error is given`,
            remedy: "take the other error from the reference",
          },
        ]
      : [],
  );
}

export const oneSidedUncertainty: RowRule = {
  id: "one-sided-uncertainty",
  scope: "row",
  severity: "warning",
  claim: "Errors are given on both sides or on neither",
  formula: "σ− given ⇔ σ+ given",
  source: "definition",
  test,
};
