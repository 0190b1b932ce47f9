import { expect, test } from "vitest";
import { findingColumns, findingRecord } from "../../src/crosscheck/findingRecord.ts";
import type { Rule } from "../../src/crosscheck/rule.ts";
import { countFindings, runRules } from "../../src/crosscheck/runRules.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetRow } from "./planetRow.ts";

const record = { severity: "warning", claim: "c", formula: "f", source: "s" } as const;
const heavy: Rule = {
  ...record,
  id: "heavy",
  scope: "row",
  test: (row) => [
    {
      row,
      quantity: "mass",
      value: row.quantities.mass?.value,
      explanation: "e",
      remedy: "r",
      severity: row.row === 2 ? "error" : undefined,
    },
  ],
};
const last: Rule = {
  ...record,
  id: "last",
  scope: "list",
  severity: "info",
  test: (rows) =>
    rows.slice(-1).map((row) => ({ row, quantity: "name", value: row.name, explanation: "e", remedy: "r" })),
};

const rows = [3, 2, 1].map((row) => planetRow({ mass: row }, {}, row));
const findings = runRules(rows, {}, [last, heavy]);

test("findings come by row, then in the order of the rules", () => {
  expect(findings.map(({ row, rule }) => [row.row, rule])).toEqual([
    [1, "last"],
    [1, "heavy"],
    [2, "heavy"],
    [3, "heavy"],
  ]);
});

test("a discrepancy may be graver than its rule", () => {
  expect(countFindings(findings)).toEqual([
    { rule: "heavy", severity: "error", count: 1 },
    { rule: "heavy", severity: "warning", count: 2 },
    { rule: "last", severity: "info", count: 1 },
  ]);
});

test("records begin with the documented columns, in stated units", () => {
  const [, second] = findings;
  const cells = second && findingRecord(second);
  expect(Object.keys(cells ?? {})).toEqual([...findingColumns]);
  expect(cells).toMatchObject({ row: 1, name: "Ostara 1 b", rule: "heavy", quantity: "mass_earth" });
  expectClose(Number(cells?.value), 1, { rel: 1e-12, because: "there and back through SI" });
});

test("an Earth radius of the user's own changes radii only", () => {
  const finding = { row: rows[0] as (typeof rows)[number], quantity: "radius", value: 6.371e6, rule: "r" } as const;
  const text = { explanation: "", remedy: "", severity: "info" } as const;
  expectClose(Number(findingRecord({ ...finding, ...text }, 6.371e6).value), 1, { rel: 1e-12, because: "division" });
});
