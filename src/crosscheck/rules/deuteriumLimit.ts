import type { PlanetRow, QuantityName } from "../../planets/quantity.ts";
import { JUPITER_MASS } from "../../units/constants.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";
import { positive } from "../significance.ts";

/** 11.0 to 16.3 Jupiter masses, by helium and metals (from memory). */
const DEUTERIUM_LIMIT = 13 * JUPITER_MASS;

const masses: readonly QuantityName[] = ["mass", "minimumMass"];

function test(row: PlanetRow): readonly Discrepancy[] {
  const name = masses.find((key) => row.quantities[key] && row.quantities[key].kind !== "upper-limit");
  const mass = name && row.quantities[name];
  if (!mass || !(mass.value > DEUTERIUM_LIMIT)) return [];
  const error = positive(mass.minus);
  return [
    {
      row,
      quantity: name,
      value: mass.value,
      expected: DEUTERIUM_LIMIT,
      significanceSigma: error && (mass.value - DEUTERIUM_LIMIT) / error,
      explanation: "a body of this mass burns deuterium: a brown dwarf by the usual definition",
      remedy: "leave it out of statements about planets",
    },
  ];
}

export const deuteriumLimit: RowRule = {
  id: "deuterium-limit",
  scope: "row",
  severity: "warning",
  claim: "The mass, or minimum mass, is below that at which deuterium burns",
  formula: "M ≤ 13 Jupiter masses",
  source: "Spiegel, Burrows & Milsom 2011, ApJ 727, 57",
  test,
};
