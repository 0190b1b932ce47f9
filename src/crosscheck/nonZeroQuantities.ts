import type { QuantityName } from "../planets/quantity.ts";

/** Quantities that no planet has zero of, so that a value compatible with zero is a limit. */
export const nonZeroQuantities: readonly QuantityName[] = [
  "mass",
  "minimumMass",
  "radius",
  "density",
  "semiMajorAxis",
  "period",
];
