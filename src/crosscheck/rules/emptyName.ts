import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { nameKey } from "../planetName.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  if (nameKey(row.name) !== "") return [];
  return [
    {
      row,
      quantity: "name",
      value: row.name,
      explanation: "the row has no name",
      remedy: "name it, or it cannot be matched with another list",
    },
  ];
}

export const emptyName: RowRule = {
  id: "empty-name",
  scope: "row",
  severity: "warning",
  claim: "Every row is named",
  formula: "name ≠ blank",
  source: "definition",
  test,
};
