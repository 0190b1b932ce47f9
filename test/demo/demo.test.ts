import { mkdtempSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { survey } from "../../src/demo/survey.ts";
import { CLASS_CODES } from "../../src/inference/verdict.ts";
import { type Outcome, runCommand } from "../cli/runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-demo-"));
const output = join(folder, "made", "here");
afterAll(() => rmSync(folder, { recursive: true }));

const readRows = (name: string) =>
  parse<Record<string, string>, Record<string, string>>(readFileSync(join(output, name), "utf8"), {
    columns: true,
    comment: "#",
  });

describe("demo", () => {
  let outcome: Outcome;
  beforeAll(async () => {
    outcome = await runCommand(["demo", "--directory", output]);
  });

  test("writes a page and tables, and says where", () => {
    const names = ["demo-curves.csv", "demo-survey.csv", "demo-verdicts.csv", "demo.html"];
    expect(outcome.code).toBe(0);
    expect(readdirSync(output).sort()).toEqual(names);
    for (const name of names) expect(outcome.out).toContain(`${join(output, name)}\n`);
  });

  test("covers every verdict", () => {
    const verdicts = new Set(readRows("demo-verdicts.csv").map(({ verdict }) => verdict));
    expect([...verdicts].sort()).toEqual(["", "undecided", ...CLASS_CODES].sort());
  });

  test("covers every reason for refusing one", () => {
    const reasons = readRows("demo-verdicts.csv").flatMap((row) => row.reasons.split(";").filter(Boolean));
    const quantities = [
      "missing",
      "upper-limit",
      "lower-limit",
      "from-relation",
      "theoretical",
      "error-missing",
      "error-one-sided",
    ];
    const expected = [
      ...quantities.flatMap((reason) => [`mass-${reason}`, `radius-${reason}`]),
      ...["mass-minimum", "mass-error-zero", "mass-beyond-models", "not-a-number", "negative-mass", "zero-radius"],
    ];
    expect([...new Set(reasons)].sort()).toEqual(expected.sort());
  });

  test("keeps to the survey's rows and order", () => {
    const names = parse<Record<string, string>, Record<string, string>>(survey, {
      columns: true,
      comment: "#",
      comment_no_infix: true,
    });
    expect(readRows("demo-verdicts.csv").map(({ name }) => name)).toEqual(names.map(({ name }) => name));
  });
});
