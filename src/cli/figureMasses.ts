import { EARTH_MASS } from "../units/constants.ts";
import type { ClassifiedRow } from "./classifyTable.ts";
import { geometricPoints } from "./numberOptions.ts";

/** What the curves of a figure span without planets, and what the solver can do [Earth masses]. */
const usual = { lightest: 0.1, heaviest: 20 };
const possible = { lightest: 1e-3, heaviest: 1e3 };
const pointsPerDecade = 25;

/** Masses for the curves of a figure that shows the planets with a verdict [Earth masses]. */
export function figureMasses(rows: readonly ClassifiedRow[]): number[] {
  let { lightest, heaviest } = usual;
  for (const { row, result } of rows) {
    if (!result.verdict || row.quantities.mass === undefined) continue;
    const mass = row.quantities.mass.value / EARTH_MASS;
    if (mass < lightest) lightest = Math.max(mass, possible.lightest);
    if (mass > heaviest) heaviest = Math.min(mass, possible.heaviest);
  }
  return geometricPoints(lightest, heaviest, Math.ceil(pointsPerDecade * Math.log10(heaviest / lightest)));
}
