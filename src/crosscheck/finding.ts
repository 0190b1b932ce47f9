import type { PlanetRow, QuantityName } from "../planets/quantity.ts";

export type Severity = "info" | "warning" | "error";

/** What a rule is about: a quantity of the list, one of its texts, or a cell that could not be read as either. */
export type Subject = QuantityName | "name" | "status" | "cell";

/** What one rule holds against one row; numbers in SI. */
export interface Discrepancy {
  readonly row: PlanetRow;
  readonly quantity: Subject;
  /** What the list says: a number for quantities, the text itself for names and status. */
  readonly value?: number | string;
  /** What the rule's formula gives, or the limit it was compared with. */
  readonly expected?: number;
  /** Size of the disagreement in combined standard errors; correlations are ignored. */
  readonly significanceSigma?: number;
  /** What would explain it. */
  readonly explanation: string;
  /** What to do about it. */
  readonly remedy: string;
  /** Where this one case is graver or milder than the rule's own severity. */
  readonly severity?: Severity;
}

/** A discrepancy with the rule that found it: one line of the cross-check's output. */
export interface Finding extends Discrepancy {
  readonly rule: string;
  readonly severity: Severity;
}
