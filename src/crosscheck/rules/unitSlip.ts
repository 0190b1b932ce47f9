import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { compare, isViolated } from "../relation.ts";
import { relationRules } from "../relationRules.ts";
import type { RowRule } from "../rule.ts";
import { isRepaired, undoSlip } from "../slipDiagnosis.ts";
import { type UnitSlip, unitSlips } from "../unitSlips.ts";

const violations = (row: PlanetRow) =>
  relationRules
    .map(({ relation }) => compare(relation, row))
    .filter((found) => found !== undefined && isViolated(found));

function repairsAll(row: PlanetRow, slip: UnitSlip): boolean {
  const corrected = undoSlip(row, slip);
  return relationRules.every(({ relation }) => {
    const before = compare(relation, row);
    const after = compare(relation, corrected);
    if (!before || !after) return true;
    return isViolated(before) ? isRepaired(before, after) : !isViolated(after);
  });
}

function test(row: PlanetRow): readonly Discrepancy[] {
  const violated = violations(row);
  if (violated.length === 0) return [];
  const slips = unitSlips.filter((slip) => row.quantities[slip.quantity] && repairsAll(row, slip));
  const [first] = slips;
  if (!first) return [];
  const stated = row.quantities[first.quantity]?.value ?? Number.NaN;
  return [
    {
      row,
      quantity: first.quantity,
      value: stated,
      expected: stated * first.factor,
      significanceSigma: Math.max(...violated.map((found) => found?.significanceSigma ?? 0)),
      explanation: `one slip repairs every disagreement of the row: ${slips.map((slip) => slip.words).join("; or ")}`,
      remedy: "compare the units of these columns with the reference, for the whole list",
    },
  ];
}

/** The diagnosis behind one or several broken relations: a single factor that mends them all and breaks none. */
export const unitSlip: RowRule = {
  id: "unit-slip",
  scope: "row",
  severity: "error",
  claim: "No column of the row is off by a factor that lies between two units",
  formula: "317.8, 1047.6 (masses), 11.2, 9.7 (radii), 24, 365.25, 2π (period), 100 (gravity), 1000 (any)",
  source: "ratios of the IAU 2015 nominal masses and radii; the other relations of this list",
  test,
};
