import type { FigureColumn, FigurePlanet, FigureSource } from "./figureSpec.ts";

/** What a mass–radius figure is made from: results in Earth units, and where they come from. */
export interface MassRadiusInput {
  readonly title: string;
  readonly curves: readonly CurveInput[];
  readonly planets: readonly FigurePlanet[];
  /** What `planets[].values` holds, e.g. the probabilities. */
  readonly columns: readonly FigureColumn[];
  /** Verdicts in the order that fixes symbol and colour, densest first; others found on planets are added at the end. */
  readonly verdicts: readonly string[];
  readonly sources: readonly FigureSource[];
  readonly warnings: readonly string[];
  readonly earthRadiusKm: number;
  readonly version: string;
  readonly command: string;
}

export interface CurveInput {
  readonly composition: string;
  readonly title: string;
  readonly layers: readonly { readonly name: string; readonly massFraction: number }[];
  /** In any order. */
  readonly points: readonly CurvePointInput[];
}

export interface CurvePointInput {
  readonly massEarth: number;
  /** null where no planet was found. */
  readonly radiusEarth: number | null;
  readonly extrapolatedLayers: readonly string[];
}
