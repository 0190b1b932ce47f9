import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

/** The two that a composition rests on. */
const needed: readonly QuantityName[] = ["mass", "radius"];

function test(row: PlanetRow): readonly Discrepancy[] {
  return needed.flatMap((name) => {
    const quantity = row.quantities[name];
    if (quantity?.kind !== "no-uncertainty" || quantity.minus !== undefined || quantity.plus !== undefined) return [];
    return [
      {
        row,
        quantity: name,
        value: quantity.value,
        explanation: "no error is given",
        remedy: "take the error from the reference; without one no composition follows",
      },
    ];
  });
}

export const missingUncertainty: RowRule = {
  id: "missing-uncertainty",
  scope: "row",
  severity: "info",
  claim: "Mass and radius have errors",
  formula: "σ given",
  source: "definition",
  test,
};
