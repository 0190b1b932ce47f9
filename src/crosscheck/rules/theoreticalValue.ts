import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

const needed: readonly QuantityName[] = ["mass", "radius", "density"];

function test(row: PlanetRow): readonly Discrepancy[] {
  return needed.flatMap((name) => {
    const quantity = row.quantities[name];
    if (quantity?.kind !== "theoretical") return [];
    return [
      {
        row,
        quantity: name,
        value: quantity.value,
        explanation: "the list itself says that this is from theory",
        remedy: "infer no composition from it",
      },
    ];
  });
}

export const theoreticalValue: RowRule = {
  id: "theoretical-value",
  scope: "row",
  severity: "info",
  claim: "Mass, radius and density are measured, not theoretical",
  formula: "provenance ≠ theory",
  source: "the list's own provenance",
  test,
};
