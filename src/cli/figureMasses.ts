import type { PlanetRow } from "../planets/quantity.ts";
import { EARTH_MASS } from "../units/constants.ts";
import { geometricPoints } from "./numberOptions.ts";

/** What the curves of a figure span without planets, and what the solver can do [Earth masses]. */
const usual = { lightest: 0.1, heaviest: 20 };
const possible = { lightest: 1e-3, heaviest: 1e3 };
const pointsPerDecade = 25;

/** Masses for the curves of a figure with these planets [Earth masses]. */
export function figureMasses(rows: readonly PlanetRow[]): number[] {
  let { lightest, heaviest } = usual;
  for (const { quantities } of rows) {
    const mass = (quantities.mass?.value ?? Number.NaN) / EARTH_MASS;
    if (mass < lightest) lightest = Math.max(mass, possible.lightest);
    if (mass > heaviest) heaviest = Math.min(mass, possible.heaviest);
  }
  return geometricPoints(lightest, heaviest, Math.ceil(pointsPerDecade * Math.log10(heaviest / lightest)));
}
