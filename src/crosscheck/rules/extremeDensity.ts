import type { MeasuredQuantity, PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { slipsToPlausibleDensity } from "../limitingRadius.ts";
import type { RowRule } from "../rule.ts";
import { logErrors } from "../significance.ts";

/** Beyond every rocky planet known, and what pure iron reaches near sixty Earth masses (from memory). */
const EXTREME = 30e3;

/** The density that a row states or, failing that, implies; limits included, since they are what is looked for. */
function densityOf({ density, mass, radius }: PlanetRow["quantities"]): number | undefined {
  if (density) return density.value;
  return mass && radius && radius.value > 0 ? mass.value / ((4 / 3) * Math.PI * radius.value ** 3) : undefined;
}

function test(row: PlanetRow): readonly Discrepancy[] {
  const density = densityOf(row.quantities);
  if (density === undefined || !(density > EXTREME)) return [];
  return [
    {
      row,
      quantity: "density",
      value: density,
      expected: EXTREME,
      significanceSigma: significance(density, row.quantities),
      explanation: explain(row),
      remedy: "do not take the density as measured before mass and radius are checked against the reference",
    },
  ];
}

function significance(value: number, { density, mass, radius }: PlanetRow["quantities"]): number | undefined {
  const below = (quantity: MeasuredQuantity) => logErrors(quantity).minus;
  if (density) return Math.log(value / EXTREME) / below(density);
  return mass && radius && Math.log(value / EXTREME) / Math.hypot(below(mass), 3 * logErrors(radius).plus);
}

function explain(row: PlanetRow): string {
  const { density, mass, radius } = row.quantities;
  const kinds = (density ? [density] : [mass, radius]).map((quantity) => quantity?.kind);
  if (kinds.includes("upper-limit") || kinds.includes("lower-limit")) return "mass, radius or density is only a limit";
  if (kinds.includes("from-relation")) return "the mass comes from a relation used outside its range";
  const slips = slipsToPlausibleDensity(row);
  return slips.length > 0 ? `would be ordinary if ${slips.join(", or if ")}` : "the body may be a brown dwarf";
}

export const extremeDensity: RowRule = {
  id: "extreme-density",
  scope: "row",
  severity: "info",
  claim: "The stated or implied density is below 30 g/cm³",
  formula: "ρ ≤ 30 000 kg/m³, from the density column or else 3M / 4πR³, limits included",
  source: "a threshold for attention, not a law: denser-than-iron holds the law",
  test,
};
