import type { Estimate, FigureCaption, FigureColumn, FigureValue, LogAxis } from "./figureSpec.ts";

/** A map of the separation of two compositions over the errors of mass and radius, as plain data. */
export interface PrecisionSpec {
  readonly kind: "precision";
  readonly title: string;
  readonly summary: string;
  /** Relative errors in percent. */
  readonly axes: { readonly massError: LogAxis; readonly radiusError: LogAxis };
  /** Lowest level first. */
  readonly contours: readonly SeparationContour[];
  /** Today's errors, if both are measured. */
  readonly present: ErrorPair | null;
  readonly grid: SeparationGrid;
  /** The first column names the row. */
  readonly steps: { readonly columns: readonly FigureColumn[]; readonly rows: readonly (readonly FigureValue[])[] };
  readonly caption: FigureCaption;
}

/** [%] */
export interface ErrorPair {
  readonly massError: number;
  readonly radiusError: number;
}

/** Where the separation is `sigma`, within the axes, from small mass errors to large ones. */
export interface SeparationContour {
  readonly sigma: number;
  readonly label: string;
  readonly line: readonly ErrorPair[];
  /** Encloses all errors of the map with which the separation is larger. */
  readonly region: readonly ErrorPair[];
}

export interface SeparationGrid {
  /** [%] */
  readonly massErrors: readonly number[];
  /** [%] */
  readonly radiusErrors: readonly number[];
  /** In sigma: `separation[mass error][radius error]`. */
  readonly separation: readonly (readonly number[])[];
}

/** What a precision figure is made from. */
export interface PrecisionInput {
  readonly title: string;
  /** What the compositions are called. */
  readonly labels: readonly [string, string];
  /** Difference of the two radii in percent of the planet's radius. */
  readonly gap: number;
  /** Percent of the radius that one percent of the mass changes. */
  readonly slope: number;
  readonly mass: Estimate;
  readonly radius: Estimate;
  readonly present: ErrorPair | null;
  /** [%], rising. */
  readonly massErrors: readonly number[];
  /** [%], rising. */
  readonly radiusErrors: readonly number[];
  readonly levels: readonly number[];
  readonly steps: PrecisionSpec["steps"];
  /** Its notes come after those on how the map is read. */
  readonly caption: FigureCaption;
}
