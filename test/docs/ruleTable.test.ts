import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { rules } from "../../src/crosscheck/rules.ts";

test("the README lists every rule as its record has it", () => {
  const table = rules.map(
    ({ id, severity, claim }) => `| \`${id}\` | ${severity} | ${claim.replaceAll("|", "\\|")} |\n`,
  );
  const [, listed] =
    /^\| rule \| severity \| claim \|\n\|---\|---\|---\|\n((?:\|.*\n)+)/m.exec(readFileSync("README.md", "utf8")) ?? [];
  expect(listed).toBe(table.join(""));
});
