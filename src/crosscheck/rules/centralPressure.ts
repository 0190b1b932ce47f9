import type { PlanetRow } from "../../planets/quantity.ts";
import { G, GPA } from "../../units/constants.ts";
import type { Discrepancy } from "../finding.ts";
import { testable } from "../relation.ts";
import type { RowRule } from "../rule.ts";

/** Highest pressure at which the density of iron was measured: 1.4 TPa, Smith et al. 2018, Nature Astronomy 2, 452 (from memory). */
const MEASURED_TO = 1400 * GPA;

function test(row: PlanetRow): readonly Discrepancy[] {
  const mass = testable(row, "mass")?.value;
  const radius = testable(row, "radius")?.value;
  if (!mass || !radius) return [];
  const least = (3 * G * mass ** 2) / (8 * Math.PI * radius ** 4);
  if (!(least > MEASURED_TO)) return [];
  return [
    {
      row,
      quantity: "mass",
      value: mass,
      expected: radius ** 2 * Math.sqrt((8 * Math.PI * MEASURED_TO) / (3 * G)),
      explanation: `its centre is under at least ${Math.round(least / GPA)} GPa, whatever it is made of`,
      remedy: "take a composition inferred from these values as resting on extrapolated equations of state",
    },
  ];
}

/** Not a fault of the list, but a limit of what can be said about the row. */
export const centralPressure: RowRule = {
  id: "central-pressure",
  scope: "row",
  severity: "info",
  claim: "The centre is within the pressures at which iron has been measured (expected: the largest such mass)",
  formula: "P_c ≥ 3GM² / 8πR⁴ for any density that does not rise outwards; compared with 1400 GPa",
  source: "Chandrasekhar 1939, ch. III; Smith et al. 2018, Nature Astronomy 2, 452",
  test,
};
