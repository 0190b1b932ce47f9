import { describe, expect, it } from "vitest";
import { formatCount, formatValue } from "../../src/figures/formatValue.ts";

describe("formatValue", () => {
  it.each([
    ["symmetric errors", { value: 5.6, minus: 0.19, plus: 0.19 }, "5.60 ± 0.19"],
    ["unequal errors", { value: 7.14, minus: 1.2, plus: 1.9 }, "7.1 +1.9 −1.2"],
    ["two digits of the smaller error", { value: 1.116, minus: 0.014, plus: 0.12 }, "1.116 +0.120 −0.014"],
    ["errors above ten", { value: 317.8, minus: 12.4, plus: 15.9 }, "318 +16 −12"],
    ["an upper error alone", { value: 3, minus: null, plus: 0.5 }, "3.00 +0.50"],
    ["a lower error alone", { value: 3, minus: 0.5, plus: null }, "3.00 −0.50"],
    ["no error", { value: 4.4, minus: null, plus: null }, "4.4"],
    ["errors of zero", { value: 4.4, minus: 0, plus: 0 }, "4.4"],
    ["an absurdly small error", { value: 1, minus: 1e-12, plus: 1e-12 }, "1 ± 1e−12"],
    ["a number", 0.123456, "0.1235"],
    ["a small number", -0.0000123456, "−1.235e−5"],
    ["a large number", 123456789, "1.235e+8"],
    ["text", "a < b", "a < b"],
    ["nothing", null, ""],
  ] as const)("writes %s", (_, value, text) => {
    expect(formatValue(value)).toBe(text);
  });
});

it("sets the thousands of a count apart", () => {
  expect(formatCount(1234567)).toBe("1,234,567");
});
