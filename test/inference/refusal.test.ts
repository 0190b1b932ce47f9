import { describe, expect, test } from "vitest";
import { isMeasuredValue, refusalReasons } from "../../src/inference/refusal.ts";
import { quantity, rowWith } from "./planetRows.ts";

const errors = { minus: 0.1, plus: 0.2 };
const mass = quantity(5, errors);
const radius = quantity(1.5, errors);

describe("refusalReasons", () => {
  test("of a measured mass and radius with both errors are none, whatever else is wrong with the row", () => {
    expect(refusalReasons(rowWith({ mass, radius }, ["not-a-number"]))).toEqual([]);
    expect(refusalReasons(rowWith({ mass, radius, minimumMass: quantity(4, errors) }))).toEqual([]);
  });

  test.each([
    ["mass-missing", undefined],
    ["mass-upper-limit", quantity(5, { kind: "upper-limit" })],
    ["mass-lower-limit", quantity(5, { kind: "lower-limit", ...errors })],
    ["mass-minimum", quantity(5, { kind: "minimum", ...errors })],
    ["mass-from-relation", quantity(5, { kind: "from-relation" })],
    ["mass-theoretical", quantity(5, { kind: "theoretical" })],
    ["mass-error-missing", quantity(5, { kind: "no-uncertainty" })],
    ["mass-error-one-sided", quantity(5, { kind: "no-uncertainty", plus: 0.1 })],
    ["mass-error-zero", quantity(5, { kind: "no-uncertainty", minus: 0, plus: 0.1 })],
    ["mass-error-zero", quantity(5, { minus: 0.1, plus: 0 })],
    ["mass-error-missing", quantity(5)],
    ["mass-not-positive", quantity(0, errors)],
    ["mass-not-positive", quantity(-3, errors)],
    ["mass-not-positive", quantity(Number.NaN, errors)],
  ])("%s", (code, unusable) => {
    expect(refusalReasons(rowWith({ mass: unusable, radius }))).toEqual([code]);
    const asRadius = refusalReasons(rowWith({ mass, radius: unusable }));
    expect(asRadius).toEqual([code.replace("mass", "radius")]);
  });

  test("are all given, mass first, each once", () => {
    const row = rowWith({ mass: quantity(0, { kind: "upper-limit" }) }, ["not-a-number", "not-a-number", "ragged-row"]);
    expect(refusalReasons(row)).toEqual([
      "mass-upper-limit",
      "mass-not-positive",
      "radius-missing",
      "not-a-number",
      "ragged-row",
    ]);
  });

  test("name the minimum mass where there is no other", () => {
    expect(refusalReasons(rowWith({ radius, minimumMass: quantity(4, { kind: "minimum", ...errors }) }))).toEqual([
      "mass-minimum",
    ]);
  });
});

test("isMeasuredValue accepts a value without errors, but no limit, relation or nonsense", () => {
  expect(isMeasuredValue(quantity(2))).toBe(true);
  expect(isMeasuredValue(quantity(2, { kind: "no-uncertainty" }))).toBe(true);
  for (const kind of ["upper-limit", "lower-limit", "minimum", "from-relation", "theoretical"] as const) {
    expect(isMeasuredValue(quantity(2, { kind }))).toBe(false);
  }
  expect(isMeasuredValue(quantity(0))).toBe(false);
  expect(isMeasuredValue(undefined)).toBe(false);
});
