/**
 * A figure as plain data: everything the page shows, nothing about how it is drawn. JSON in, JSON out, so that tests
 * compare figures as data and a figure can be stored, diffed and drawn again. Text is verbatim; escaping is the page's.
 */
export interface FigureSpec {
  readonly kind: "mass-radius";
  readonly title: string;
  /** One or two sentences under the title: what is shown, and how much of it. */
  readonly summary: string;
  readonly axes: { readonly mass: LogAxis; readonly radius: LogAxis };
  readonly curves: readonly FigureCurve[];
  /** Every row of the list, in its order, drawn or not. */
  readonly planets: readonly FigurePlanet[];
  /** What `FigurePlanet.values` holds. */
  readonly columns: readonly FigureColumn[];
  /** Verdicts in the order that fixes their symbol and colour. */
  readonly verdicts: readonly string[];
  /** The planets drawn one by one: those with a verdict. */
  readonly marks: readonly PlanetMark[];
  /** The rest of a list too long to be drawn one by one. */
  readonly density: DensityMap | null;
  readonly caption: FigureCaption;
}

export interface LogAxis {
  readonly title: string;
  readonly unit: string;
  /** Lower and upper end, in the unit. */
  readonly range: readonly [number, number];
}

export interface FigureCurve {
  readonly composition: string;
  /** Short, for the end of the curve and the legend. */
  readonly label: string;
  readonly title: string;
  /** Earth masses, ascending. */
  readonly mass: readonly number[];
  /** Earth radii; null where no planet was found. */
  readonly radius: readonly (number | null)[];
  /** Lowest computed mass from which on a layer lies beyond the data behind its equation of state. */
  readonly extrapolatedFrom: number | null;
}

/** A value with one-sigma errors as positive sizes; null where there is none. */
export interface Estimate {
  readonly value: number;
  readonly minus: number | null;
  readonly plus: number | null;
}

export type FigureValue = number | string | Estimate | null;

export interface FigureColumn {
  readonly title: string;
  readonly unit?: string;
}

export interface FigurePlanet {
  readonly name: string;
  /** Earth masses. */
  readonly mass: Estimate | null;
  /** Earth radii. */
  readonly radius: Estimate | null;
  /** One of `FigureSpec.verdicts`: decides symbol and colour, and is what the legend calls them. */
  readonly verdict: string | null;
  /** The verdict on this planet in one plain sentence; null where `verdict` says it all. */
  readonly statement: string | null;
  /** Why there is no verdict, and so no place in the diagram; mass and radius may be limits or guesses then. */
  readonly reason: string | null;
  readonly note: string | null;
  readonly values: readonly FigureValue[];
}

export interface PlanetMark {
  /** Index into `planets`. */
  readonly planet: number;
  /** Index into `verdicts`. */
  readonly verdict: number;
  /** 0 is drawn in full; 1 and 2 are less precise planets of a crowded diagram, drawn fainter. */
  readonly fade: 0 | 1 | 2;
}

/** Counts of planets in cells whose edges are equally spaced in log mass and log radius. */
export interface DensityMap {
  readonly massEdges: readonly number[];
  readonly radiusEdges: readonly number[];
  /** `counts[radius cell][mass cell]`. */
  readonly counts: readonly (readonly number[])[];
  readonly total: number;
}

export interface FigureCaption {
  /** What must be seen before a number is read off. */
  readonly warnings: readonly string[];
  /** How symbols and lines are to be read. */
  readonly notes: readonly string[];
  readonly compositions: readonly { readonly name: string; readonly title: string; readonly layers: string }[];
  readonly sources: readonly FigureSource[];
  readonly earthRadius: string;
  readonly version: string;
  /** The command that makes this page again. */
  readonly command: string;
}

export interface FigureSource {
  /** What it is the source of, e.g. a material and phase. */
  readonly subject: string;
  readonly citation: string;
  readonly doi?: string;
  readonly note?: string;
}
