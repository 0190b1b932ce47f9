import type { PlanetRow } from "../planets/quantity.ts";
import type { Finding } from "./finding.ts";
import type { PhysicalLimits, Rule } from "./rule.ts";
import { runRules } from "./runRules.ts";

/**
 * `runRules` over rows as they come. Rows are kept only if one of the rules needs the whole list, and then without the
 * cells that no rule looks at.
 * Checked by test/crosscheck/checkRows.test.ts
 */
export async function checkRows(
  rows: AsyncIterable<PlanetRow> | Iterable<PlanetRow>,
  limits: PhysicalLimits,
  rules: readonly Rule[],
): Promise<{ findings: Finding[]; rowCount: number }> {
  const rowRules = rules.filter(({ scope }) => scope === "row");
  const listRules = rules.filter(({ scope }) => scope === "list");
  const findings: Finding[] = [];
  const kept: PlanetRow[] = [];
  let rowCount = 0;
  for await (const full of rows) {
    const row = { ...full, cells: [] };
    for (const finding of runRules([row], limits, rowRules)) findings.push(finding);
    if (listRules.length > 0) kept.push(row);
    rowCount++;
  }
  const place = new Map(rules.map(({ id }, i) => [id, i]));
  const order = ({ rule }: Finding) => place.get(rule) ?? 0;
  const all = findings.concat(runRules(kept, limits, listRules));
  return { findings: all.sort((a, b) => a.row.row - b.row.row || order(a) - order(b)), rowCount };
}
