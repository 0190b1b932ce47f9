import { describe, expect, test } from "vitest";
import { compare, type Relation } from "../../src/crosscheck/relation.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetRow, type Written } from "./planetRow.ts";

/** density = 2 eccentricity³ / radiusRatio, in units that are all one. */
const relation: Relation = { quantity: "density", factor: 2, powers: { eccentricity: 3, radiusRatio: -1 } };
const row = (density: Written, eccentricity: Written, radiusRatio: Written) =>
  planetRow({ density, eccentricity, radiusRatio });
const roundOff = { rel: 1e-12, because: "round-off" };

describe("compare", () => {
  test("multiplies powers", () => {
    const found = compare(relation, row(8, 2, 4));
    expectClose(found?.expected ?? 0, 4, roundOff);
    expectClose(found?.logRatio ?? 0, Math.LN2, roundOff);
  });

  /** Too high a value is excused by its own lower error, the upper error of what it grows with, the lower of the rest. */
  test("uses the errors that would close the gap", () => {
    const tight = 1e-9;
    const excused = compare(relation, row([8, [4, tight]], [2, [tight, 2]], [4, [2, tight]]));
    expectClose(excused?.logError ?? 0, Math.hypot(Math.LN2, 3 * Math.LN2, Math.LN2), roundOff);
    const accused = compare(relation, row([8, [tight, 4]], [2, [2 / 2, tight]], [4, [tight, 2]]));
    expect(accused?.logError).toBeLessThan(1e-8);
  });

  test("turns the sides round where the value is too low", () => {
    const tight = 1e-9;
    const excused = compare(relation, row([2, [tight, 2]], [2, [1, tight]], [4, [tight, 4]]));
    expectClose(excused?.logError ?? 0, Math.hypot(Math.LN2, 3 * Math.LN2, Math.LN2), roundOff);
  });

  test("sees no disagreement inside the allowed range, and measures from its end", () => {
    const lenient: Relation = { ...relation, allowed: () => [0.5, 1.5] };
    expect(compare(lenient, row(5, 2, 4))?.logRatio).toBe(0);
    const outside = compare(lenient, row(12, 2, 4));
    expectClose(outside?.expected ?? 0, 6, roundOff);
    expectClose(outside?.logRatio ?? 0, Math.LN2, roundOff);
  });

  test.each<[string, Written]>([
    ["a limit", [2, undefined, { kind: "upper-limit" }]],
    ["zero", 0],
    ["negative", -2],
    ["not a number", Number.NaN],
  ])("leaves a row alone whose value is %s", (_, eccentricity) => {
    expect(compare(relation, row(8, eccentricity, 4))).toBeUndefined();
  });
});
