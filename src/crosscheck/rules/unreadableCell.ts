import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

function test(row: PlanetRow): readonly Discrepancy[] {
  return row.issues.map(({ origin, found, message }) => ({
    row,
    quantity: "cell",
    value: found,
    explanation: message,
    remedy: `compare column ${origin.column} in line ${origin.line} with the source of the list`,
  }));
}

/** What the reader could not take as a value, so that nothing a list holds is dropped in silence. */
export const unreadableCell: RowRule = {
  id: "unreadable-cell",
  scope: "row",
  severity: "warning",
  claim:
    "Every cell of a column with numbers is a number, a limit or empty, and every row has as many cells as the header",
  formula: "as read",
  source: "definition",
  test,
};
