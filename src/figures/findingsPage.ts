import type { Severity } from "../crosscheck/finding.ts";
import type { FindingRecord } from "../crosscheck/findingRecord.ts";
import type { Rule } from "../crosscheck/rule.ts";
import type { RuleCount } from "../crosscheck/runRules.ts";
import { escapeHtml } from "./escape.ts";
import { type ExplorableTable, explorer } from "./explorer.ts";
import { explorerStyle } from "./explorerStyle.ts";
import { exploreTables } from "./exploreTables.ts";
import { formatCount } from "./formatValue.ts";
import { type HowMade, howMadeHtml } from "./howMade.ts";
import { pageHtml } from "./page.ts";
import { type PageTable, tableHtml } from "./table.ts";

/** What is wrong with a list, as everything its page shows. */
export interface FindingsPage {
  readonly list: string;
  readonly rowCount: number;
  readonly records: readonly FindingRecord[];
  readonly counts: readonly RuleCount[];
  /** All rules that were applied, whether they found something or not. */
  readonly rules: readonly Rule[];
  readonly notes: readonly string[];
  readonly made: HowMade;
}

export const severities: readonly Severity[] = ["error", "warning", "info"];

/**
 * The findings as one self-contained page.
 * Checked by test/figures/findingsPage.test.ts and, in a browser, test/browser/findingsPage.test.ts.
 */
export async function findingsPage(page: FindingsPage): Promise<string> {
  const { list, rowCount, records, notes, made } = page;
  const title = `Cross-check of ${list}`;
  const findings = explorer(findingsTable(records));
  const summary = `${formatCount(records.length)} findings in ${formatCount(rowCount)} rows: ${severityCounts(page)}.`;
  return pageHtml({
    title,
    style: explorerStyle,
    body: `<main>
<h1>${escapeHtml(title)}</h1>
<p class="lead">${escapeHtml(summary)}</p>
${notes.map((note) => `<p>${escapeHtml(note)}</p>`).join("\n")}
<section><h2>Findings</h2>
${findings.html}</section>
<section><h2>Rules</h2>
${tableHtml(ruleTable(page))}</section>
<section><h2>How this page was made</h2>
${howMadeHtml(made)}</section>
</main>`,
    data: findings.data,
    scripts: [`(${exploreTables})();`],
  });
}

function severityCounts({ counts }: FindingsPage): string {
  const total = (severity: Severity) =>
    counts.filter((count) => count.severity === severity).reduce((sum, { count }) => sum + count, 0);
  return severities.map((severity) => `${formatCount(total(severity))} ${severity}`).join(", ");
}

function findingsTable(records: readonly FindingRecord[]): ExplorableTable {
  return {
    id: "findings",
    noun: "findings",
    caption: "Findings, in the order of the list; a heading sorts",
    columns: [
      { title: "Planet" },
      { title: "Row", numeric: true, digits: 9 },
      { title: "Severity", isChoice: true, order: severities },
      { title: "Rule", isChoice: true },
      { title: "Quantity", isChoice: true },
      { title: "Value", numeric: true },
      { title: "Expected", numeric: true },
      { title: "Significance", unit: "sigma", numeric: true, digits: 2 },
      { title: "Explanation", wide: true },
      { title: "What to do", wide: true },
    ],
    rows: records.map((record) =>
      [
        record.name,
        record.row,
        record.severity,
        record.rule,
        record.quantity,
        record.value,
        record.expected,
        record.significance_sigma,
        record.explanation,
        record.remedy,
      ].map((cell) => cell ?? null),
    ),
  };
}

/** What every rule claims, and how often rows contradict it. */
function ruleTable({ rules, counts }: FindingsPage): PageTable {
  const count = (rule: string, severity: Severity) =>
    counts.find((entry) => entry.rule === rule && entry.severity === severity)?.count ?? null;
  return {
    id: "rules",
    caption: "Every rule that was applied, and how often rows contradict it",
    columns: [
      { title: "Rule" },
      ...["Error", "Warning", "Info"].map((title) => ({ title, numeric: true, digits: 9 })),
      { title: "Claim", wide: true },
      { title: "Formula", wide: true },
      { title: "Source", wide: true },
    ],
    rows: rules.map(({ id, claim, formula, source }) => [
      id,
      ...severities.map((severity) => count(id, severity)),
      claim,
      formula,
      source,
    ]),
  };
}
