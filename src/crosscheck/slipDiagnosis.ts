import type { PlanetRow } from "../planets/quantity.ts";
import { compare, type Relation } from "./relation.ts";
import { type UnitSlip, unitSlips } from "./unitSlips.ts";

/** A slip explains a disagreement if what remains after undoing it would surprise nobody [standard errors]. */
const UNSURPRISING = 2;

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

/** The unit slips that would make a row obey a relation. */
export function slipsThatRepair(relation: Relation, row: PlanetRow): UnitSlip[] {
  const involved = [relation.quantity, ...Object.keys(relation.powers)];
  return unitSlips.filter((slip) => involved.includes(slip.quantity) && holds(relation, undoSlip(row, slip)));
}

function holds(relation: Relation, row: PlanetRow): boolean {
  const comparison = compare(relation, row);
  return comparison !== undefined && comparison.significanceSigma < UNSURPRISING;
}
