import type { Planet } from "../../src/interior/planet.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import type { Composition } from "../../src/library/composition.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { G } from "../../src/units/constants.ts";

const library = loadLibrary(shippedFiles);

export const shipped = (name: string): Composition => library.composition(name);

/** Mass [kg] from a mass parameter GM [km³/s²]. */
export const massOf = (massParameter: number): number => (massParameter * 1e9) / G;

/** Pressure, radius and temperature at the top of a phase or layer, by name; the outermost where there are several. */
export function topOf(planet: Planet, name: string) {
  const boundary = planet.boundaries.findLast(({ layer, phase }) => layer === name || phase === name);
  if (boundary === undefined) throw new Error(`${planet.composition.name} has no ${name}`);
  return boundary;
}

/** The same layers in other proportions: the outermost gets `fraction`, the others share the rest as before. */
export function withOutermost(composition: Composition, fraction: number): Composition {
  const last = composition.layers.length - 1;
  const scale = (1 - fraction) / (1 - composition.layers[last].massFraction);
  const layers = composition.layers.map((layer, i) => ({
    ...layer,
    massFraction: i === last ? fraction : layer.massFraction * scale,
  }));
  return { ...composition, layers };
}

/** The mass fraction of the outermost layer that gives a planet of `mass` this radius [m]: secant from the present one. */
export function outermostForRadius(composition: Composition, mass: number, radius: number): number {
  const miss = (fraction: number) => solvePlanet(withOutermost(composition, fraction), mass).radius / radius - 1;
  let [before, here] = [0.95, 1].map(
    (factor) => factor * composition.layers[composition.layers.length - 1].massFraction,
  );
  let missBefore = miss(before);
  for (let round = 0; round < 12; round++) {
    const missHere = miss(here);
    if (Math.abs(missHere) < 1e-8) break;
    [before, here, missBefore] = [here, here - (missHere * (here - before)) / (missHere - missBefore), missHere];
  }
  return here;
}
