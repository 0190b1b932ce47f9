import type { MeasuredQuantity, QuantityName } from "./quantity.ts";

/** Fills in what a row does not give but its other columns imply. */
export function deriveQuantities(quantities: Partial<Record<QuantityName, MeasuredQuantity>>): void {
  const { mass, minimumMass } = quantities;
  if (mass === undefined && minimumMass !== undefined) {
    quantities.mass = { ...minimumMass, kind: "minimum", derivedFrom: "minimum mass" };
  }
}
