import type { PlanetRow } from "../planets/quantity.ts";

/** Whether a row's mass is its minimum mass over again, and nothing says so; a reader may have noticed and set its kind. */
export function isSilentMinimum({ quantities: { mass, minimumMass }, texts }: PlanetRow): boolean {
  const stated = /sin|minimum/i.test(texts.massProvenance ?? "");
  return mass !== undefined && mass.value === minimumMass?.value && !stated;
}
