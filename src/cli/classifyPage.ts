import type { Estimate, FigurePlanet, FigureValue } from "../figures/figureSpec.ts";
import { twoReadingsWarning } from "../figures/massRadiusFigure.ts";
import type { FractionEstimate } from "../inference/fractionPosterior.ts";
import { CLASS_CODES, classPhrases } from "../inference/verdict.ts";
import type { Composition } from "../library/composition.ts";
import type { MeasuredQuantity } from "../planets/quantity.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { Comparison } from "./classification.ts";
import type { ClassifiedRow } from "./classifyTable.ts";
import type { PlanetPart } from "./massRadiusPage.ts";

const columns = [
  { title: "p denser than iron" },
  { title: "p iron to silicate" },
  { title: "p silicate to water" },
  { title: "p lighter than water" },
  { title: "Core mass fraction" },
  { title: "Water mass fraction" },
];

/** What classified rows add to a page of mass–radius curves. */
export function planetPart(
  rows: readonly ClassifiedRow[],
  { boundaryNames, earthLike, silicate }: Comparison,
  earthRadius: number,
): PlanetPart {
  const phrases = classPhrases(boundaryNames);
  const phraseOf = new Map<string, string>(CLASS_CODES.map((code, i) => [code, phrases[i]]));
  return {
    title: "Measured planets and mass–radius curves",
    columns,
    verdicts: [...phrases, "undecided"],
    planets: rows.map((row) => figurePlanet(row, phraseOf, earthRadius)),
    warnings: [twoReadingsWarning(curveLabel(earthLike), curveLabel(silicate))],
  };
}

/** What the figure calls a curve. */
function curveLabel({ title }: Composition): string {
  return title.split(":")[0];
}

function figurePlanet(
  { row, result }: ClassifiedRow,
  phraseOf: ReadonlyMap<string, string>,
  earthRadius: number,
): FigurePlanet {
  const { mass, radius } = row.quantities;
  const verdict = result.verdict?.code;
  return {
    name: row.name,
    mass: estimate(mass, EARTH_MASS),
    radius: estimate(radius, earthRadius),
    verdict: verdict === undefined ? null : (phraseOf.get(verdict) ?? verdict),
    statement: result.verdict?.statement ?? null,
    reason: result.reasons?.join(", ") ?? null,
    note: null,
    values: values(result),
  };
}

function values(result: ClassifiedRow["result"]): FigureValue[] {
  if (!result.verdict) return columns.map(() => null);
  return [
    result.pDenserThanIron,
    result.pIronSilicate,
    result.pSilicateWater,
    result.pLighterThanWater,
    fraction(result.coreMassFraction),
    fraction(result.waterMassFraction),
  ];
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
