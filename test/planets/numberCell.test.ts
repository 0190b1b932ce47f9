import { describe, expect, test } from "vitest";
import { isMissing, readPlainNumber, readTypedNumber } from "../../src/planets/numberCell.ts";

describe("numbers as people type them", () => {
  test.each([
    ["5", { value: 5 }],
    [" -1.5e3 ", { value: -1500 }],
    [".5", { value: 0.5 }],
    ["1.2D-3", { value: 0.0012 }],
    ["−2.5", { value: -2.5 }],
    ["<5", { value: 5, limit: "upper" }],
    ["≤ 5.5", { value: 5.5, limit: "upper" }],
    [">3", { value: 3, limit: "lower" }],
    ["&gt; 3", { value: 3, limit: "lower" }],
    ["5±1", { value: 5, minus: 1, plus: 1 }],
    ["5 +/- 0.5", { value: 5, minus: 0.5, plus: 0.5 }],
    ["5.2(3)", { value: 5.2, minus: 0.3, plus: 0.3 }],
    ["5.234(12)", { value: 5.234, minus: 0.012, plus: 0.012 }],
    ["52(3)e2", { value: 5200, minus: 300, plus: 300 }],
    ["5 +1 -2", { value: 5, minus: 2, plus: 1 }],
    ["5+1-2", { value: 5, minus: 2, plus: 1 }],
    ["5 -2 +1", { value: 5, minus: 2, plus: 1 }],
    ["$5.0^{+0.1}_{-0.2}$", { value: 5, minus: 0.2, plus: 0.1 }],
    ["inf", { value: Infinity }],
  ])("%s", (text, expected) => {
    expect(readTypedNumber(text)).toEqual(expected);
  });

  test.each([
    "abc",
    "5 M",
    "about 5",
    "1,234",
    "5..2",
    "1e",
    "--5",
    "0x10",
    "5±",
    "<",
    "5 6",
    "12:30",
    "1_000",
    "9".repeat(200),
  ])("%s is not a number", (text) => {
    expect(readTypedNumber(text)).toBeUndefined();
    expect(readPlainNumber(text)).toBeUndefined();
  });

  test("a comma is a decimal mark where it cannot separate cells", () => {
    expect(readTypedNumber("5,25 ± 0,5", "decimal")).toEqual({ value: 5.25, minus: 0.5, plus: 0.5 });
  });

  test("beside decimal points a comma before three digits may mark thousands", () => {
    expect(readTypedNumber("1,234", "decimal")).toEqual({ value: 1.234 });
    expect(["1,234", "1,234,567", "<1,234", "1,234.5"].map((text) => readTypedNumber(text, "unclear"))).toEqual(
      Array(4).fill(undefined),
    );
    expect(["5,2", "0,123", "12,3456"].map((text) => readTypedNumber(text, "unclear")?.value)).toEqual([
      5.2, 0.123, 12.3456,
    ]);
  });

  test.each(["", " ", "NULL", "null", "nan", "NaN", "-", "--", '""', "N/A", "None", "..."])("%j is missing", (text) => {
    expect(isMissing(text)).toBe(true);
  });
});
