import type { MeasuredQuantity, PlanetRow, QuantityName } from "../planets/quantity.ts";

/** The quantities that a row holds. */
export function quantitiesOf(row: PlanetRow): [QuantityName, MeasuredQuantity][] {
  return Object.entries(row.quantities) as [QuantityName, MeasuredQuantity][];
}
