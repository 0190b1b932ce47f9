import type { Material, Source, TemperatureMode } from "../eos/material.ts";

/** A hydrogen–helium envelope around the layers. SI. */
export interface GasEnvelope {
  /** Of the whole planet's mass; the layers share the rest. */
  readonly massFraction: number;
  /** Received from the star [W m^-2]; it and the age may come with the planet instead. */
  readonly flux?: number;
  /** [s] */
  readonly age?: number;
  readonly opacity: "solar" | "enhanced";
}

/** A layer with its material resolved; fractions of the mass of all layers. */
export interface Layer {
  /** Shown in outputs: the material's name, or the parts of a mixture joined by `+`. */
  readonly name: string;
  readonly material: Material;
  readonly massFraction: number;
  /**
   * At its top [K]: how much hotter than the bottom of the layer above, or how hot. Continuous where absent; of no
   * account in the outermost layer and in a cold planet.
   */
  readonly heating?: { readonly jump: number } | { readonly top: number };
}

/** What a planet is made of, centre to surface, nested compositions already expanded. */
export interface Composition {
  readonly name: string;
  readonly title: string;
  /** Where the mass fractions come from, if from somewhere. */
  readonly source?: Source;
  readonly surface: { readonly pressurePa: number; readonly temperatureK: number };
  readonly layers: readonly Layer[];
  readonly envelope?: GasEnvelope;
  /** Absent for a cold planet, whose materials are taken as their files give them. */
  readonly temperature?: {
    readonly mode: TemperatureMode;
    /** At the top of the outermost layer; along an adiabat this is the potential temperature [K]. */
    readonly top: number;
  };
}
