import { describe, expect, test } from "vitest";
import { rules } from "../../src/crosscheck/rules.ts";
import { runRules } from "../../src/crosscheck/runRules.ts";
import { faults } from "./faults.ts";
import { cleanRow, randomNumbers, withTwins } from "./inventedList.ts";

const ROWS = 200;
const CLEAN = 2000;

const cleanList = (seed: number, count: number) => {
  const random = randomNumbers(seed);
  return Array.from({ length: count }, (_, i) => withTwins(cleanRow(i + 1, random)));
};

describe("known faults put into clean invented lists", () => {
  test.each(faults.map((fault, i) => ({ ...fault, seed: i + 11 })))("$name: at least 99 % found", (fault) => {
    const random = randomNumbers(fault.seed);
    const rows = cleanList(fault.seed, ROWS).map((row) => fault.inject(row, random));
    const found = runRules(
      rows,
      {},
      rules.filter(({ id }) => fault.foundBy.includes(id)),
    );
    const missed = rows.filter((row) => !found.some((finding) => finding.row === row));
    expect(missed.length / ROWS).toBeLessThanOrEqual(0.01);
  });

  test("clean rows: under 0.5 % false alarms", () => {
    const alarms = runRules(cleanList(7, CLEAN)).filter(({ severity }) => severity !== "info");
    const rows = new Set(alarms.map(({ row }) => row));
    expect(rows.size / CLEAN).toBeLessThan(0.005);
  });

  test("faults in half of the rows leave the other half alone", () => {
    const random = randomNumbers(5);
    const rows = cleanList(5, ROWS * faults.length).map((row, i) => {
      const fault = faults[Math.floor(i / 2) % faults.length];
      return i % 2 === 0 && fault ? fault.inject(row, random) : row;
    });
    const alarms = runRules(rows).filter(({ severity }) => severity !== "info");
    const clean = rows.filter((_, i) => i % 2 === 1);
    const disturbed = clean.filter((row) => alarms.some((finding) => finding.row === row));
    expect(disturbed.length / clean.length).toBeLessThan(0.005);
  });
});
