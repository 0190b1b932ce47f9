import type { Material, Source } from "../eos/material.ts";

/** A layer with its material resolved; fractions of the whole planet's mass. */
export interface Layer {
  /** Shown in outputs: the material's name, or the parts of a mixture joined by `+`. */
  readonly name: string;
  readonly material: Material;
  readonly massFraction: number;
}

/** What a planet is made of, centre to surface, nested compositions already expanded. */
export interface Composition {
  readonly name: string;
  readonly title: string;
  /** Where the mass fractions come from, if from somewhere. */
  readonly source?: Source;
  readonly surface: { readonly pressurePa: number; readonly temperatureK: number };
  readonly layers: readonly Layer[];
}
