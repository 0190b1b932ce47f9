import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";
import { isSilentMinimum } from "../silentMinimum.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  const { mass } = row.quantities;
  if (mass?.kind !== "minimum" || isSilentMinimum(row)) return [];
  return [
    {
      row,
      quantity: "mass",
      value: mass.value,
      explanation: "the list itself says that this is M sin i",
      remedy: "use it as a lower limit only",
    },
  ];
}

export const minimumMassFlagged: RowRule = {
  id: "minimum-mass-flagged",
  scope: "row",
  severity: "info",
  claim: "The mass column holds true masses",
  formula: "provenance ≠ M sin i",
  source: "the list's own provenance",
  test,
};
