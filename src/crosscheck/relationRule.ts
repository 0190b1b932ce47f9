import type { PlanetRow } from "../planets/quantity.ts";
import type { Discrepancy } from "./finding.ts";
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
const GROSS_FACTOR = 2;

/** Makes a relation a rule: a warning beyond 4 sigma and 10 %, an error beyond a factor 2 as well. */
export function relationRule(relation: Relation, text: RelationRuleText): RelationRule {
  const { otherwise, ...record } = text;
  const test = (row: PlanetRow): readonly Discrepancy[] => {
    const comparison = compare(relation, row);
    if (!comparison || !isViolated(comparison)) return [];
    return [describe(relation, row, comparison, otherwise, text.remedy)];
  };
  return { ...record, scope: "row", severity: "warning", relation, test };
}

function describe(
  relation: Relation,
  row: PlanetRow,
  comparison: Comparison,
  otherwise: string,
  remedy: string,
): Discrepancy {
  const slips = slipsThatRepair(relation, row, comparison);
  const cause = slips.length > 0 ? `would fit if ${slips.map((slip) => slip.words).join(", or if ")}` : otherwise;
  return {
    row,
    quantity: relation.quantity,
    value: comparison.value,
    expected: comparison.expected,
    significanceSigma: comparison.significanceSigma,
    explanation: `${times(comparison.logRatio)} the value expected; ${cause}`,
    remedy,
    severity: Math.abs(comparison.logRatio) > Math.log(GROSS_FACTOR) ? "error" : undefined,
  };
}

/** A ratio for people, from its logarithm: `3.12 times`. */
export function times(logRatio: number): string {
  return `${Number(Math.exp(logRatio).toPrecision(3))} times`;
}
