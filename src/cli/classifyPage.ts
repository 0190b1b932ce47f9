import type { Estimate, FigurePlanet, FigureValue } from "../figures/figureSpec.ts";
import type { FractionEstimate } from "../inference/fractionPosterior.ts";
import type { MeasuredQuantity } from "../planets/quantity.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { ClassifiedRow } from "./classifyTable.ts";

/** What `figurePlanet(…).values` holds. */
export const planetColumns = [
  { title: "p denser than iron" },
  { title: "p iron to silicate" },
  { title: "p silicate to water" },
  { title: "p lighter than water" },
  { title: "Core mass fraction" },
  { title: "Water mass fraction" },
];

/** A classified row as the figure takes it. */
export function figurePlanet({ row, result }: ClassifiedRow, earthRadius: number): FigurePlanet {
  const { mass, radius } = row.quantities;
  return {
    name: row.name,
    mass: estimate(mass, EARTH_MASS),
    radius: estimate(radius, earthRadius),
    verdict: result.verdict?.code ?? null,
    statement: result.verdict?.statement ?? null,
    reason: result.reasons?.join(", ") ?? null,
    note: null,
    values: result.verdict
      ? [
          result.pDenserThanIron,
          result.pIronSilicate,
          result.pSilicateWater,
          result.pLighterThanWater,
          fraction(result.coreMassFraction),
          fraction(result.waterMassFraction),
        ]
      : planetColumns.map((): FigureValue => null),
  };
}

function estimate(quantity: MeasuredQuantity | undefined, unit: number): Estimate | null {
  if (quantity === undefined) return null;
  const { value, minus, plus } = quantity;
  return {
    value: value / unit,
    minus: minus === undefined ? null : minus / unit,
    plus: plus === undefined ? null : plus / unit,
  };
}

function fraction({ median, minus, plus }: FractionEstimate): Estimate {
  return { value: median, minus, plus };
}
