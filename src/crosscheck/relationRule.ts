import type { PlanetRow } from "../planets/quantity.ts";
import type { Discrepancy, Severity } from "./finding.ts";
import { times } from "./ratioInWords.ts";
import { type Comparison, compare, isViolated, type Relation } from "./relation.ts";
import type { RowRule } from "./rule.ts";
import { slipsThatRepair } from "./slipDiagnosis.ts";

/** A rule that holds a row to a relation. */
export interface RelationRule extends RowRule {
  readonly relation: Relation;
}

interface RelationRuleText {
  readonly id: string;
  readonly claim: string;
  readonly formula: string;
  readonly source: string;
  /** Explanations besides unit slips, for where no slip fits. */
  readonly otherwise: string;
  readonly remedy: string;
}

/** A factor this large is past what mixed sources and methods do to each other. */
const GROSS = Math.LN2;

/**
 * Makes a relation a rule: a warning beyond 4 sigma and 10 %, an error if also beyond a factor 2. A factor 2 that the
 * errors allow is an info, since errors that large say little.
 */
export function relationRule(relation: Relation, text: RelationRuleText): RelationRule {
  const { otherwise, remedy, ...record } = text;
  const test = (row: PlanetRow): readonly Discrepancy[] => {
    const comparison = compare(relation, row);
    const severity = comparison && judge(comparison);
    if (!severity) return [];
    const { value, expected, significanceSigma } = comparison;
    const cause = severity === "info" ? "but within the quoted errors" : explain(relation, row, comparison, otherwise);
    const explanation = `${times(comparison.logRatio)} the value expected; ${cause}`;
    const { quantity } = relation;
    return [{ row, quantity, value, expected, significanceSigma, explanation, remedy, severity }];
  };
  return { ...record, scope: "row", severity: "warning", relation, test };
}

function judge(comparison: Comparison): Severity | undefined {
  const gross = Math.abs(comparison.logRatio) > GROSS;
  if (isViolated(comparison)) return gross ? "error" : "warning";
  return gross ? "info" : undefined;
}

function explain(relation: Relation, row: PlanetRow, comparison: Comparison, otherwise: string): string {
  const slips = slipsThatRepair(relation, row, comparison);
  return slips.length > 0 ? `would fit if ${slips.map((slip) => slip.words).join(", or if ")}` : otherwise;
}
