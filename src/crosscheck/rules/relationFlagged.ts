import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return Object.entries(row.quantities).flatMap(([name, { kind, value }]) =>
    kind === "from-relation"
      ? [
          {
            row,
            quantity: name as QuantityName,
            value,
            explanation: "the list itself says that this was computed from a relation",
            remedy: "infer no composition from it: that would be circular",
          },
        ]
      : [],
  );
}

export const relationFlagged: RowRule = {
  id: "relation-flagged",
  scope: "row",
  severity: "info",
  claim: "Values are measured, not computed from a mass–radius relation",
  formula: "provenance ≠ relation",
  source: "the list's own provenance",
  test,
};
