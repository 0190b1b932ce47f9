import { expect, test } from "vitest";
import { checkRows } from "../../src/crosscheck/checkRows.ts";
import { rules } from "../../src/crosscheck/rules.ts";
import { runRules } from "../../src/crosscheck/runRules.ts";
import { cleanRow, randomNumbers } from "./inventedList.ts";

const random = randomNumbers(5);
const rows = Array.from({ length: 60 }, (_, i) => {
  const row = { ...cleanRow(1 + (i % 40), random), row: i + 1, cells: ["a", "b"] };
  const { radius } = row.quantities;
  return radius && i % 3 === 0
    ? { ...row, quantities: { ...row.quantities, radius: { ...radius, value: radius.value * 11.2, minus: 0 } } }
    : row;
});

async function* stream() {
  yield* rows;
}

test("rows as they come give the findings of the whole list, in the same order", async () => {
  // Reversed, rules on the whole list come before rules on its rows.
  const reversed = [...rules].reverse();
  const { findings, rowCount } = await checkRows(stream(), {}, reversed);
  const told = (found: typeof findings) => found.map(({ row, ...finding }) => ({ ...finding, row: row.row }));
  expect(told(findings)).toEqual(told(runRules(rows, {}, reversed)));
  expect(new Set(findings.map(({ rule }) => rule)).size).toBeGreaterThan(3);
  expect(rowCount).toBe(60);
});

test("cells are let go", async () => {
  const { findings } = await checkRows(stream(), {}, rules);
  expect(findings.every(({ row }) => row.cells.length === 0)).toBe(true);
});
