import type { Composition } from "./composition.ts";
import type { Library, Substitutes } from "./library.ts";
import { materialFile } from "./materialFile.ts";

/** A composition made with one of the published sets for each of its materials. */
export interface AlternativeComposition {
  readonly composition: Composition;
  /** The materials used, each once. */
  readonly materials: readonly string[];
}

/**
 * A composition with every combination of the sets its materials list as alternatives, itself first.
 * Throws like Library.composition, also where a listed alternative cannot take the place of a material
 */
export function alternativeCompositions(library: Library, name: string): AlternativeComposition[] {
  const materials = materialsOf(library.composition(name));
  let combinations: string[][] = [[]];
  for (const material of materials) {
    const sets = [material, ...(materialFile(library.materials, material).alternatives ?? [])];
    combinations = combinations.flatMap((combination) => sets.map((set) => [...combination, set]));
  }
  return combinations.map((combination) => {
    const substitutes: Substitutes = new Map(
      combination.flatMap((set, i) => (set === materials[i] ? [] : [[materials[i], set]])),
    );
    return { composition: library.composition(name, substitutes), materials: combination };
  });
}

/** A mixture's layer is named after its parts, joined by `+`, which no name of a material holds. */
function materialsOf({ layers }: Composition): string[] {
  return [...new Set(layers.flatMap(({ name }) => name.split("+")))];
}
