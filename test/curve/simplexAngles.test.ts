import { expect, test } from "vitest";
import { anglesOf, fractionsAt } from "../../src/curve/simplexAngles.ts";

test.each([
  [[0.3, 0.7]],
  [[0.2, 0.3, 0.5]],
  [[1e-9, 0.4, 0.6 - 1e-9]],
  [[0.1, 0.2, 0.3, 0.4]],
  [[0, 0.5, 0.5]],
  [[1, 0, 0]],
])("fractions %j come back from their angles", (fractions) => {
  const angles = new Float64Array(fractions.length - 1);
  anglesOf(fractions, angles);
  fractionsAt(angles).forEach((fraction, k) => {
    expect(Math.abs(fraction - fractions[k])).toBeLessThan(1e-15);
  });
});

test("the outermost component alone is the angle 1, whatever the others", () => {
  expect(fractionsAt([1, 0.3])[2]).toBe(1);
  expect(fractionsAt([0, 0])).toEqual([1, 0, 0]);
});
