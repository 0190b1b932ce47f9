import { InvalidArgumentError } from "commander";
import fc from "fast-check";
import { expect, test } from "vitest";
import { parseEarthRadius } from "../../src/cli/earthRadius.ts";
import { parseMasses, parseValueWithErrors, positiveNumber, pressurePa } from "../../src/cli/numberOptions.ts";
import { expectClose } from "../support/expectClose.ts";

test("a range is geometric and holds both ends exactly", () => {
  const masses = parseMasses("0.1:20:60");
  expect(masses).toHaveLength(60);
  expect(masses[0]).toBe(0.1);
  expect(masses[59]).toBe(20);
  const ratio = 200 ** (1 / 59);
  for (let i = 1; i < masses.length; i++) {
    expectClose(masses[i] / masses[i - 1], ratio, { rel: 1e-14, because: "a few roundings of a power" });
  }
});

test("a list keeps its order", () => {
  expect(parseMasses("2,0.5,1e1")).toEqual([2, 0.5, 10]);
});

test.each([
  "",
  "x",
  "1,,2",
  "0",
  "-1",
  "1:2",
  "1:2:1",
  "1:2:2.5",
  "0:2:5",
  "1:2:3:4",
  "0x10",
  "Infinity",
  "1e999",
  "1:2:1e9",
])("masses %j are refused", (text) => {
  expect(() => parseMasses(text)).toThrow(InvalidArgumentError);
});

test("one error counts for both sides, two are minus and plus", () => {
  expect(parseValueWithErrors("5.6,0.19")).toEqual({ value: 5.6, minus: 0.19, plus: 0.19 });
  expect(parseValueWithErrors("1.73,0.02,0.03")).toEqual({ value: 1.73, minus: 0.02, plus: 0.03 });
});

test.each(["5.6", "5.6,", "5.6,0", "5.6,-0.1", "a,b", "1,2,3,4"])("a value with errors %j is refused", (text) => {
  expect(() => parseValueWithErrors(text)).toThrow(InvalidArgumentError);
});

test("numbers have a range", () => {
  expect(positiveNumber("0.5")).toBe(0.5);
  expect(pressurePa("0")).toBe(0);
  for (const text of ["0", "-1", "NaN", "nope"]) expect(() => positiveNumber(text)).toThrow(InvalidArgumentError);
  expect(() => pressurePa("-1")).toThrow(InvalidArgumentError);
});

test("an Earth radius is a length in km or `mean`", () => {
  expect(parseEarthRadius("6378.1").value).toBe(6378100);
  expect(parseEarthRadius("6371.0")).toBe(parseEarthRadius("mean"));
  expect(parseEarthRadius("6356.7523").value).toBe(6356752.3);
  for (const text of ["6371000", "1", "-6371", "", "earth"]) {
    expect(() => parseEarthRadius(text)).toThrow(InvalidArgumentError);
  }
});

test("any text gives masses above 0 or a usage error", () => {
  fc.assert(
    fc.property(fc.stringMatching(/^[-0-9.:,e]{0,12}$/), (text) => {
      try {
        expect(parseMasses(text).every((mass) => mass > 0 && mass < Infinity)).toBe(true);
      } catch (error) {
        expect(error).toBeInstanceOf(InvalidArgumentError);
      }
    }),
    { seed: 2, numRuns: 500 },
  );
});
