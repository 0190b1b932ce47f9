import { describe, expect, test } from "vitest";
import { PiecewiseQuartic, quarticThrough } from "../../src/numerics/piecewiseQuartic.ts";

const quartic = (x: number) => 1 + x - 2 * x ** 2 + 0.3 * x ** 3 + 0.7 * x ** 4;

describe("quarticThrough", () => {
  test("reproduces a quartic, from any place in the array", () => {
    const values = Float64Array.from([99, 99, ...[0, 1, 2, 3, 4].map(quartic)]);
    for (const u of [0, 0.3, 1, 2.5, 3.9, 4]) {
      expect(Math.abs(quarticThrough(values, 2, u) - quartic(u))).toBeLessThan(1e-12);
    }
  });
});

describe("PiecewiseQuartic", () => {
  const from = [0, 2, 3];
  const spacing = [0.5, 0.25, 1];
  const values = Float64Array.from(from.flatMap((x, p) => [0, 1, 2, 3, 4].map((k) => quartic(x + k * spacing[p]))));
  const curve = new PiecewiseQuartic(from, spacing, values);

  test("reproduces a quartic over pieces of different size", () => {
    for (let x = 0; x <= 7; x += 0.05) {
      expect(Math.abs(curve.value(x) / quartic(x) - 1)).toBeLessThan(1e-12);
    }
  });

  test("lists its nodes", () => {
    expect([...curve.nodes]).toEqual([0, 0.5, 1, 1.5, 2, 2.25, 2.5, 2.75, 3, 4, 5, 6, 7]);
  });
});
