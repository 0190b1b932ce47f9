import type { PlanetRow } from "../planets/quantity.ts";
import { type Comparison, compare, isViolated, type Relation } from "./relation.ts";
import { type UnitSlip, unitSlips } from "./unitSlips.ts";

/** The row as it would read with the slip undone. */
export function undoSlip(row: PlanetRow, slip: UnitSlip): PlanetRow {
  const stated = row.quantities[slip.quantity];
  if (!stated) return row;
  const scale = (x: number | undefined) => (x === undefined ? undefined : x * slip.factor);
  const corrected = {
    ...stated,
    value: stated.value * slip.factor,
    minus: scale(stated.minus),
    plus: scale(stated.plus),
  };
  return { ...row, quantities: { ...row.quantities, [slip.quantity]: corrected } };
}

/** Whether undoing a slip explains a disagreement: what remains is no finding, and a small part of what was. */
export function isRepaired(before: Comparison, after: Comparison): boolean {
  return !isViolated(after) && Math.abs(after.logRatio) < Math.abs(before.logRatio) / 3;
}

/** The unit slips that would make a row obey a relation that it breaks. */
export function slipsThatRepair(relation: Relation, row: PlanetRow, broken: Comparison): UnitSlip[] {
  const involved = [relation.quantity, ...Object.keys(relation.powers)];
  return unitSlips.filter((slip) => {
    const after = involved.includes(slip.quantity) && compare(relation, undoSlip(row, slip));
    return after && isRepaired(broken, after);
  });
}
