import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { groupBy } from "../groupBy.ts";
import { nameKey } from "../planetName.ts";
import type { ListRule } from "../rule.ts";

/** Rows of one name are publications if their references differ, and a repeated row otherwise. */
function describe(row: PlanetRow, group: readonly PlanetRow[]): Discrepancy {
  const references = new Set(group.map(({ texts }) => texts.reference?.trim()).filter(Boolean));
  const publications = references.size === group.length;
  const others = group.filter((other) => other !== row).map((other) => other.row);
  return {
    row,
    quantity: "name",
    value: row.name,
    explanation: `${publications ? "further publications" : "the same name"} in ${rowsInWords(others)}`,
    remedy: publications ? "choose one publication per planet, or combine them" : "keep one of these rows",
    severity: publications ? "info" : undefined,
  };
}

function rowsInWords(rows: readonly number[]): string {
  return `${rows.length === 1 ? "row" : "rows"} ${rows.join(", ")}`;
}

function test(rows: readonly PlanetRow[]): readonly Discrepancy[] {
  const groups = groupBy(rows, (row) => nameKey(row.name));
  return [...groups].flatMap(([key, group]) =>
    key === "" || group.length === 1 ? [] : group.map((row) => describe(row, group)),
  );
}

export const duplicateName: ListRule = {
  id: "duplicate-name",
  scope: "list",
  severity: "warning",
  claim: "A planet stands in one row; several publications of it are only an info",
  formula: "names differ beyond blanks, dashes, padding and spelling of Greek letters",
  source: "definition",
  test,
};
