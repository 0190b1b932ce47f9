import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { compareRadius, slipsToPlausibleDensity } from "../limitingRadius.ts";
import type { PhysicalLimits, RowRule } from "../rule.ts";
import { SIGNIFICANT } from "../significance.ts";

function test(row: PlanetRow, { ironRadius }: PhysicalLimits): readonly Discrepancy[] {
  const comparison = ironRadius && compareRadius(row, ironRadius);
  if (!comparison || !(comparison.sigmaBelow > 0)) return [];
  const certain = comparison.sigmaBelow >= SIGNIFICANT;
  const slips = certain ? slipsToPlausibleDensity(row) : [];
  return [
    {
      row,
      quantity: "radius",
      value: comparison.radius,
      expected: comparison.limit,
      significanceSigma: comparison.sigmaBelow,
      explanation: slips.length > 0 ? `would fit if ${slips.join(", or if ")}` : unexplained(certain),
      remedy: certain
        ? "check mass and radius against the reference; no composition fits them"
        : "keep it, but let a composition be inferred from the whole distribution of mass and radius",
      severity: certain ? "error" : "info",
    },
  ];
}

const unexplained = (certain: boolean) =>
  certain
    ? "smaller than pure iron of this mass: mass or radius is wrong"
    : "smaller than pure iron of this mass, but within its errors";

/** Needs `ironRadius`; silent without it and beyond its range of masses. */
export const denserThanIron: RowRule = {
  id: "denser-than-iron",
  scope: "row",
  severity: "error",
  claim: "No planet is smaller than pure iron of its mass; within its errors (under 4 sigma) only an info",
  formula: "R ≥ R_iron(M)",
  source: "the iron of the composition library in use",
  test,
};
