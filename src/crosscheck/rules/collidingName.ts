import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { groupBy } from "../groupBy.ts";
import { foldCase, nameKey } from "../planetName.ts";
import type { ListRule } from "../rule.ts";

function test(rows: readonly PlanetRow[]): readonly Discrepancy[] {
  const groups = groupBy(rows, (row) => foldCase(nameKey(row.name)));
  return [...groups].flatMap(([key, group]) => {
    const spellings = new Set(group.map((row) => nameKey(row.name)));
    return key === "" || spellings.size === 1 ? [] : group.map((row) => describe(row, group));
  });
}

function describe(row: PlanetRow, group: readonly PlanetRow[]): Discrepancy {
  const others = group.filter((other) => nameKey(other.name) !== nameKey(row.name));
  return {
    row,
    quantity: "name",
    value: row.name,
    explanation: `differs from the name of row ${others.map((other) => other.row).join(", ")} in upper and lower case only`,
    remedy: "make sure that planet and companion star are not confused when lists are joined",
  };
}

export const collidingName: ListRule = {
  id: "colliding-name",
  scope: "list",
  severity: "warning",
  claim: "Names remain distinct when case is ignored",
  formula: "folded names differ where names differ",
  source: "many programs join lists without regard to case",
  test,
};
