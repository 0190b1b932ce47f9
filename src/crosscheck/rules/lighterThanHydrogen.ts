import type { PlanetRow } from "../../planets/quantity.ts";
import { constants, G } from "../../units/constants.ts";
import type { Discrepancy } from "../finding.ts";
import { compareRadius, slipsToPlausibleDensity } from "../limitingRadius.ts";
import { testable } from "../relation.ts";
import type { PhysicalLimits, RowRule } from "../rule.ts";
import { SIGNIFICANT } from "../significance.ts";

/** Mean molar mass [kg/mol] of molecular hydrogen with the Sun's share of helium (from memory). */
const HYDROGEN_HELIUM = 2.3e-3;

/** Coldest interstellar temperature: no planet's gas is colder, so that a row without temperature is held to the least. */
const COLDEST = 2.725;

/**
 * Radius [m] of the sonic point of an isothermal wind, GMμ / 2R_gas T. Gas is not held hydrostatically beyond it, so
 * that no structure model, however hot inside, has a larger radius.
 * Source  Parker 1958, ApJ 128, 664
 */
function sonicRadius(mass: number, temperature: number): number {
  return (G * mass * HYDROGEN_HELIUM) / (2 * constants.gasConstant.value * temperature);
}

function test(row: PlanetRow, { hydrogenRadius = sonicRadius }: PhysicalLimits): readonly Discrepancy[] {
  const temperature = testable(row, "equilibriumTemperature")?.value ?? COLDEST;
  const comparison = compareRadius(row, (mass) => hydrogenRadius(mass, temperature));
  if (!comparison || !(comparison.sigmaBelow <= -SIGNIFICANT)) return [];
  const slips = slipsToPlausibleDensity(row);
  return [
    {
      row,
      quantity: "radius",
      value: comparison.radius,
      expected: comparison.limit,
      significanceSigma: -comparison.sigmaBelow,
      explanation:
        slips.length > 0
          ? `would fit if ${slips.join(", or if ")}`
          : "larger than a hydrogen–helium body of this mass and temperature can be",
      remedy: "check mass, radius and temperature against the reference",
    },
  ];
}

/** Uses `hydrogenRadius` where it is handed in, and otherwise the radius beyond which no gas is bound. */
export const lighterThanHydrogen: RowRule = {
  id: "lighter-than-hydrogen",
  scope: "row",
  severity: "error",
  claim: "No planet is larger than a hydrogen–helium body of its mass and temperature",
  formula: "R ≤ R_H/He(M, T) if a model is given, else R ≤ GMμ / 2kT with μ = 2.3 u",
  source: "Parker 1958, ApJ 128, 664",
  test,
};
