import { quantityColumns } from "./columnTable.ts";
import type { QuantityName } from "./quantity.ts";

/** Our own column name of a quantity, with its unit: `mass_earth`, `star_radius_sun`, `eccentricity`. */
export function ownColumn(quantity: QuantityName, unitId?: string): string {
  const { ownName, ownUnit } = quantityColumns[quantity];
  const unit = unitId ?? ownUnit;
  return unit === "" || unit === "1" ? ownName : `${ownName}_${unit.replace(/-/g, "_")}`;
}
