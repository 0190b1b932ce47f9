import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { quantitiesOf } from "../quantitiesOf.ts";
import type { RowRule } from "../rule.ts";
import { significantDigits } from "../written.ts";

/** Four digits agree by chance once in some thousand pairs of like size; three do so too often to be a warning. */
const ENOUGH_DIGITS = 4;

/** Two columns of one thing may agree: mass and minimum mass have a rule of their own. */
const alike = (a: QuantityName, b: QuantityName) => [a, b].every((name) => name === "mass" || name === "minimumMass");

function test(row: PlanetRow): readonly Discrepancy[] {
  const seen = new Map<number, QuantityName>();
  const found: Discrepancy[] = [];
  for (const [name, { written }] of quantitiesOf(row)) {
    if (written === undefined || significantDigits(written).length < ENOUGH_DIGITS) continue;
    const earlier = seen.get(Number(written));
    if (earlier && !alike(earlier, name)) found.push(repeated(row, name, earlier));
    seen.set(Number(written), name);
  }
  return found;
}

function repeated(row: PlanetRow, name: QuantityName, earlier: QuantityName): Discrepancy {
  return {
    row,
    quantity: name,
    value: row.quantities[name]?.value,
    explanation: `the cell repeats, digit for digit, that of ${row.quantities[earlier]?.origin.column}`,
    remedy: "look both values up in the reference; one of the two cells was copied",
  };
}

/** A cell pasted into the wrong column. */
export const repeatedValue: RowRule = {
  id: "repeated-value",
  scope: "row",
  severity: "warning",
  claim: "No cell repeats the number of another column",
  formula: "equal numbers as typed, with four significant digits or more",
  source: "coincidence of four digits",
  test,
};
