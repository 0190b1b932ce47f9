import type { PlanetRow } from "../planets/quantity.ts";

/** What made two rows one planet, surest first. */
export type MatchMethod = "name" | "alias" | "name-ignoring-case" | "host" | "position-and-period";

export interface MatchedPair {
  readonly row: PlanetRow;
  readonly other: PlanetRow;
  readonly method: MatchMethod;
}

/** A row that several rows of the other list could be, or whose one candidate could be another row as well. */
export interface AmbiguousMatch {
  readonly row: PlanetRow;
  readonly candidates: readonly PlanetRow[];
  readonly method: MatchMethod;
}

export interface ListMatch {
  readonly pairs: readonly MatchedPair[];
  readonly ambiguous: readonly AmbiguousMatch[];
  /** Rows without a partner; ambiguous ones are not among them. */
  readonly unmatched: readonly PlanetRow[];
  readonly unmatchedOther: readonly PlanetRow[];
}

/** What one step of the matching found. */
export interface StepResult {
  readonly pairs: readonly MatchedPair[];
  readonly ambiguous: readonly AmbiguousMatch[];
}
