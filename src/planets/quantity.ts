/** What a number in a planet list really is. Only `measured` may be used as a measurement. */
export type QuantityKind =
  | "measured"
  | "upper-limit"
  | "lower-limit"
  /** M sin i. */
  | "minimum"
  /** Computed from another quantity by a relation, e.g. a mass from a radius. */
  | "from-relation"
  | "theoretical"
  /** A value without a usable error on both sides: none, one, or zero. */
  | "no-uncertainty";

/** Where a value stands in the user's file; lines count from 1, `column` is the header as written. */
export interface Origin {
  readonly file: string;
  readonly line: number;
  readonly column: string;
}

/** A way in which lists say "this is a limit": a flag column, typed `<5`, `0.0 +0.15 -0.0`, `5 ± 5`, an infinite error. */
export type LimitCoding = "flag" | "typed" | "zero-with-error" | "error-equals-value" | "infinite-error";

/** A number from a planet list, in SI, with one-sigma errors as positive sizes. */
export interface MeasuredQuantity {
  readonly value: number;
  readonly minus?: number;
  readonly plus?: number;
  readonly kind: QuantityKind;
  /** How the list marked a limit; `minus` and `plus` are kept beside it where the list gives them, for the cross-check. */
  readonly limitCoding?: LimitCoding;
  /** The number as typed, so that a value copied from another column shows whatever the units. */
  readonly written?: string;
  /** What the value was computed from, where the list does not hold it itself, e.g. `radius ratio and stellar radius`. */
  readonly derivedFrom?: string;
  readonly origin: Origin;
}

/** Quantities Bulkwright knows; the unit is the one held inside. */
export type QuantityName =
  | "mass" // kg
  | "minimumMass" // kg
  | "radius" // m
  | "density" // kg m^-3
  | "period" // s
  | "semiMajorAxis" // m
  | "eccentricity"
  | "inclination" // rad
  | "equilibriumTemperature" // K
  | "insolation" // W m^-2
  | "surfaceGravity" // m s^-2
  | "radiusRatio" // planet over star
  | "scaledAxis" // a over stellar radius
  | "velocityAmplitude" // m s^-1
  | "starMass" // kg
  | "starRadius" // m
  | "starTemperature" // K
  | "starDensity" // kg m^-3
  | "starSurfaceGravity" // m s^-2
  | "starMetallicity" // dex
  | "starAge" // s
  | "rightAscension" // rad
  | "declination"; // rad

export type TextName =
  | "name"
  | "host"
  /** The planet's letter, for lists that give host and letter instead of a name. */
  | "letter"
  /** Other names of the planet, separated by commas or semicolons. */
  | "aliases"
  | "status"
  /** `1` marks a disputed planet, where a list has such a flag beside or instead of a status. */
  | "controversial"
  | "massProvenance"
  | "radiusProvenance"
  | "reference"
  /** When the row's reference appeared; ISO order, so that text sorts by time. */
  | "publicationDate"
  | "discoveryMethod"
  | "preferred";

/** One row of a planet list: every input row becomes exactly one of these, in order. */
export interface PlanetRow {
  /** Data row number, from 1. */
  readonly row: number;
  readonly line: number;
  /** Verbatim; may be empty. */
  readonly name: string;
  readonly quantities: Readonly<Partial<Record<QuantityName, MeasuredQuantity>>>;
  /** Further columns that give the same quantity, e.g. Jupiter units beside Earth units, for the cross-check to compare. */
  readonly twins?: Readonly<Partial<Record<QuantityName, readonly MeasuredQuantity[]>>>;
  readonly texts: Readonly<Partial<Record<TextName, string>>>;
  /** The row's cells verbatim, in the order of the list's header. */
  readonly cells: readonly string[];
  /** What is wrong with this row alone, e.g. text in a number cell. */
  readonly issues: readonly RowIssue[];
}

export interface RowIssue {
  /** Stable, e.g. `not-a-number`, `negative-mass`, `ragged-row`. */
  readonly code: string;
  readonly origin: Origin;
  readonly found: string;
  readonly message: string;
}
