import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";
import { isSilentMinimum } from "../silentMinimum.ts";

/** At this inclination and above, mass and minimum mass agree within a per cent and equality says nothing. */
const EDGE_ON = Math.asin(0.99);

function test(row: PlanetRow): readonly Discrepancy[] {
  const { mass, minimumMass, inclination } = row.quantities;
  if (!mass || !minimumMass || !isSilentMinimum(row)) return [];
  if (inclination && Math.abs(inclination.value - Math.PI / 2) < Math.PI / 2 - EDGE_ON) return [];
  return [
    {
      row,
      quantity: "mass",
      value: mass.value,
      expected: inclination && minimumMass.value / Math.sin(inclination.value),
      explanation: inclination
        ? "equals the minimum mass although the orbit is inclined"
        : "equals the minimum mass, and no inclination is known",
      remedy: "use it as a lower limit only",
    },
  ];
}

export const minimumMassAsMass: RowRule = {
  id: "minimum-mass-as-mass",
  scope: "row",
  severity: "warning",
  claim: "The mass is not the minimum mass over again",
  formula: "M ≠ M sin i unless sin i ≥ 0.99",
  source: "definition",
  test,
};
