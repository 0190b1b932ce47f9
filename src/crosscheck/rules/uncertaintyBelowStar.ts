import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { RowRule } from "../rule.ts";
import { positive } from "../significance.ts";

/** Planet quantity, the star's it is measured in, and the power with which the star's error enters. */
const measuredIn: readonly (readonly [planet: QuantityName, star: QuantityName, power: number])[] = [
  ["radius", "starRadius", 1],
  ["mass", "starMass", 2 / 3],
  ["minimumMass", "starMass", 2 / 3],
];

/** Star and planet may come from papers of different precision; a factor of five is more than that. */
const FACTOR = 5;

function relativeError(quantity: MeasuredQuantity | undefined): number | undefined {
  const minus = positive(quantity?.minus);
  const plus = positive(quantity?.plus);
  return quantity && minus && plus && quantity.value > 0 ? (minus + plus) / (2 * quantity.value) : undefined;
}

function test(row: PlanetRow): readonly Discrepancy[] {
  return measuredIn.flatMap(([planet, star, power]) => {
    const own = relativeError(row.quantities[planet]);
    const least = (relativeError(row.quantities[star]) ?? 0) * power;
    if (own === undefined || !(own < least / FACTOR)) return [];
    return [
      {
        row,
        quantity: planet,
        value: row.quantities[planet]?.value,
        explanation: `known to ${percent(own)}, although the star it is measured in allows ${percent(least)} at best`,
        remedy: "check that the errors are not for another quantity, and add the star's",
      },
    ];
  });
}

const percent = (fraction: number) => `${Number((100 * fraction).toPrecision(2))} %`;

/** Radii are measured in stellar radii, masses by velocities in stellar masses to the power 2/3. */
export const uncertaintyBelowStar: RowRule = {
  id: "uncertainty-below-star",
  scope: "row",
  severity: "warning",
  claim: "A planet is not known much better than its star",
  formula: "σ_R/R ≥ σ_R★/R★ / 5 and σ_M/M ≥ ⅔ σ_M★/M★ / 5",
  source: "R = k R★ from the transit, M sin i ∝ K P^⅓ M★^⅔ from velocities",
  test,
};
