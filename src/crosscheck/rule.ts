import type { PlanetRow } from "../planets/quantity.ts";
import type { Discrepancy, Severity } from "./finding.ts";

/** Radii and pressures that need a planet model, handed in so that rules need no solver. SI; undefined beyond the model. */
export interface PhysicalLimits {
  /** Radius [m] of a pure iron planet of a mass [kg]. */
  readonly ironRadius?: (mass: number) => number | undefined;
  /** Radius [m] no hydrogen–helium body of a mass [kg] and equilibrium temperature [K] exceeds. */
  readonly hydrogenRadius?: (mass: number, temperature: number) => number | undefined;
}

interface RuleRecord {
  /** Public and stable; an id that was given up is never used for another rule. */
  readonly id: string;
  readonly severity: Severity;
  /** What the rule takes for granted about a sound list. */
  readonly claim: string;
  readonly formula: string;
  readonly source: string;
}

/** A rule that needs one row at a time. */
export interface RowRule extends RuleRecord {
  readonly scope: "row";
  test(row: PlanetRow, limits: PhysicalLimits): readonly Discrepancy[];
}

/** A rule that needs the whole list: duplicates, curves that many rows lie on. */
export interface ListRule extends RuleRecord {
  readonly scope: "list";
  test(rows: readonly PlanetRow[], limits: PhysicalLimits): readonly Discrepancy[];
}

export type Rule = RowRule | ListRule;
