import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";

/** Planets found by the timing of another one's transits need not transit themselves. */
const TRANSIT = /transit(?!.*timing)/i;
/** Methods whose discovery already measures a mass, or a mass ratio. */
const WEIGHING = /radial|velocit|spectr|astrom|microlens|timing|ttv/i;

const without = (quantity: MeasuredQuantity | undefined) =>
  quantity?.kind === "no-uncertainty" && quantity.minus === undefined && quantity.plus === undefined;

function circular(row: PlanetRow, name: QuantityName, explanation: string): Discrepancy {
  return {
    row,
    quantity: name,
    value: row.quantities[name]?.value,
    explanation,
    remedy: "infer no composition from it unless the reference shows a measurement",
  };
}

function test(row: PlanetRow): readonly Discrepancy[] {
  const method = row.texts.discoveryMethod?.trim();
  if (!method) return [];
  const { mass, radius } = row.quantities;
  const found: Discrepancy[] = [];
  if (without(radius) && !TRANSIT.test(method)) {
    found.push(
      circular(row, "radius", `a radius without error of a planet found by ${method}: computed from the mass?`),
    );
  }
  if (without(mass) && !WEIGHING.test(method)) {
    found.push(circular(row, "mass", `a mass without error of a planet found by ${method}: computed from the radius?`));
  }
  return found;
}

export const relationUnflagged: RowRule = {
  id: "relation-unflagged",
  scope: "row",
  severity: "warning",
  claim: "A value without error is one that the discovery method can measure",
  formula: "σ missing ⇒ radius by transit, mass by velocities, timing, astrometry or lensing",
  source: "what each method measures",
  test,
};
