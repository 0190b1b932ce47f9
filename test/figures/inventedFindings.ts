import type { FindingRecord } from "../../src/crosscheck/findingRecord.ts";
import { rules } from "../../src/crosscheck/rules.ts";
import type { FindingsPage } from "../../src/figures/findingsPage.ts";
import { hostileNames } from "./inventedSurvey.ts";

const severities = ["warning", "info", "error"] as const;
const ruleIds = ["kepler-third-law", "missing-uncertainty", "twin-columns"];

const record = (i: number, name: string): FindingRecord => ({
  row: i + 1,
  name,
  rule: ruleIds[i % 3],
  severity: severities[i % 3],
  quantity: "radius_earth",
  // Sorted as text these would be in another order, and every fifth is missing.
  value: i % 5 === 0 ? undefined : (i % 7) * 12.5 - 20,
  expected: undefined,
  significance_sigma: undefined,
  explanation: `explanation ${i} of ${name}`,
  remedy: "compare it",
  line: i + 2,
});

/** Findings enough for three pages. */
export const inventedFindings: FindingsPage = {
  list: "invented.csv",
  rowCount: 500,
  records: Array.from({ length: 450 }, (_, i) => record(i, `Ostara ${i + 1} b`)),
  counts: ruleIds.map((rule, i) => ({ rule, severity: severities[i] ?? "info", count: 150 })),
  rules,
  notes: ["read as invented"],
  made: { version: "0.0.0", earthRadius: "1 Earth radius = 6378.1 km", command: "bulkwright crosscheck invented.csv" },
};

/** The same page with hostile text wherever a user's file can put it. */
export const hostileFindings: FindingsPage = {
  ...inventedFindings,
  list: hostileNames.join(" "),
  records: hostileNames.map((name, i) => ({ ...record(i, name), value: name, explanation: name, remedy: name })),
  notes: [...hostileNames],
  made: { ...inventedFindings.made, command: hostileNames.join(" ") },
};
