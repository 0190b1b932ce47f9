import type { PlanetRow } from "../planets/quantity.ts";
import type { Discrepancy, Finding, Severity } from "./finding.ts";
import type { PhysicalLimits, Rule } from "./rule.ts";
import { rules as allRules } from "./rules.ts";

/**
 * Every finding of every rule, by row and then in the order of the rules.
 * Checked by test/crosscheck/runRules.test.ts
 */
export function runRules(
  rows: readonly PlanetRow[],
  limits: PhysicalLimits = {},
  rules: readonly Rule[] = allRules,
): Finding[] {
  const findings = rules.flatMap((rule) => apply(rule, rows, limits).map((found) => attribute(found, rule)));
  return findings.sort((a, b) => a.row.row - b.row.row);
}

function apply(rule: Rule, rows: readonly PlanetRow[], limits: PhysicalLimits): readonly Discrepancy[] {
  return rule.scope === "list" ? rule.test(rows, limits) : rows.flatMap((row) => rule.test(row, limits));
}

function attribute(discrepancy: Discrepancy, rule: Rule): Finding {
  return { ...discrepancy, rule: rule.id, severity: discrepancy.severity ?? rule.severity };
}

/** How often a rule fired at one severity. */
export interface RuleCount {
  readonly rule: string;
  readonly severity: Severity;
  readonly count: number;
}

const gravest: Record<Severity, number> = { error: 0, warning: 1, info: 2 };

/** Counts by rule and severity, gravest and most frequent first. */
export function countFindings(findings: readonly Finding[]): RuleCount[] {
  const counts = new Map<string, RuleCount>();
  for (const { rule, severity } of findings) {
    const key = `${rule} ${severity}`;
    counts.set(key, { rule, severity, count: (counts.get(key)?.count ?? 0) + 1 });
  }
  return [...counts.values()].sort(
    (a, b) => gravest[a.severity] - gravest[b.severity] || b.count - a.count || (a.rule < b.rule ? -1 : 1),
  );
}
